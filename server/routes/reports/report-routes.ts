import * as z from 'zod';
import { newReportRequestSchema, reportSummarySchema, reportViewSchema } from '#shared/api';
import type { NewReportRequest, ReportSummary, ReportView } from '#shared/api';
import type { Outcome } from '../../errors/server-issue';
import { createReport } from '../../services/reports/create-report';
import { listReports } from '../../services/reports/list-reports';
import { removeReport } from '../../services/reports/remove-report';
import { viewReport } from '../../services/reports/view-report';
import { empty, json, studyRoute } from '../define-route';
import type { Call, OnStudy, Route } from '../route';

interface OfReport {
  readonly reportId: string;
}

/** Reports of a study. */
export const reportRoutes: readonly Route[] = [
  studyRoute('readStudy', {
    method: 'get',
    path: '/api/studies/:studyId/reports',
    summary: 'Lists the reports of a study, the latest changed first.',
    reply: json(z.array(reportSummarySchema)),
    handle: showReports,
  }),
  studyRoute('editWordsBlocks', {
    method: 'post',
    path: '/api/studies/:studyId/reports',
    summary: 'Begins a report without blocks.',
    body: newReportRequestSchema,
    reply: json(reportViewSchema, 201),
    handle: beginReport,
  }),
  studyRoute('readStudy', {
    method: 'get',
    path: '/api/studies/:studyId/reports/:reportId',
    summary: 'Shows a report with its blocks, its pinned results and the caller’s drafts.',
    reply: json(reportViewSchema),
    handle: showReport,
  }),
  studyRoute('manageStudy', {
    method: 'delete',
    path: '/api/studies/:studyId/reports/:reportId',
    summary: 'Removes a report.',
    reply: empty(),
    handle: dropReport,
  }),
];

async function showReports({
  dependencies,
  study,
}: Call & OnStudy): Promise<Outcome<ReportSummary[]>> {
  return { ok: true, value: await listReports(dependencies, study.id) };
}

async function beginReport({
  dependencies,
  person,
  study,
  body,
}: Call<unknown, NewReportRequest> & OnStudy): Promise<Outcome<ReportView>> {
  const created = await createReport(dependencies, person, study.id, body);
  return created.ok ? viewReport(dependencies, person, study.id, created.value) : created;
}

async function showReport({
  dependencies,
  person,
  study,
  params,
}: Call<OfReport> & OnStudy): Promise<Outcome<ReportView>> {
  return viewReport(dependencies, person, study.id, params.reportId);
}

async function dropReport({
  dependencies,
  person,
  study,
  params,
}: Call<OfReport> & OnStudy): Promise<Outcome<undefined>> {
  return removeReport(dependencies, person, study.id, params.reportId);
}
