import * as z from 'zod';
import { stepsRequestSchema, stepsViewSchema } from '#shared/api';
import type { StepsRequest, StepsView } from '#shared/api';
import type { StudyAction } from '#shared/permissions';
import type { Outcome } from '../../errors/server-issue';
import { acceptSteps } from '../../services/reports/accept-steps';
import { actionsForSteps } from '../../services/reports/actions-for-steps';
import { listSteps } from '../../services/reports/list-steps';
import { decidedStudyRoute, json, studyRoute } from '../define-route';
import type { Call, OnStudy, Route } from '../route';

interface OfReport {
  readonly reportId: string;
}

const afterSchema = z.object({ after: z.coerce.number().int().min(0).default(0) });

const MAY_CHANGE_SOMETHING: readonly StudyAction[] = [
  'editWordsBlocks',
  'editNumbersBlocks',
  'setFraming',
  'editHouseStyle',
];

/** The steps by which a report changes. */
export const stepRoutes: readonly Route[] = [
  studyRoute('readStudy', {
    method: 'get',
    path: '/api/studies/:studyId/reports/:reportId/steps',
    summary: 'Lists the steps of a report after the one numbered `after`.',
    query: afterSchema,
    reply: json(stepsViewSchema),
    handle: showSteps,
  }),
  decidedStudyRoute(MAY_CHANGE_SOMETHING, decideSteps, {
    method: 'post',
    path: '/api/studies/:studyId/reports/:reportId/steps',
    summary: 'Changes a report by steps: all of them or none; a repeated id is applied once.',
    body: stepsRequestSchema,
    reply: json(stepsViewSchema),
    handle: takeSteps,
  }),
];

async function showSteps({
  dependencies,
  study,
  params,
  query,
}: Call<OfReport, unknown, z.infer<typeof afterSchema>> & OnStudy): Promise<Outcome<StepsView>> {
  return listSteps(dependencies, study.id, params.reportId, query.after);
}

async function decideSteps({
  dependencies,
  study,
  params,
  body,
}: Call<OfReport, StepsRequest> & OnStudy): Promise<Outcome<readonly StudyAction[]>> {
  return actionsForSteps(dependencies, study.id, params.reportId, body);
}

async function takeSteps({
  dependencies,
  person,
  study,
  params,
  body,
}: Call<OfReport, StepsRequest> & OnStudy): Promise<Outcome<StepsView>> {
  const sender = { person, studyId: study.id, reportId: params.reportId };
  return acceptSteps(dependencies, sender, body);
}
