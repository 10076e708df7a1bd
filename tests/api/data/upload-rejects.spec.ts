import { describe, expect, it } from 'vitest';
import { NOTHING, ROWS, useDataStudy } from '../../builders/data-study';
import { startTestApplication } from '../../builders/test-application';
import { loadFile, readUpload, sendFile, storeUpload } from '../../builders/uploads';

const data = useDataStudy();

describe('POST /api/studies/:studyId/uploads rejects', () => {
  it('a form without a file', async () => {
    const response = await data.browser.post(data.at('/uploads')).field('options', '{}');
    expect([response.status, response.body]).toMatchObject([422, { code: 'fileMissing' }]);
  });

  it('options that are no JSON, or none that exist', async () => {
    const send = (options: string) =>
      data.browser
        .post(data.at('/uploads'))
        .attach('file', Buffer.from(ROWS), 'a.csv')
        .field('options', options);
    expect((await send('{')).body).toMatchObject({
      code: 'invalidRequest',
      fields: [{ path: 'options' }],
    });
    expect((await send('{"encoding":"ebcdic"}')).body).toMatchObject({
      fields: [{ path: 'options.encoding' }],
    });
  });

  it('a data set of another study', async () => {
    const { dataSetId } = await loadFile(data.browser, data.study, { bytes: ROWS });
    await data.moveToAnotherStudy();
    const response = await sendFile(data.browser, data.study, { bytes: ROWS, dataSetId });
    expect(response.body).toMatchObject({
      fields: [{ path: 'dataSetId', message: 'There is no such data set in this study.' }],
    });
  });

  it('a body that is no form', async () => {
    expect((await data.browser.post(data.at('/uploads'), {})).status).toBe(415);
  });

  it('a file that is larger than the installation allows', async () => {
    const small = await startTestApplication({
      sizeLimits: { jsonBodyInBytes: 1024, uploadInBytes: 2048 },
    });
    const lead = await small.addPerson();
    const place = await small.addStudy();
    await small.addMember(place, lead, 'lead');
    const response = await sendFile(await small.signedIn(lead), place, { bytes: 'x'.repeat(3000) });
    expect([response.status, response.body]).toMatchObject([
      413,
      { code: 'fileTooLarge', title: 'The file is larger than 2 kB, the most that can be loaded.' },
    ]);
    expect(small.bugs).toEqual([]);
    await small.close();
  });
});

describe('GET /api/studies/:studyId/uploads/:uploadId rejects', () => {
  it('an upload that is not there, or of another study', async () => {
    const upload = await readUpload(data.browser, data.study, { bytes: ROWS });
    expect((await data.browser.get(data.at(`/uploads/${NOTHING}`))).status).toBe(404);
    await data.moveToAnotherStudy();
    expect((await data.browser.get(data.at(`/uploads/${upload.id}`))).status).toBe(404);
  });
});

describe('DELETE /api/studies/:studyId/uploads/:uploadId rejects', () => {
  it('an upload that is not there', async () => {
    expect((await data.browser.delete(data.at(`/uploads/${NOTHING}`))).status).toBe(404);
  });
});

describe('PUT /api/studies/:studyId/uploads/:uploadId/options rejects', () => {
  const options = { delimiter: null, encoding: null, decimalMark: null, sheet: null };

  it('a delimiter of two characters', async () => {
    const upload = await readUpload(data.browser, data.study, { bytes: ROWS });
    const response = await data.browser.put(data.at(`/uploads/${upload.id}/options`), {
      ...options,
      delimiter: '::',
    });
    expect(response.body).toMatchObject({
      code: 'invalidRequest',
      fields: [{ path: 'delimiter' }],
    });
  });

  it('a file that was stored, or is not there', async () => {
    const upload = await readUpload(data.browser, data.study, { bytes: ROWS });
    await storeUpload(data.browser, data.study, upload);
    const stored = await data.browser.put(data.at(`/uploads/${upload.id}/options`), options);
    expect([stored.status, stored.body]).toMatchObject([409, { code: 'uploadStored' }]);
    const nothing = await data.browser.put(data.at(`/uploads/${NOTHING}/options`), options);
    expect(nothing.status).toBe(404);
  });
});

