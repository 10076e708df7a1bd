import type { ReportSummary } from '#shared/api';
import { visibleBlocks } from '#shared/report';
import type { Dependencies } from '../../dependencies';
import type { StoredBlock } from '../../models/block/block-store';
import type { StoredReport } from '../../models/report/report-store';

/** How many blocks a summary tells the kinds of. */
const SKETCHED_BLOCKS = 12;

/** The reports of a study, the latest changed first. */
export async function listReports(
  { database }: Dependencies,
  studyId: string,
): Promise<ReportSummary[]> {
  const { reports, blocks, users } = database.stores;
  const found = await reports.list(studyId);
  const stored = await blocks.of(found.map(({ id }) => id));
  const people = await users.findMany(found.flatMap(({ updatedBy }) => updatedBy ?? []));
  const names = new Map(people.map(({ id, name }) => [id, name]));
  return found.map((report) => summarise(report, stored, names));
}

function summarise(
  { id, studyId, title, stage, seq, updatedAt, updatedBy }: StoredReport,
  stored: readonly StoredBlock[],
  names: ReadonlyMap<string, string>,
): ReportSummary {
  const shown = visibleBlocks({ blocks: stored.filter(({ reportId }) => reportId === id) });
  return {
    id,
    studyId,
    title,
    stage,
    seq,
    blockCount: shown.length,
    blockKinds: shown.slice(0, SKETCHED_BLOCKS).map(({ kind }) => kind),
    updatedAt,
    updatedBy: names.get(updatedBy ?? '') ?? null,
  };
}
