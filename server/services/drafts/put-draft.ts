import type { DraftRequest, DraftView } from '#shared/api';
import { parseContent } from '#shared/report';
import type { Dependencies } from '../../dependencies';
import { refuse, type Outcome } from '../../errors/server-issue';
import { timestamp } from '../../runtime/clock';
import { openReport } from '../reports/open-report';
import { refuseStep } from '../reports/refuse-step';
import type { StepSender } from '../reports/accept-steps';
import { presentDraft } from './list-drafts';

/** Keeps what a person is typing in a block until it becomes a step. */
export async function putDraft(
  dependencies: Dependencies,
  { person, studyId, reportId }: StepSender,
  blockId: string,
  { baseVersion, content }: DraftRequest,
): Promise<Outcome<DraftView>> {
  const { unitOfWork, stores } = dependencies.database;
  return unitOfWork<Outcome<DraftView>>(`report:${reportId}`, async (unit) => {
    const opened = await openReport(dependencies, studyId, reportId, unit);
    if (!opened.ok) return opened;
    const block = opened.value.report.blocks.find(({ id }) => id === blockId);
    if (block === undefined) return refuse('blockUnknown', { facts: { blockId } });
    const parsed = parseContent(block.kind, content);
    if (!parsed.ok) return refuseStep(parsed.issue);
    const savedAt = timestamp(dependencies.clock);
    const typed = { baseVersion, content: parsed.value, savedAt };
    const draft = { reportId, blockId, personId: person.id, ...typed };
    await stores.drafts.put(draft, unit);
    return { ok: true, value: presentDraft(draft) };
  });
}
