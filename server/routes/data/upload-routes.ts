import * as z from 'zod';
import {
  cutViewSchema,
  readingOptionsSchema,
  storeCutRequestSchema,
  uploadViewSchema,
} from '#shared/api';
import type { CutView, ReadingOptions, StoreCutRequest, UploadView } from '#shared/api';
import type { Outcome } from '../../errors/server-issue';
import { viewCut } from '../../services/cuts/view-cut';
import { changeReadingOptions } from '../../services/uploads/change-reading-options';
import { discardUpload } from '../../services/uploads/discard-upload';
import { receiveUpload } from '../../services/uploads/receive-upload';
import { storeCut } from '../../services/uploads/store-cut';
import { viewUpload } from '../../services/uploads/view-upload';
import { empty, json, studyRoute } from '../define-route';
import { jsonField } from '../json-field';
import type { Call, OnStudy, Route, Unchanging, UploadedFile } from '../route';
import { presentCut, presentUpload } from './data-presenter';

const uploadFormSchema = z.object({
  options: jsonField(readingOptionsSchema).prefault('{}'),
  dataSetId: z.string().min(1).max(100).nullable().default(null),
});

/** Files on their way to become data cuts. */
export const uploadRoutes: readonly Route[] = [
  studyRoute('editData', {
    method: 'post',
    path: '/api/studies/:studyId/uploads',
    summary: 'Takes a file (CSV, TSV, XLSX) and begins to read it.',
    upload: { field: 'file' },
    body: uploadFormSchema,
    reply: json(uploadViewSchema, 202),
    handle: takeFile,
  }),
  studyRoute('editData', {
    method: 'get',
    path: '/api/studies/:studyId/uploads/:uploadId',
    summary: 'Tells how far an upload is, and what its file holds once it is read.',
    reply: json(uploadViewSchema),
    handle: showUpload,
  }),
  studyRoute('editData', {
    method: 'delete',
    path: '/api/studies/:studyId/uploads/:uploadId',
    summary: 'Gives an upload up, also while it is read.',
    reply: empty(),
    handle: dropUpload,
  }),
  studyRoute('editData', {
    method: 'put',
    path: '/api/studies/:studyId/uploads/:uploadId/options',
    summary: 'Reads the file of an upload again in another way.',
    body: readingOptionsSchema,
    reply: json(uploadViewSchema, 202),
    handle: readAgain,
  }),
  studyRoute('editData', {
    method: 'post',
    path: '/api/studies/:studyId/uploads/:uploadId/cut',
    summary: 'Stores a read file as a data cut, described by a code book; whole or not at all.',
    body: storeCutRequestSchema,
    reply: json(cutViewSchema, 201),
    handle: makeCut,
  }),
];

type UploadForm = z.infer<typeof uploadFormSchema>;
type UploadParameters = { readonly uploadId: string };

async function takeFile(
  call: Call<unknown, UploadForm, unknown, UploadedFile> & OnStudy,
): Promise<Outcome<Unchanging<UploadView>>> {
  const { dependencies, person, study, body, file } = call;
  const { path, fileName } = file;
  const arrived = { path, fileName, ...body };
  const upload = await receiveUpload(dependencies, person, study, arrived);
  return upload.ok ? { ok: true, value: presentUpload(upload.value) } : upload;
}

async function showUpload({
  dependencies,
  study,
  params,
}: Call<UploadParameters> & OnStudy): Promise<Outcome<Unchanging<UploadView>>> {
  const upload = await viewUpload(dependencies, study.id, params.uploadId);
  return upload.ok ? { ok: true, value: presentUpload(upload.value) } : upload;
}

async function dropUpload({
  dependencies,
  study,
  params,
}: Call<UploadParameters> & OnStudy): Promise<Outcome<undefined>> {
  return discardUpload(dependencies, study.id, params.uploadId);
}

async function readAgain({
  dependencies,
  study,
  params,
  body,
}: Call<UploadParameters, ReadingOptions> & OnStudy): Promise<Outcome<Unchanging<UploadView>>> {
  const upload = await changeReadingOptions(dependencies, study.id, params.uploadId, body);
  return upload.ok ? { ok: true, value: presentUpload(upload.value) } : upload;
}

async function makeCut({
  dependencies,
  person,
  study,
  params,
  body,
}: Call<UploadParameters, StoreCutRequest> & OnStudy): Promise<Outcome<Unchanging<CutView>>> {
  const cutId = await storeCut(dependencies, person, study, params.uploadId, body);
  if (!cutId.ok) return cutId;
  const cut = await viewCut(dependencies, study.id, cutId.value);
  return cut.ok ? { ok: true, value: presentCut(cut.value) } : cut;
}
