import { afterAll, afterEach, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { openReportDesk, type ReportDesk } from '../builders/report-desk';
import { startTestApplication, type TestApplication } from '../builders/test-application';

const NOTHING = { status: 404, code: 'notFound' };

let application: TestApplication;
let desk: ReportDesk;

beforeAll(async () => {
  application = await startTestApplication();
});

beforeEach(async () => {
  desk = await openReportDesk(application);
});

afterEach(() => {
  expect(application.bugs).toEqual([]);
});

afterAll(async () => {
  await application.close();
});

async function reader() {
  return application.memberBrowser(desk.study, 'reader');
}

describe('GET /api/studies/:studyId/reports rejects', () => {
  it('people who have just left the study', async () => {
    const person = await application.addPerson();
    await application.addMember(desk.study, person, 'reader');
    const theirs = await application.signedIn(person);
    expect((await theirs.get(desk.at('/reports'))).status).toBe(200);
    await desk.browser.delete(desk.at(`/members/${person.id}`));
    expect((await theirs.get(desk.at('/reports'))).body).toMatchObject(NOTHING);
  });
});

describe('POST /api/studies/:studyId/reports rejects', () => {
  it('a title that is too long, and a house style that is none, beside the fields', async () => {
    const long = await desk.browser.post(desk.at('/reports'), { title: 'x'.repeat(301) });
    expect(long.body).toMatchObject({ status: 422, fields: [{ path: 'title' }] });
    const style = { title: 'T', houseStyleId: '../open-clinical' };
    const unknown = await desk.browser.post(desk.at('/reports'), style);
    expect(unknown.body).toMatchObject({ status: 422, fields: [{ path: 'houseStyleId' }] });
  });
});

describe('GET /api/studies/:studyId/reports/:reportId rejects', () => {
  it('a report that was removed', async () => {
    await desk.browser.delete(desk.inReport());
    expect((await desk.browser.get(desk.inReport())).body).toMatchObject(NOTHING);
  });
});

describe('DELETE /api/studies/:studyId/reports/:reportId rejects', () => {
  it('a report that was removed already', async () => {
    expect((await desk.browser.delete(desk.inReport())).status).toBe(204);
    expect((await desk.browser.delete(desk.inReport())).body).toMatchObject(NOTHING);
  });

  it('readers, and the report stays', async () => {
    const theirs = await reader();
    expect((await theirs.delete(desk.inReport())).body).toMatchObject({ code: 'notAllowed' });
    expect((await theirs.get(desk.inReport())).status).toBe(200);
  });
});

describe('GET /api/studies/:studyId/reports/:reportId/steps rejects', () => {
  it.each(['-1', 'x', '1.5'])('a number of steps that is none: %s', async (after) => {
    const response = await desk.browser.get(desk.inReport(`/steps?after=${after}`));
    expect(response.body).toMatchObject({ status: 422, fields: [{ path: 'after' }] });
  });
});

describe('POST /api/studies/:studyId/reports/:reportId/steps rejects', () => {
  it('ids that are none, and no steps at all', async () => {
    const step = { id: '1', groupId: '2', undoes: null, step: { kind: 'setFraming' } };
    const wrong = await desk.browser.post(desk.inReport('/steps'), { steps: [step] });
    expect(wrong.body).toMatchObject({
      status: 422,
      fields: [{ path: 'steps.0.id' }, { path: 'steps.0.groupId' }],
    });
    const none = await desk.browser.post(desk.inReport('/steps'), { steps: [] });
    expect(none.body).toMatchObject({ fields: [{ path: 'steps', message: 'Give at least 1.' }] });
  });

  it('steps on a report that was removed', async () => {
    await desk.browser.delete(desk.inReport());
    const response = await desk.send({ kind: 'setFraming', framing: 'both' });
    expect(response.body).toMatchObject(NOTHING);
  });
});

describe('PUT /api/studies/:studyId/reports/:reportId/drafts/:blockId rejects', () => {
  it('a version that is no number, and readers', async () => {
    await desk.insertProse('b1', 'One');
    const draft = { baseVersion: 'first', content: {} };
    const response = await desk.browser.put(desk.inReport('/drafts/b1'), draft);
    expect(response.body).toMatchObject({ status: 422, fields: [{ path: 'baseVersion' }] });
    const theirs = await reader();
    const refused = await theirs.put(desk.inReport('/drafts/b1'), { baseVersion: 1, content: {} });
    expect(refused.body).toMatchObject({ status: 403, code: 'notAllowed' });
  });
});

describe('DELETE /api/studies/:studyId/reports/:reportId/drafts/:blockId rejects', () => {
  it('a report of another study', async () => {
    const other = await openReportDesk(application);
    const path = other.at(`/reports/${desk.reportId}/drafts/b1`);
    expect((await other.browser.delete(path)).body).toMatchObject(NOTHING);
  });
});

describe('GET /api/studies/:studyId/analyses rejects', () => {
  it('people who are no members', async () => {
    const stranger = await application.signedIn(await application.addPerson());
    expect((await stranger.get(desk.at('/analyses'))).body).toMatchObject(NOTHING);
  });
});

describe('POST /api/studies/:studyId/analyses rejects', () => {
  it('a specification without its parts, each beside its field', async () => {
    const request = { name: 'A', cutId: 'c', specification: { schemaVersion: 1, level: 1 } };
    const response = await desk.browser.post(desk.at('/analyses'), request);
    const { fields } = response.body as { fields: { path: string }[] };
    expect(response.status).toBe(422);
    expect(fields.map(({ path }) => path)).toEqual(
      expect.arrayContaining(['specification.outcome', 'specification.level']),
    );
  });
});

describe('GET /api/studies/:studyId/analyses/:analysisId rejects', () => {
  it('an analysis that is not there', async () => {
    expect((await desk.browser.get(desk.at('/analyses/A1'))).body).toMatchObject(NOTHING);
  });
});

describe('PUT /api/studies/:studyId/analyses/:analysisId rejects', () => {
  it('a change that does not say which version it was made against', async () => {
    const response = await desk.browser.put(desk.at('/analyses/A1'), { name: 'A', cutId: 'c' });
    const { fields } = response.body as { fields: { path: string }[] };
    expect(fields.map(({ path }) => path)).toContain('baseVersion');
  });
});

describe('DELETE /api/studies/:studyId/analyses/:analysisId rejects', () => {
  it('an analysis that is not there', async () => {
    expect((await desk.browser.delete(desk.at('/analyses/A1'))).body).toMatchObject(NOTHING);
  });
});
