import { join } from 'node:path';
import type { PinnedAnalysis } from '#shared/report';
import type { Dependencies } from '../../dependencies';
import type { Outcome } from '../../errors/server-issue';
import { EXPORT_FORMATS, type ExportFormatId } from '../../exports/export-format';
import type { ExportRequest } from '../../exports/export-request';
import { exportFileName } from '../../exports/file-name';
import type { Study } from '../../models/study/study-store';
import { composeStoredReport, type ComposedStoredReport } from './compose-stored-report';
import { pinnedCodeBooks } from './pinned-code-books';

/** A report as a file. */
export interface ExportedReport {
  readonly fileName: string;
  readonly bytes: Uint8Array;
}

/** Makes a file of a report as it is stored now; the same state gives the same bytes. */
export async function exportReport(
  dependencies: Dependencies,
  study: Study,
  reportId: string,
  formatId: ExportFormatId,
): Promise<Outcome<ExportedReport>> {
  const composed = await composeStoredReport(dependencies, study.id, reportId);
  if (!composed.ok) return composed;
  const request = await requestOf(dependencies, study, composed.value);
  const made = await dependencies.exporter.make({ formatId, request });
  if (!made.ok) return made;
  const { title } = composed.value.report;
  const fileName = exportFileName(title, EXPORT_FORMATS[formatId].extension);
  return { ok: true, value: { fileName, bytes: made.value } };
}

async function requestOf(
  dependencies: Dependencies,
  { id, title, invented }: Study,
  { report, composed, pins, houseStyle, changedAt }: ComposedStoredReport,
): Promise<ExportRequest> {
  return {
    report: composed,
    houseStyle,
    phrasebook: dependencies.phrasebook,
    pins: inOrder(pins),
    codeBooks: await pinnedCodeBooks(dependencies, id, report),
    study: { title, invented },
    changedAt,
    fontDirectory: join(dependencies.config.dataDirectory, 'fonts'),
  };
}

const NUMBERS = new Intl.Collator('en', { numeric: true });

/** A1, A2, A10. */
function inOrder(pins: readonly PinnedAnalysis[]): readonly PinnedAnalysis[] {
  return pins.toSorted((one, other) => NUMBERS.compare(one.number, other.number));
}
