import { describe, expect, it } from 'vitest';
import type { UploadView } from '#shared/api';
import { replaceColumn, setLayout, type CodeBook } from '#shared/code-book';
import { columnOf, NOTHING, ROWS, useDataStudy } from '../../builders/data-study';
import { loadFile, readUpload, storeUpload } from '../../builders/uploads';

const data = useDataStudy();

interface Refusal {
  readonly fields: readonly { readonly path: string }[];
}

describe('POST /api/studies/:studyId/uploads/:uploadId/cut rejects', () => {
  const COUNTED = 'sex,n,all\nf,1,10\nm,2,20\nx,7,5\n';

  it('an upload that is not there, that failed, or that was stored', async () => {
    const failed = await readUpload(data.browser, data.study, { bytes: 'a\n' });
    const upload = await readUpload(data.browser, data.study, { bytes: ROWS });
    const body = { codeBook: upload.proposedCodeBook! };
    const gone = { ...upload, id: NOTHING };
    expect((await storeUpload(data.browser, data.study, gone)).status).toBe(404);
    expect((await storeUpload(data.browser, data.study, failed, body)).body).toMatchObject({
      code: 'uploadNotReady',
    });
    await storeUpload(data.browser, data.study, upload);
    const twice = await storeUpload(data.browser, data.study, upload);
    expect([twice.status, twice.body]).toMatchObject([409, { code: 'uploadNotReady' }]);
    expect(await data.dataSets()).toHaveLength(1);
  });

  it('a second request that comes at the same time', async () => {
    const upload = await readUpload(data.browser, data.study, { bytes: ROWS });
    const responses = await Promise.all([
      storeUpload(data.browser, data.study, upload),
      storeUpload(data.browser, data.study, upload),
    ]);
    expect(responses.map(({ status }) => status).sort()).toEqual([201, 409]);
    expect(await data.dataSets()).toHaveLength(1);
  });

  it('a data set of another study, a missing name, a date that is none', async () => {
    const upload = await readUpload(data.browser, data.study, { bytes: ROWS });
    const refusal = async (change: object) =>
      (await storeUpload(data.browser, data.study, upload, change)).body as Refusal;
    expect((await refusal({ dataSetId: NOTHING })).fields[0]?.path).toBe('dataSetId');
    expect((await refusal({ dataSetName: ' ' })).fields[0]?.path).toBe('dataSetName');
    expect((await refusal({ dataDate: '31.3.2026' })).fields[0]?.path).toBe('dataDate');
  });

  it('a code book that contradicts itself', async () => {
    const upload = await readUpload(data.browser, data.study, { bytes: ROWS });
    const book = upload.proposedCodeBook!;
    const sex = columnOf(book, 'sex');
    const codeBook = replaceColumn(book, { ...sex, referenceLevelId: 'gone' });
    const response = await storeUpload(data.browser, data.study, upload, { codeBook });
    expect([response.status, response.body]).toMatchObject([
      422,
      {
        fields: [
          {
            path: 'codeBook.columns.0.referenceLevelId',
            message: 'The reference of "Sex" is not one of its levels.',
          },
        ],
      },
    ]);
  });

  it.each([
    [
      'a negative count',
      'sex,n\nf,1\nm,-2\nx,3\n',
      'Row 2 of the count column "N" holds "-2", which is not a whole number of 0 or more.',
    ],
    [
      'a count that is not whole',
      'sex,n\nf,1\nm,2\nx,3.5\n',
      'Row 3 of the count column "N" holds "3.5", which is not a whole number of 0 or more.',
    ],
    [
      'a blank count',
      'sex,n\nf,1\nm,2\nx,\ny,3\n',
      'Row 3 of the count column "N" is blank, and every row has to have a count.',
    ],
  ])('%s', async (_, bytes, message) => {
    const upload = await readUpload(data.browser, data.study, { bytes });
    const response = await storeUpload(data.browser, data.study, upload, {
      codeBook: counting(upload, { kind: 'count', columnId: 'n' }),
    });
    expect(response.body).toMatchObject({ fields: [{ path: 'codeBook.layout', message }] });
    expect(await data.dataSets()).toEqual([]);
  });

  it('more events than people in total', async () => {
    const upload = await readUpload(data.browser, data.study, { bytes: COUNTED });
    const codeBook = counting(upload, {
      kind: 'eventsAndTotal',
      eventsColumnId: 'n',
      totalColumnId: 'all',
    });
    const response = await storeUpload(data.browser, data.study, upload, { codeBook });
    expect(response.body).toMatchObject({
      fields: [
        { path: 'codeBook.layout', message: 'Row 3 has more events (7) than people in total (5).' },
      ],
    });
  });

  it('a code book that was carried over from a version that is no longer the newest', async () => {
    const { dataSetId } = await loadFile(data.browser, data.study, { bytes: ROWS });
    const upload = await readUpload(data.browser, data.study, { bytes: ROWS, dataSetId });
    const { content } = await data.codeBook(dataSetId);
    const changed = replaceColumn(content, { ...columnOf(content, 'sex'), label: 'Sex at birth' });
    const url = data.at(`/data-sets/${dataSetId}/code-book`);
    await data.browser.put(url, { baseNumber: 1, content: changed });
    const response = await storeUpload(data.browser, data.study, upload);
    expect([response.status, response.body]).toMatchObject([
      409,
      {
        code: 'staleCodeBook',
        facts: {
          number: 2,
          yours: upload.proposedCodeBook,
          theirs: { dataSetId, number: 2, content: changed },
        },
      },
    ]);
  });

  function counting(upload: UploadView, layout: CodeBook['layout']) {
    return setLayout(upload.proposedCodeBook!, layout);
  }
});

