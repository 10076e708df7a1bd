import type { DraftView } from '#shared/api';
import type { Report } from '#shared/report';
import type { Dependencies } from '../../dependencies';
import type { Draft } from '../../models/draft/draft-store';

/** What a person was typing in a report, block by block. */
export async function listDrafts(
  { database }: Dependencies,
  report: Report,
  personId: string,
): Promise<DraftView[]> {
  return (await database.stores.drafts.of(report.id, personId)).map(presentDraft);
}

/** A draft without whose it is. */
export function presentDraft({ blockId, baseVersion, content, savedAt }: Draft): DraftView {
  return { blockId, baseVersion, content, savedAt };
}
