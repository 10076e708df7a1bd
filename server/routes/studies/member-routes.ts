import { memberChangeRequestSchema, newMemberRequestSchema, studyViewSchema } from '#shared/api';
import type { MemberChangeRequest, NewMemberRequest, StudyView } from '#shared/api';
import type { Outcome } from '../../errors/server-issue';
import { addMember } from '../../services/studies/add-member';
import { changeMember } from '../../services/studies/change-member';
import { removeMember } from '../../services/studies/remove-member';
import { json, studyRoute } from '../define-route';
import type { Call, OnStudy, Route } from '../route';
import { withStudy } from './with-study';

/** Who is a member of a study, and in which role. */
export const memberRoutes: readonly Route[] = [
  studyRoute('manageMembers', {
    method: 'post',
    path: '/api/studies/:studyId/members',
    summary: 'Makes somebody a member; an unknown address gets an account and an invitation.',
    body: newMemberRequestSchema,
    reply: json(studyViewSchema),
    limit: 'mail',
    handle: inviteMember,
  }),
  studyRoute('manageMembers', {
    method: 'put',
    path: '/api/studies/:studyId/members/:personId',
    summary: 'Gives a member another role; the last lead stays one.',
    body: memberChangeRequestSchema,
    reply: json(studyViewSchema),
    handle: editMember,
  }),
  studyRoute('manageMembers', {
    method: 'delete',
    path: '/api/studies/:studyId/members/:personId',
    summary: 'Ends a membership; the last lead stays.',
    reply: json(studyViewSchema),
    handle: dropMember,
  }),
];

type MemberParameters = { readonly personId: string };

async function inviteMember(
  call: Call<unknown, NewMemberRequest> & OnStudy,
): Promise<Outcome<StudyView>> {
  const { dependencies, person, study, body } = call;
  return withStudy(call, await addMember(dependencies, person, study, body));
}

async function editMember(
  call: Call<MemberParameters, MemberChangeRequest> & OnStudy,
): Promise<Outcome<StudyView>> {
  const { dependencies, person, study, params, body } = call;
  const { personId } = params;
  return withStudy(call, await changeMember(dependencies, person, study.id, personId, body.role));
}

async function dropMember(call: Call<MemberParameters> & OnStudy): Promise<Outcome<StudyView>> {
  const { dependencies, person, study, params } = call;
  return withStudy(call, await removeMember(dependencies, person, study.id, params.personId));
}
