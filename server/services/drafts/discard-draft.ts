import type { Dependencies } from '../../dependencies';
import { refuse, type Outcome } from '../../errors/server-issue';
import type { StepSender } from '../reports/accept-steps';

/** Forgets what a person was typing in a block; nothing to forget is no failure. */
export async function discardDraft(
  { database }: Dependencies,
  { person, studyId, reportId }: StepSender,
  blockId: string,
): Promise<Outcome<undefined>> {
  const { unitOfWork, stores } = database;
  return unitOfWork<Outcome<undefined>>(`report:${reportId}`, async (unit) => {
    if ((await stores.reports.find(studyId, reportId, unit)) === null) return refuse('notFound');
    await stores.drafts.remove(reportId, blockId, person.id, unit);
    return { ok: true, value: undefined };
  });
}
