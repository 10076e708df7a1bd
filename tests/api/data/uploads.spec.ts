import { existsSync } from 'node:fs';
import { writeFile } from 'node:fs/promises';
import { join } from 'node:path';
import { describe, expect, it } from 'vitest';
import type { CutView, UploadView } from '#shared/api';
import { replaceColumn } from '#shared/code-book';
import { buildWorkbook } from '../../../server/intake/testing/build-workbook';
import { resumeUploads } from '../../../server/services/uploads/resume-uploads';
import { columnOf, NOTHING, ROWS, useDataStudy } from '../../builders/data-study';
import { loadFile, readUpload, sendFile, storeUpload, untilRead } from '../../builders/uploads';

const data = useDataStudy();

describe('a file', () => {
  it('is taken at once, read, and shown with its profile and a proposal', async () => {
    const response = await sendFile(data.browser, data.study, { bytes: ROWS });
    expect(response.status).toBe(202);
    expect(response.body).toMatchObject({ fileName: 'data.csv', state: 'reading', profile: null });
    const upload = await untilRead(data.browser, data.study, (response.body as UploadView).id);
    expect(upload).toMatchObject({
      state: 'profiled',
      progress: 1,
      rowsRead: 4,
      problem: null,
      cutId: null,
      dataSetId: null,
      differences: [],
    });
    expect(upload.profile?.columns.map(({ columnId }) => columnId)).toEqual(['sex', 'age', 'ill']);
    expect(upload.proposedCodeBook?.layout).toEqual({ kind: 'records' });
  });

  it('becomes a cut of a new data set, and its bytes are not kept', async () => {
    const upload = await readUpload(data.browser, data.study, { bytes: ROWS });
    expect(data.keepsFile(upload.id)).toBe(true);
    const response = await storeUpload(data.browser, data.study, upload, { dataSetName: ' Guests ' });
    expect(response.status).toBe(201);
    const cut = response.body as CutView;
    expect(cut).toMatchObject({
      number: 1,
      dataDate: '2026-03-31',
      fileName: 'data.csv',
      rows: 4,
      createdBy: 'Ada Analyst',
      dataSetName: 'Guests',
      profile: upload.profile,
    });
    expect(cut.sha256).toMatch(/^[0-9a-f]{64}$/);
    expect(data.keepsFile(upload.id)).toBe(false);
    expect(await data.dataSets()).toMatchObject([
      { id: cut.dataSetId, name: 'Guests', codeBookNumber: 1, cuts: [{ id: cut.id, number: 1 }] },
    ]);
    expect((await data.browser.get(data.at(`/cuts/${cut.id}`))).body).toEqual(cut);
    expect(await untilRead(data.browser, data.study, upload.id)).toMatchObject({
      state: 'stored',
      cutId: cut.id,
    });
    const trail = await data.stores.trail.list(data.study.id);
    expect(trail.map(({ what }) => what)).toEqual(['cut.stored']);
  });

  it('becomes the next cut of a data set, whose code book is carried over', async () => {
    const first = await loadFile(data.browser, data.study, { bytes: ROWS });
    const { dataSetId } = first;
    const bytes = `${ROWS}x,31,no\n`;
    const upload = await readUpload(data.browser, data.study, { bytes, dataSetId });
    expect(upload.differences?.map(({ code }) => code)).toEqual(['levelNew']);
    const response = await storeUpload(data.browser, data.study, upload);
    expect(response.body).toMatchObject({ number: 2, rows: 5, dataSetId });
    expect(await data.codeBook(dataSetId)).toMatchObject({ number: 2 });
    const again = await readUpload(data.browser, data.study, { bytes: ROWS, dataSetId });
    expect((await storeUpload(data.browser, data.study, again)).body).toMatchObject({ number: 3 });
    expect(await data.codeBook(dataSetId)).toMatchObject({ number: 2 });
  });

  it('takes the ids of a data set that is named only when it is stored', async () => {
    const { dataSetId } = await loadFile(data.browser, data.study, { bytes: ROWS }, (book) =>
      replaceColumn(book, { ...columnOf(book, 'sex'), label: 'Sex at birth' }),
    );
    const owned = (await data.codeBook(dataSetId)).content;
    const renamed = {
      ...owned,
      columns: owned.columns.map((column) => ({ ...column, id: `own-${column.id}` })),
    };
    const url = data.at(`/data-sets/${dataSetId}/code-book`);
    await data.browser.put(url, { baseNumber: 1, content: renamed });
    const upload = await readUpload(data.browser, data.study, { bytes: ROWS });
    const response = await storeUpload(data.browser, data.study, upload, { dataSetId });
    const cut = response.body as CutView;
    expect(cut.profile.columns.map(({ columnId }) => columnId)).toEqual([
      'own-sex',
      'own-age',
      'own-ill',
    ]);
    expect(await data.tally(cut.id, 'own-sex')).toMatchObject({ counted: 4 });
  });

  it('may be read again in another way', async () => {
    const others = await data.stores.cuts.listLoading();
    const upload = await readUpload(data.browser, data.study, { bytes: 'a;b\n1,5;x\n' });
    expect(upload.profile?.columns[0]).toMatchObject({ numeric: 1, sum: 1.5 });
    const options = { delimiter: ',', encoding: null, decimalMark: null, sheet: null };
    const response = await data.browser.put(data.at(`/uploads/${upload.id}/options`), options);
    expect(response.status).toBe(202);
    expect(response.body).toMatchObject({ state: 'reading', profile: null });
    const again = await untilRead(data.browser, data.study, upload.id);
    expect(again).toMatchObject({ state: 'failed', problem: { code: 'raggedRow' } });
    await data.browser.put(data.at(`/uploads/${upload.id}/options`), { ...options, delimiter: ';' });
    expect(await untilRead(data.browser, data.study, upload.id)).toMatchObject({
      state: 'profiled',
      problem: null,
    });
    expect(await data.stores.cuts.listLoading()).toHaveLength(others.length + 1);
  });

  it('that cannot be read says why, and leaves nothing behind', async () => {
    const others = await data.stores.cuts.listLoading();
    const upload = await readUpload(data.browser, data.study, { bytes: 'a,b\n1,2\n1,2,3\n' });
    expect(upload).toMatchObject({
      state: 'failed',
      profile: null,
      problem: {
        code: 'raggedRow',
        message: 'Line 3 has 3 cells, and the row of column names has 2.',
        wayOut: expect.stringContaining('Correct that line.') as string,
      },
    });
    expect(await data.stores.cuts.listLoading()).toEqual(others);
  });

  it('can be given up, while it is read and after', async () => {
    const others = await data.stores.cuts.listLoading();
    const rows = Array.from({ length: 200_000 }, (_, row) => `${String(row)},x`).join('\n');
    const sent = await sendFile(data.browser, data.study, { bytes: `id,b\n${rows}\n` });
    const { id } = sent.body as UploadView;
    expect((await data.browser.delete(data.at(`/uploads/${id}`))).status).toBe(204);
    expect((await data.browser.get(data.at(`/uploads/${id}`))).status).toBe(404);
    const upload = await readUpload(data.browser, data.study, { bytes: ROWS });
    expect((await data.browser.delete(data.at(`/uploads/${upload.id}`))).status).toBe(204);
    await data.application.dependencies.background.idle();
    expect(await data.stores.cuts.listLoading()).toEqual(others);
    expect([data.keepsFile(id), data.keepsFile(upload.id)]).toEqual([false, false]);
  });

  it('may be a workbook, of which one sheet is chosen', async () => {
    const bytes = await buildWorkbook((workbook) => {
      workbook.addWorksheet('First').addRows([['a'], ['x'], ['y']]);
      workbook.addWorksheet('Second').addRows([
        ['b', 'c'],
        ['x', 1],
      ]);
    });
    const options = { sheet: 'Second' };
    const upload = await readUpload(data.browser, data.study, { bytes, fileName: 'book.xlsx', options });
    expect(upload.profile).toMatchObject({ sheets: ['First', 'Second'], rows: 1 });
    const cut = (await storeUpload(data.browser, data.study, upload)).body as CutView;
    expect(cut.profile.usedOptions.sheet).toBe('Second');
  });

  it('keeps its name, whatever is in it', async () => {
    const fileName = '../M\u00e4rz "final";\u2028=1+1.csv';
    const upload = await readUpload(data.browser, data.study, { bytes: ROWS, fileName });
    expect(upload.fileName.endsWith('M\u00e4rz "final";\u2028=1+1.csv')).toBe(true);
    expect(upload.state).toBe('profiled');
  });
});

describe('after a stop', () => {
  it('files that were being read are read again, and unfinished cuts are gone', async () => {
    const { uploads } = data.stores;
    const { database } = data.application.dependencies;
    const upload = await readUpload(data.browser, data.study, { bytes: ROWS });
    const interrupted = (await uploads.find(data.study.id, upload.id))!;
    await database.unitOfWork('site', (unit) =>
      uploads.update(upload.id, 'profiled', { state: 'reading', progress: 0.5 }, unit),
    );
    await resumeUploads(data.application.dependencies);
    expect(await untilRead(data.browser, data.study, upload.id)).toMatchObject({
      state: 'profiled',
      rowsRead: 4,
    });
    const loading = await data.stores.cuts.listLoading();
    expect(loading).not.toContain(interrupted.cutId);
    expect(loading).toContain((await uploads.find(data.study.id, upload.id))?.cutId);
  });

  it('files that no upload will ask for are gone, and those of uploads stay', async () => {
    const upload = await readUpload(data.browser, data.study, { bytes: ROWS });
    const { dataDirectory } = data.application.dependencies.config;
    const left = [join(dataDirectory, 'arriving', 'half'), join(dataDirectory, 'uploads', NOTHING)];
    for (const path of left) await writeFile(path, 'x');
    await resumeUploads(data.application.dependencies);
    expect(left.map((path) => existsSync(path))).toEqual([false, false]);
    expect(data.keepsFile(upload.id)).toBe(true);
  });

  it('an upload that nobody stored for two weeks is given up', async () => {
    const upload = await readUpload(data.browser, data.study, { bytes: ROWS });
    const longAgo = data.application.clock.now().getTime() - 15 * 86_400_000;
    const change = { updatedAt: new Date(longAgo).toISOString() };
    await data.application.dependencies.database.unitOfWork('site', (unit) =>
      data.stores.uploads.update(upload.id, 'profiled', change, unit),
    );
    await resumeUploads(data.application.dependencies);
    expect(await data.stores.uploads.find(data.study.id, upload.id)).toBeNull();
    expect(data.keepsFile(upload.id)).toBe(false);
  });
});

