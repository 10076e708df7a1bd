import * as z from 'zod';
import {
  analysisChangeRequestSchema,
  analysisSummarySchema,
  analysisViewSchema,
  newAnalysisRequestSchema,
} from '#shared/api';
import type {
  AnalysisChangeRequest,
  AnalysisSummary,
  AnalysisView,
  NewAnalysisRequest,
} from '#shared/api';
import type { Outcome } from '../../errors/server-issue';
import { changeAnalysis } from '../../services/analyses/change-analysis';
import { createAnalysis } from '../../services/analyses/create-analysis';
import { listAnalyses } from '../../services/analyses/list-analyses';
import { removeAnalysis } from '../../services/analyses/remove-analysis';
import { viewAnalysis } from '../../services/analyses/view-analysis';
import { empty, json, studyRoute } from '../define-route';
import type { Call, OnStudy, Route, Unchanging } from '../route';

interface OfAnalysis {
  readonly analysisId: string;
}

/** Analyses of a study. */
export const analysisRoutes: readonly Route[] = [
  studyRoute('readStudy', {
    method: 'get',
    path: '/api/studies/:studyId/analyses',
    summary: 'Lists the analyses of a study with the reports that show them.',
    reply: json(z.array(analysisSummarySchema)),
    handle: showAnalyses,
  }),
  studyRoute('editData', {
    method: 'post',
    path: '/api/studies/:studyId/analyses',
    summary: 'Defines an analysis, computes it and stores its result.',
    body: newAnalysisRequestSchema,
    reply: json(analysisViewSchema, 201),
    handle: defineAnalysis,
  }),
  studyRoute('readStudy', {
    method: 'get',
    path: '/api/studies/:studyId/analyses/:analysisId',
    summary: 'Shows an analysis with its newest result and its changes.',
    reply: json(analysisViewSchema),
    handle: showAnalysis,
  }),
  studyRoute('editData', {
    method: 'put',
    path: '/api/studies/:studyId/analyses/:analysisId',
    summary: 'Saves an analysis as a new version; drafts that show it follow.',
    body: analysisChangeRequestSchema,
    reply: json(analysisViewSchema),
    handle: editAnalysis,
  }),
  studyRoute('editData', {
    method: 'delete',
    path: '/api/studies/:studyId/analyses/:analysisId',
    summary: 'Removes an analysis that no report shows.',
    reply: empty(),
    handle: dropAnalysis,
  }),
];

async function showAnalyses({
  dependencies,
  study,
}: Call & OnStudy): Promise<Outcome<AnalysisSummary[]>> {
  return { ok: true, value: await listAnalyses(dependencies, study.id) };
}

async function defineAnalysis({
  dependencies,
  person,
  study,
  body,
}: Call<unknown, NewAnalysisRequest> & OnStudy): Promise<Outcome<Unchanging<AnalysisView>>> {
  const created = await createAnalysis(dependencies, person, study, body);
  return created.ok ? viewAnalysis(dependencies, study, created.value) : created;
}

async function showAnalysis({
  dependencies,
  study,
  params,
}: Call<OfAnalysis> & OnStudy): Promise<Outcome<Unchanging<AnalysisView>>> {
  return viewAnalysis(dependencies, study, params.analysisId);
}

async function editAnalysis({
  dependencies,
  person,
  study,
  params,
  body,
}: Call<OfAnalysis, AnalysisChangeRequest> & OnStudy): Promise<Outcome<Unchanging<AnalysisView>>> {
  const changed = await changeAnalysis(dependencies, person, study, params.analysisId, body);
  return changed.ok ? viewAnalysis(dependencies, study, params.analysisId) : changed;
}

async function dropAnalysis({
  dependencies,
  person,
  study,
  params,
}: Call<OfAnalysis> & OnStudy): Promise<Outcome<undefined>> {
  return removeAnalysis(dependencies, person, study.id, params.analysisId);
}
