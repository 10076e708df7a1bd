import * as z from 'zod';
import {
  codeBookChangeRequestSchema,
  codeBookViewSchema,
  cutViewSchema,
  dataSetViewSchema,
  recordsPageSchema,
  tallyRequestSchema,
  tallySchema,
  typedCountsRequestSchema,
} from '#shared/api';
import type {
  CodeBookChangeRequest,
  CodeBookView,
  CutView,
  DataSetView,
  RecordsPage,
  TypedCountsRequest,
} from '#shared/api';
import type { Tally, TallyRequest } from '#shared/tally';
import type { Outcome } from '../../errors/server-issue';
import { changeCodeBook } from '../../services/code-books/change-code-book';
import { viewCodeBook } from '../../services/code-books/view-code-book';
import { listRecords } from '../../services/cuts/list-records';
import { storeTypedCounts } from '../../services/cuts/store-typed-counts';
import { viewCut } from '../../services/cuts/view-cut';
import { listDataSets } from '../../services/data-sets/list-data-sets';
import { countCut } from '../../services/tallies/count-cut';
import { json, studyRoute } from '../define-route';
import type { Call, OnStudy, Route, Unchanging } from '../route';
import { presentCodeBook, presentCut, presentDataSet } from './data-presenter';

const recordsWindowSchema = z.object({
  offset: z.coerce.number().int().min(0).max(2 ** 31).default(0),
  limit: z.coerce.number().int().min(1).max(500).default(50),
});

/** Data sets, their cuts, code books, records and counts. */
export const dataRoutes: readonly Route[] = [
  studyRoute('readStudy', {
    method: 'get',
    path: '/api/studies/:studyId/data-sets',
    summary: 'Lists the data sets of a study with their cuts.',
    reply: json(z.array(dataSetViewSchema)),
    handle: showDataSets,
  }),
  studyRoute('editData', {
    method: 'post',
    path: '/api/studies/:studyId/typed-counts',
    summary: 'Stores counts that were typed into a grid as a new data set.',
    body: typedCountsRequestSchema,
    reply: json(cutViewSchema, 201),
    handle: takeTypedCounts,
  }),
  studyRoute('readStudy', {
    method: 'get',
    path: '/api/studies/:studyId/cuts/:cutId',
    summary: 'Shows a data cut with the profile of its columns.',
    reply: json(cutViewSchema),
    handle: showCut,
  }),
  studyRoute('seeRecords', {
    method: 'get',
    path: '/api/studies/:studyId/cuts/:cutId/records',
    summary: 'Shows single records of a cut, page by page.',
    query: recordsWindowSchema,
    reply: json(recordsPageSchema),
    handle: showRecords,
  }),
  studyRoute('readStudy', {
    method: 'post',
    path: '/api/studies/:studyId/cuts/:cutId/tallies',
    summary: 'Counts the records of a cut by the levels of some columns.',
    body: tallyRequestSchema,
    reply: json(tallySchema),
    handle: count,
  }),
  studyRoute('readStudy', {
    method: 'get',
    path: '/api/studies/:studyId/data-sets/:dataSetId/code-book',
    summary: 'Shows the newest code book of a data set.',
    reply: json(codeBookViewSchema),
    handle: showCodeBook,
  }),
  studyRoute('editData', {
    method: 'put',
    path: '/api/studies/:studyId/data-sets/:dataSetId/code-book',
    summary: 'Stores a new version of a code book; the analyses of the data set follow.',
    body: codeBookChangeRequestSchema,
    reply: json(codeBookViewSchema),
    handle: editCodeBook,
  }),
];

type CutParameters = { readonly cutId: string };
type DataSetParameters = { readonly dataSetId: string };
type Window = z.infer<typeof recordsWindowSchema>;

async function showDataSets({
  dependencies,
  study,
}: Call & OnStudy): Promise<Outcome<Unchanging<DataSetView[]>>> {
  const dataSets = await listDataSets(dependencies, study.id);
  return { ok: true, value: dataSets.map(presentDataSet) };
}

async function takeTypedCounts({
  dependencies,
  person,
  study,
  body,
}: Call<unknown, TypedCountsRequest> & OnStudy): Promise<Outcome<Unchanging<CutView>>> {
  const cutId = await storeTypedCounts(dependencies, person, study, body);
  if (!cutId.ok) return cutId;
  const cut = await viewCut(dependencies, study.id, cutId.value);
  return cut.ok ? { ok: true, value: presentCut(cut.value) } : cut;
}

async function showCut({
  dependencies,
  study,
  params,
}: Call<CutParameters> & OnStudy): Promise<Outcome<Unchanging<CutView>>> {
  const cut = await viewCut(dependencies, study.id, params.cutId);
  return cut.ok ? { ok: true, value: presentCut(cut.value) } : cut;
}

async function showRecords({
  dependencies,
  study,
  params,
  query,
}: Call<CutParameters, unknown, Window> & OnStudy): Promise<Outcome<Unchanging<RecordsPage>>> {
  const records = await listRecords(dependencies, study.id, params.cutId, query);
  if (!records.ok) return records;
  return { ok: true, value: { ...records.value, offset: query.offset } };
}

async function count({
  dependencies,
  study,
  params,
  body,
}: Call<CutParameters, TallyRequest> & OnStudy): Promise<Outcome<Tally>> {
  return countCut(dependencies, study.id, params.cutId, body);
}

async function showCodeBook({
  dependencies,
  study,
  params,
}: Call<DataSetParameters> & OnStudy): Promise<Outcome<Unchanging<CodeBookView>>> {
  const codeBook = await viewCodeBook(dependencies, study.id, params.dataSetId);
  return codeBook.ok ? { ok: true, value: presentCodeBook(codeBook.value) } : codeBook;
}

async function editCodeBook({
  dependencies,
  person,
  study,
  params,
  body,
}: Call<DataSetParameters, CodeBookChangeRequest> & OnStudy): Promise<
  Outcome<Unchanging<CodeBookView>>
> {
  const codeBook = await changeCodeBook(dependencies, person, study, params.dataSetId, body);
  return codeBook.ok ? { ok: true, value: presentCodeBook(codeBook.value) } : codeBook;
}
