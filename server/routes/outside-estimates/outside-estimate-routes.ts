import * as z from 'zod';
import {
  outsideEstimateChangeRequestSchema,
  outsideEstimateEntrySchema,
  outsideEstimateSchema,
} from '#shared/api';
import type { OutsideEstimateChangeRequest } from '#shared/api';
import type { OutsideEstimate, OutsideEstimateEntry } from '#shared/outside-estimates';
import type { Outcome } from '../../errors/server-issue';
import { addEstimate } from '../../services/outside-estimates/add-estimates';
import { changeEstimate } from '../../services/outside-estimates/change-estimate';
import { importEstimates } from '../../services/outside-estimates/import-estimates';
import { listEstimates } from '../../services/outside-estimates/list-estimates';
import { removeEstimate } from '../../services/outside-estimates/remove-estimate';
import { empty, json, studyRoute } from '../define-route';
import type { Call, OnStudy, Route, UploadedFile } from '../route';

interface OfAnalysis {
  readonly analysisId: string;
}

interface OfEstimate extends OfAnalysis {
  readonly estimateId: string;
}

/** Adjusted estimates that models outside computed, beside an analysis. */
export const outsideEstimateRoutes: readonly Route[] = [
  studyRoute('readStudy', {
    method: 'get',
    path: '/api/studies/:studyId/analyses/:analysisId/outside-estimates',
    summary: 'Lists the estimates from elsewhere beside an analysis.',
    reply: json(z.array(outsideEstimateSchema)),
    handle: showEstimates,
  }),
  studyRoute('editData', {
    method: 'post',
    path: '/api/studies/:studyId/analyses/:analysisId/outside-estimates',
    summary: 'Puts an estimate from elsewhere beside an analysis, once its numbers are checked.',
    body: outsideEstimateEntrySchema,
    reply: json(outsideEstimateSchema, 201),
    handle: enterEstimate,
  }),
  studyRoute('editData', {
    method: 'post',
    path: '/api/studies/:studyId/analyses/:analysisId/outside-estimates/file',
    summary: 'Puts the estimates of a CSV file beside an analysis: all of them, or none.',
    upload: { field: 'file' },
    reply: json(z.array(outsideEstimateSchema), 201),
    handle: takeFile,
  }),
  studyRoute('editData', {
    method: 'put',
    path: '/api/studies/:studyId/analyses/:analysisId/outside-estimates/:estimateId',
    summary: 'Changes an estimate from elsewhere.',
    body: outsideEstimateChangeRequestSchema,
    reply: json(outsideEstimateSchema),
    handle: editEstimate,
  }),
  studyRoute('editData', {
    method: 'delete',
    path: '/api/studies/:studyId/analyses/:analysisId/outside-estimates/:estimateId',
    summary: 'Removes an estimate from elsewhere; the trail keeps it.',
    reply: empty(),
    handle: dropEstimate,
  }),
];

async function showEstimates({
  dependencies,
  study,
  params,
}: Call<OfAnalysis> & OnStudy): Promise<Outcome<readonly OutsideEstimate[]>> {
  return listEstimates(dependencies, { studyId: study.id, analysisId: params.analysisId });
}

async function enterEstimate({
  dependencies,
  person,
  study,
  params,
  body,
}: Call<OfAnalysis, OutsideEstimateEntry> & OnStudy): Promise<Outcome<OutsideEstimate>> {
  const place = { studyId: study.id, analysisId: params.analysisId };
  return addEstimate(dependencies, person, place, body);
}

async function takeFile({
  dependencies,
  person,
  study,
  params,
  file,
}: Call<OfAnalysis, unknown, unknown, UploadedFile> & OnStudy): Promise<
  Outcome<readonly OutsideEstimate[]>
> {
  const place = { studyId: study.id, analysisId: params.analysisId };
  return importEstimates(dependencies, person, place, file);
}

async function editEstimate({
  dependencies,
  person,
  study,
  params,
  body,
}: Call<OfEstimate, OutsideEstimateChangeRequest> & OnStudy): Promise<Outcome<OutsideEstimate>> {
  const { analysisId, estimateId: id } = params;
  return changeEstimate(dependencies, person, { studyId: study.id, analysisId, id }, body);
}

async function dropEstimate({
  dependencies,
  person,
  study,
  params,
}: Call<OfEstimate> & OnStudy): Promise<Outcome<undefined>> {
  const { analysisId, estimateId: id } = params;
  return removeEstimate(dependencies, person, { studyId: study.id, analysisId, id });
}
