import type { Report } from '#shared/report';
import type { Dependencies } from '../../dependencies';
import { refuse, type Outcome } from '../../errors/server-issue';
import type { StoredReport } from '../../models/report/report-store';
import type { Unit } from '../../models/unit-of-work';

/** A report as stored, and as `#shared/report` works with it. */
export interface OpenReport {
  readonly stored: StoredReport;
  readonly report: Report;
}

/** Reads a report of a study with its blocks and pins. */
export async function openReport(
  dependencies: Dependencies,
  studyId: string,
  reportId: string,
  unit?: Unit,
): Promise<Outcome<OpenReport>> {
  const { reports } = dependencies.database.stores;
  const stored = await reports.find(studyId, reportId, unit);
  if (stored === null) return refuse('notFound');
  return { ok: true, value: await readReport(dependencies, stored, unit) };
}

/** Adds blocks and pins to a stored report. */
export async function readReport(
  { database }: Dependencies,
  stored: StoredReport,
  unit?: Unit,
): Promise<OpenReport> {
  const rows = await database.stores.blocks.of([stored.id], unit);
  const blocks = rows.map(({ reportId: _reportId, ...block }) => block);
  const pins = await database.stores.reportPins.of(stored.id, unit);
  const { id, studyId, title, framing, houseStyleId, stage, seq } = stored;
  return {
    stored,
    report: { id, studyId, title, framing, houseStyleId, stage, seq, blocks, pins },
  };
}
