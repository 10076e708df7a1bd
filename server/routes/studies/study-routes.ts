import * as z from 'zod';
import {
  newStudyRequestSchema,
  studyChangeRequestSchema,
  studySummarySchema,
  studyViewSchema,
} from '#shared/api';
import type { NewStudyRequest, StudyChangeRequest, StudySummary, StudyView } from '#shared/api';
import type { Outcome } from '../../errors/server-issue';
import { changeStudy } from '../../services/studies/change-study';
import { createStudy } from '../../services/studies/create-study';
import { listStudies } from '../../services/studies/list-studies';
import { viewStudy } from '../../services/studies/view-study';
import { json, signedInRoute, studyRoute } from '../define-route';
import type { ByPerson, Call, OnStudy, Route, Unchanging } from '../route';

/** Studies themselves. */
export const studyRoutes: readonly Route[] = [
  signedInRoute({
    method: 'get',
    path: '/api/studies',
    summary: 'Lists the studies that the person is a member of.',
    reply: json(z.array(studySummarySchema)),
    handle: showStudies,
  }),
  signedInRoute({
    method: 'post',
    path: '/api/studies',
    summary: 'Begins a study; whoever begins it is its lead.',
    body: newStudyRequestSchema,
    reply: json(studyViewSchema, 201),
    handle: beginStudy,
  }),
  studyRoute('readStudy', {
    method: 'get',
    path: '/api/studies/:studyId',
    summary: 'Shows a study with its outcomes, milestones and members.',
    reply: json(studyViewSchema),
    handle: showStudy,
  }),
  studyRoute('manageStudy', {
    method: 'patch',
    path: '/api/studies/:studyId',
    summary: 'Changes the title, the design or the words of a study.',
    body: studyChangeRequestSchema,
    reply: json(studyViewSchema),
    handle: editStudy,
  }),
];

async function showStudies({
  dependencies,
  person,
}: Call & ByPerson): Promise<Outcome<Unchanging<StudySummary[]>>> {
  return { ok: true, value: await listStudies(dependencies, person) };
}

async function beginStudy({
  dependencies,
  person,
  body,
}: Call<unknown, NewStudyRequest> & ByPerson): Promise<Outcome<StudyView>> {
  const study = await createStudy(dependencies, person, body);
  return { ok: true, value: await viewStudy(dependencies, study.id, 'lead') };
}

async function showStudy({
  dependencies,
  study,
  role,
}: Call & OnStudy): Promise<Outcome<StudyView>> {
  return { ok: true, value: await viewStudy(dependencies, study.id, role) };
}

async function editStudy({
  dependencies,
  person,
  study,
  role,
  body,
}: Call<unknown, StudyChangeRequest> & OnStudy): Promise<Outcome<StudyView>> {
  await changeStudy(dependencies, person, study, body);
  return { ok: true, value: await viewStudy(dependencies, study.id, role) };
}
