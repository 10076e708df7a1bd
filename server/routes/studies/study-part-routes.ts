import { milestoneSchema, outcomeWordsSchema, studyViewSchema } from '#shared/api';
import type { Milestone, StudyView } from '#shared/api';
import type { OutcomeWords } from '#shared/analysis';
import type { Outcome } from '../../errors/server-issue';
import { putMilestone } from '../../services/studies/put-milestone';
import { putOutcome } from '../../services/studies/put-outcome';
import { removeMilestone } from '../../services/studies/remove-milestone';
import { removeOutcome } from '../../services/studies/remove-outcome';
import { json, studyRoute } from '../define-route';
import type { Call, OnStudy, Route } from '../route';
import { withStudy } from './with-study';

/** Outcomes, which analyses need, and milestones. Their ids come from the client. */
export const studyPartRoutes: readonly Route[] = [
  studyRoute('editData', {
    method: 'put',
    path: '/api/studies/:studyId/outcomes/:outcomeId',
    summary: 'Adds an outcome, or changes its words.',
    body: outcomeWordsSchema,
    reply: json(studyViewSchema),
    handle: storeOutcome,
  }),
  studyRoute('editData', {
    method: 'delete',
    path: '/api/studies/:studyId/outcomes/:outcomeId',
    summary: 'Removes an outcome that no analysis counts.',
    reply: json(studyViewSchema),
    handle: dropOutcome,
  }),
  studyRoute('manageStudy', {
    method: 'put',
    path: '/api/studies/:studyId/milestones/:milestoneId',
    summary: 'Adds a milestone, or changes it.',
    body: milestoneSchema,
    reply: json(studyViewSchema),
    handle: storeMilestone,
  }),
  studyRoute('manageStudy', {
    method: 'delete',
    path: '/api/studies/:studyId/milestones/:milestoneId',
    summary: 'Removes a milestone.',
    reply: json(studyViewSchema),
    handle: dropMilestone,
  }),
];

type OutcomeParameters = { readonly outcomeId: string };
type MilestoneParameters = { readonly milestoneId: string };

async function storeOutcome(
  call: Call<OutcomeParameters, OutcomeWords> & OnStudy,
): Promise<Outcome<StudyView>> {
  const { dependencies, person, study, params, body } = call;
  return withStudy(call, await putOutcome(dependencies, person, study, params.outcomeId, body));
}

async function dropOutcome(call: Call<OutcomeParameters> & OnStudy): Promise<Outcome<StudyView>> {
  const { dependencies, person, study, params } = call;
  return withStudy(call, await removeOutcome(dependencies, person, study.id, params.outcomeId));
}

async function storeMilestone(
  call: Call<MilestoneParameters, Milestone> & OnStudy,
): Promise<Outcome<StudyView>> {
  const { dependencies, person, study, params, body } = call;
  const { milestoneId } = params;
  return withStudy(call, await putMilestone(dependencies, person, study.id, milestoneId, body));
}

async function dropMilestone(
  call: Call<MilestoneParameters> & OnStudy,
): Promise<Outcome<StudyView>> {
  const { dependencies, person, study, params } = call;
  return withStudy(call, await removeMilestone(dependencies, person, study.id, params.milestoneId));
}
