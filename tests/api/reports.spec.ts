import { afterAll, afterEach, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import type { ReportSummary } from '#shared/api';
import type { Step } from '#shared/report';
import { verifyTrail } from '../../server/services/trail/verify-trail';
import { blockOf } from '../builders/reports';
import { openReportDesk, proseContent, type ReportDesk } from '../builders/report-desk';
import { startTestApplication, type TestApplication } from '../builders/test-application';

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

const SET_BOTH: Step = { kind: 'setFraming', framing: 'both' };

describe('a report', () => {
  it('is begun empty, in a house style, and listed', async () => {
    expect((await desk.view()).report).toMatchObject({
      studyId: desk.study.id,
      title: 'Twelve-month results',
      framing: 'both',
      houseStyleId: 'open-clinical',
      stage: 'drafting',
      seq: 0,
      blocks: [],
      pins: {},
    });
    await desk.insertProse('b1', 'One');
    const list = (await desk.browser.get(desk.at('/reports'))).body as ReportSummary[];
    expect(list).toMatchObject([
      { id: desk.reportId, blockCount: 1, blockKinds: ['prose'], seq: 1, updatedBy: 'Lena Lead' },
    ]);
    expect((await desk.view()).houseStyle).toMatchObject({ id: 'open-clinical' });
  });

  it('is removed by a lead, and gone for everybody', async () => {
    const writer = await application.memberBrowser(desk.study, 'writer');
    expect((await writer.delete(desk.inReport())).status).toBe(403);
    expect((await desk.browser.delete(desk.inReport())).status).toBe(204);
    expect((await desk.browser.get(desk.inReport())).status).toBe(404);
    expect((await desk.browser.get(desk.at('/reports'))).body).toEqual([]);
  });

  it('leaves every change in the trail', async () => {
    await desk.insertProse('b1', 'One');
    const entries = await application.dependencies.database.stores.trail.list(desk.study.id);
    expect(entries.map(({ what }) => what)).toEqual(['report.created', 'report.changed']);
    expect(await verifyTrail(application.dependencies, desk.study.id)).toMatchObject({
      whole: true,
    });
  });

  describe('rejects', () => {
    it('an unknown house style', async () => {
      const response = await desk.browser.post(desk.at('/reports'), {
        title: 'T',
        houseStyleId: 'none',
      });
      expect(response.status).toBe(422);
      expect(response.body).toMatchObject({ fields: [{ path: 'houseStyleId' }] });
    });

    it('a report without a title', async () => {
      const response = await desk.browser.post(desk.at('/reports'), { title: '  ' });
      expect(response.body).toMatchObject({
        fields: [{ path: 'title', message: 'Give the report a title.' }],
      });
    });

    it('another study’s report, as if there were none', async () => {
      const other = await application.addStudy();
      await application.addMember(other, desk.lead, 'lead');
      const path = `/api/studies/${other.id}/reports/${desk.reportId}`;
      expect((await desk.browser.get(path)).status).toBe(404);
      expect((await desk.browser.delete(path)).status).toBe(404);
      expect((await desk.browser.get(`${path}/steps`)).status).toBe(404);
      const steps = [
        {
          id: application.dependencies.ids.next(),
          groupId: application.dependencies.ids.next(),
          undoes: null,
          step: SET_BOTH,
        },
      ];
      expect((await desk.browser.post(`${path}/steps`, { steps })).status).toBe(404);
      const draft = { baseVersion: 1, content: proseContent('x') };
      expect((await desk.browser.put(`${path}/drafts/b1`, draft)).status).toBe(404);
      expect((await desk.browser.delete(`${path}/drafts/b1`)).status).toBe(404);
    });
  });
});

describe('drafts', () => {
  const draft = { baseVersion: 1, content: proseContent('Half a sen') };

  it('are kept for their writer only, until they become a step', async () => {
    await desk.insertProse('b1', 'One');
    const writer = await application.memberBrowser(desk.study, 'writer');
    const put = await writer.put(desk.inReport('/drafts/b1'), draft);
    expect(put.body).toMatchObject({ blockId: 'b1', ...draft });
    expect((await desk.view(writer)).drafts).toMatchObject([{ blockId: 'b1', ...draft }]);
    expect((await desk.view()).drafts).toEqual([]);
    const step: Step = { kind: 'replaceContent', blockId: 'b1', ...draft };
    await desk.send(step, { by: writer });
    expect((await desk.view(writer)).drafts).toEqual([]);
  });

  it('are replaced and forgotten', async () => {
    await desk.insertProse('b1', 'One');
    await desk.browser.put(desk.inReport('/drafts/b1'), draft);
    const later = { ...draft, content: proseContent('Half a sentence') };
    await desk.browser.put(desk.inReport('/drafts/b1'), later);
    expect((await desk.view()).drafts).toMatchObject([later]);
    expect((await desk.browser.delete(desk.inReport('/drafts/b1'))).status).toBe(204);
    expect((await desk.browser.delete(desk.inReport('/drafts/b1'))).status).toBe(204);
    expect((await desk.view()).drafts).toEqual([]);
  });

  describe('rejects', () => {
    it('a block that is not there, and content that can’t be read', async () => {
      expect((await desk.browser.put(desk.inReport('/drafts/zz'), draft)).status).toBe(404);
      await desk.insertProse('b1', 'One');
      const broken = { baseVersion: 1, content: { document: 'no' } };
      const response = await desk.browser.put(desk.inReport('/drafts/b1'), broken);
      expect(response.body).toMatchObject({ status: 422, code: 'stepNotUsable' });
    });

    it('a draft of numbers by somebody who may only write words', async () => {
      await desk.send({ kind: 'insertBlock', block: blockOf('t', 'stratifiedTable', null) });
      const writer = await application.memberBrowser(desk.study, 'writer');
      const content = blockOf('t', 'stratifiedTable', null).content;
      const response = await writer.put(desk.inReport('/drafts/t'), { baseVersion: 1, content });
      expect(response.status).toBe(403);
    });
  });
});
