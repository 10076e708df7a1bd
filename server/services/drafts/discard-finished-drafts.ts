import { contentChangedBy } from '#shared/report';
import type { Dependencies } from '../../dependencies';
import type { Unit } from '../../models/unit-of-work';
import type { Journal } from '../reports/journal';

/** Forgets a person's drafts of the blocks whose content the journal's steps changed. */
export async function discardFinishedDrafts(
  { database }: Dependencies,
  { report, made }: Journal,
  personId: string,
  unit: Unit,
): Promise<void> {
  const blockIds = new Set(made.flatMap(({ forward }) => contentChangedBy(forward) ?? []));
  for (const blockId of blockIds) {
    await database.stores.drafts.remove(report.id, blockId, personId, unit);
  }
}
