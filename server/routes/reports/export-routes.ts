import type { Outcome } from '../../errors/server-issue';
import { EXPORT_FORMATS, type ExportFormatId } from '../../exports/export-format';
import { exportReport } from '../../services/reports/export-report';
import { file, studyRoute } from '../define-route';
import type { Call, FileReply, OnStudy, Route } from '../route';

interface OfReport {
  readonly reportId: string;
}

/** A report as a file, in every format of the register. */
export const exportRoutes: readonly Route[] = (
  Object.keys(EXPORT_FORMATS) as readonly ExportFormatId[]
).map((formatId) =>
  studyRoute('downloadDraft', {
    method: 'get',
    path: `/api/studies/:studyId/reports/:reportId/exports/${formatId}`,
    summary: `Downloads a report as ${EXPORT_FORMATS[formatId].label}.`,
    reply: file(EXPORT_FORMATS[formatId].contentType),
    handle: (call) => download(call, formatId),
  }),
);

async function download(
  { dependencies, study, params }: Call<OfReport> & OnStudy,
  formatId: ExportFormatId,
): Promise<Outcome<FileReply>> {
  return exportReport(dependencies, study, params.reportId, formatId);
}
