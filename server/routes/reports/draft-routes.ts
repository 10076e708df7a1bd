import { draftRequestSchema, draftSchema } from '#shared/api';
import type { DraftRequest, DraftView } from '#shared/api';
import type { StudyAction } from '#shared/permissions';
import type { Outcome } from '../../errors/server-issue';
import { discardDraft } from '../../services/drafts/discard-draft';
import { putDraft } from '../../services/drafts/put-draft';
import { actionsForBlock } from '../../services/reports/actions-for-steps';
import { decidedStudyRoute, empty, json, studyRoute } from '../define-route';
import type { Call, OnStudy, Route } from '../route';

interface OfBlock {
  readonly reportId: string;
  readonly blockId: string;
}

/** What somebody is typing in a block and has not made a step of. */
export const draftRoutes: readonly Route[] = [
  decidedStudyRoute(['editWordsBlocks', 'editNumbersBlocks'], decideDraft, {
    method: 'put',
    path: '/api/studies/:studyId/reports/:reportId/drafts/:blockId',
    summary: 'Keeps what the caller is typing in a block.',
    body: draftRequestSchema,
    reply: json(draftSchema),
    handle: keepDraft,
  }),
  studyRoute('editWordsBlocks', {
    method: 'delete',
    path: '/api/studies/:studyId/reports/:reportId/drafts/:blockId',
    summary: 'Forgets what the caller was typing in a block.',
    reply: empty(),
    handle: forgetDraft,
  }),
];

async function decideDraft({
  dependencies,
  study,
  params,
}: Call<OfBlock> & OnStudy): Promise<Outcome<readonly StudyAction[]>> {
  return actionsForBlock(dependencies, study.id, params.reportId, params.blockId);
}

async function keepDraft({
  dependencies,
  person,
  study,
  params,
  body,
}: Call<OfBlock, DraftRequest> & OnStudy): Promise<Outcome<DraftView>> {
  const sender = { person, studyId: study.id, reportId: params.reportId };
  return putDraft(dependencies, sender, params.blockId, body);
}

async function forgetDraft({
  dependencies,
  person,
  study,
  params,
}: Call<OfBlock> & OnStudy): Promise<Outcome<undefined>> {
  const sender = { person, studyId: study.id, reportId: params.reportId };
  return discardDraft(dependencies, sender, params.blockId);
}
