import { readFile } from 'node:fs/promises';
import type { Response } from 'supertest';
import type { CutView, ReadingOptions, StoreCutRequest, UploadView } from '#shared/api';
import type { CodeBook } from '#shared/code-book';
import type { Study } from '../../server/models/study/study-store';
import type { Browser } from './browser';

/** A file to send, and how it is to be read. */
export interface SentFile {
  readonly bytes: Buffer | string;
  readonly fileName?: string;
  readonly options?: Partial<ReadingOptions>;
  readonly dataSetId?: string;
}

/** Sends a file; answers at once, while it is read. */
export async function sendFile(
  browser: Browser,
  study: Study,
  { bytes, fileName = 'data.csv', options, dataSetId }: SentFile,
): Promise<Response> {
  const request = browser
    .post(`/api/studies/${study.id}/uploads`)
    .attach('file', Buffer.from(bytes), fileName);
  if (options !== undefined) void request.field('options', JSON.stringify(options));
  if (dataSetId !== undefined) void request.field('dataSetId', dataSetId);
  return request;
}

/** Waits until a file was read, or could not be; gives the upload as it is then. */
export async function untilRead(
  browser: Browser,
  study: Study,
  uploadId: string,
): Promise<UploadView> {
  for (let attempt = 0; attempt < 600; attempt += 1) {
    const response = await browser.get(`/api/studies/${study.id}/uploads/${uploadId}`);
    const upload = response.body as UploadView;
    if (upload.state !== 'reading') return upload;
    await new Promise((resolve) => setTimeout(resolve, 25));
  }
  throw new Error(`Upload ${uploadId} was not read within 15 seconds.`);
}

/** Sends a file and waits until it was read, or could not be. */
export async function readUpload(
  browser: Browser,
  study: Study,
  file: SentFile,
): Promise<UploadView> {
  const response = await sendFile(browser, study, file);
  if (response.status !== 202) throw new Error(`The file was refused: ${response.text}`);
  return untilRead(browser, study, (response.body as UploadView).id);
}

/** Stores a read file as a cut, as a new data set unless the request names one. */
export function storeUpload(
  browser: Browser,
  study: Study,
  upload: UploadView,
  changes: Partial<StoreCutRequest> = {},
): Promise<Response> {
  return browser.post(`/api/studies/${study.id}/uploads/${upload.id}/cut`, {
    dataSetId: upload.dataSetId,
    dataSetName: 'Data',
    dataDate: '2026-03-31',
    codeBook: upload.proposedCodeBook,
    ...changes,
  });
}

/** Loads a file the whole way: sent, read, stored with the code book it proposes. */
export async function loadFile(
  browser: Browser,
  study: Study,
  file: SentFile,
  change: (codeBook: CodeBook) => CodeBook = (codeBook) => codeBook,
): Promise<CutView> {
  const upload = await readUpload(browser, study, file);
  const { proposedCodeBook, problem } = upload;
  if (proposedCodeBook === null)
    throw new Error(`The file was not read: ${problem?.message ?? ''}`);
  const codeBook = change(proposedCodeBook);
  const response = await storeUpload(browser, study, upload, { codeBook });
  if (response.status !== 201) throw new Error(`The cut was refused: ${response.text}`);
  return response.body as CutView;
}

/** The bytes of a file of `tests/data`. */
export function openData(name: string): Promise<Buffer> {
  return readFile(new URL(`../data/${name}`, import.meta.url));
}
