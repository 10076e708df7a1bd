import { afterAll, afterEach, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import type { AnalysisSummary, AnalysisView, CodeBookView, StepsView } from '#shared/api';
import { reverseContrast } from '#shared/analysis';
import type { Step } from '#shared/report';
import { verifyTrail } from '../../server/services/trail/verify-trail';
import { openReportDesk, type ReportDesk } from '../builders/report-desk';
import { blockOf } from '../builders/reports';
import { startTestApplication, type TestApplication } from '../builders/test-application';
import {
  defineTypedAnalysis,
  levelOf,
  typeCounts,
  type TypedCounts,
} from '../builders/typed-analysis';

let application: TestApplication;
let desk: ReportDesk;
let counts: TypedCounts;
let analysis: AnalysisView;

beforeAll(async () => {
  application = await startTestApplication();
});

beforeEach(async () => {
  desk = await openReportDesk(application);
  counts = await typeCounts(desk);
  analysis = await defineTypedAnalysis(desk, counts);
});

afterEach(() => {
  expect(application.bugs).toEqual([]);
});

afterAll(async () => {
  await application.close();
});

function path(id = analysis.id): string {
  return desk.at(`/analyses/${id}`);
}

async function viewed(): Promise<AnalysisView> {
  return (await desk.browser.get(path())).body as AnalysisView;
}

/** The change that saves the analysis as it is, with other parts where they are given. */
function change(parts: Readonly<Record<string, unknown>> = {}): Record<string, unknown> {
  const { name, cutId, specification, version } = analysis;
  return { name, cutId, specification, baseVersion: version, reason: null, ...parts };
}

function reversed(): unknown {
  return reverseContrast(analysis.specification, levelOf(counts.codeBook, 'Wet work', 'Over 6 h'));
}

function showing(analysisId: string): Step {
  const empty = blockOf('t', 'stratifiedTable', null).content as object;
  const block = { id: 't', kind: 'stratifiedTable', orderKey: 'a0' };
  return { kind: 'insertBlock', block: { ...block, content: { ...empty, analysisId } } };
}

async function changeCodeBook(edit: (json: string) => string): Promise<CodeBookView> {
  const url = desk.at(`/data-sets/${counts.cut.dataSetId}/code-book`);
  const { number, content } = (await desk.browser.get(url)).body as CodeBookView;
  const changed = JSON.parse(edit(JSON.stringify(content))) as unknown;
  const response = await desk.browser.put(url, { baseNumber: number, content: changed });
  expect(response.status).toBe(200);
  return response.body as CodeBookView;
}

describe('an analysis', () => {
  it('is counted and computed when it is defined', () => {
    expect(analysis).toMatchObject({
      number: 'A1',
      name: 'Wet work',
      version: 1,
      cutNumber: 1,
      cutDataDate: '2026-01-31',
      codeBookNumber: 1,
      dataSetName: 'Staff',
      usedIn: [],
      problem: null,
      changes: [{ version: 1, person: 'Lena Lead', reason: null }],
    });
    expect(analysis.result.counted).toBe(736);
    expect(analysis.result.crude.levels.map(({ count }) => count)).toEqual([
      { events: 15, total: 354 },
      { events: 81, total: 382 },
    ]);
    expect(analysis.result.strata).toHaveLength(2);
    expect(analysis.result.frame).toMatchObject({
      design: 'cohort',
      outcome: { noun: 'hand eczema' },
      exposure: { label: 'Wet work' },
    });
  });

  it('is listed with the reports that show it', async () => {
    await desk.send(showing(analysis.id));
    const list = (await desk.browser.get(desk.at('/analyses'))).body as AnalysisSummary[];
    expect(list).toMatchObject([
      {
        id: analysis.id,
        usedIn: [{ reportId: desk.reportId, title: 'Twelve-month results', blocks: 1 }],
      },
    ]);
    await desk.send({ kind: 'removeBlock', blockId: 't' });
    expect((await viewed()).usedIn).toEqual([]);
  });

  it('is numbered within its study, and a number is never given again', async () => {
    const second = await defineTypedAnalysis(desk, counts);
    expect(second.number).toBe('A2');
    expect((await desk.browser.delete(path(second.id))).status).toBe(204);
    expect((await defineTypedAnalysis(desk, counts)).number).toBe('A3');
  });

  it('is saved as a new version, with its reason', async () => {
    const reason = 'The ward was coded wrongly.';
    const response = await desk.browser.put(path(), change({ specification: reversed(), reason }));
    expect(response.body).toMatchObject({ version: 2, changes: [{ version: 1 }, { reason }] });
    const { result } = response.body as AnalysisView;
    const over = levelOf(counts.codeBook, 'Wet work', 'Over 6 h');
    expect(result.frame.exposure.referenceLevelId).toBe(over);
    const entries = await application.dependencies.database.stores.trail.list(desk.study.id);
    expect(entries.at(-1)).toMatchObject({ what: 'analysis.changed' });
    expect(await verifyTrail(application.dependencies, desk.study.id)).toMatchObject({
      whole: true,
    });
  });

  it('stays as it is when the same is saved again', async () => {
    const response = await desk.browser.put(path(), change());
    expect(response.body).toEqual(analysis);
  });

  it('takes the numbers of drafts along, by a step', async () => {
    await desk.send(showing(analysis.id));
    const saved = await desk.browser.put(
      path(),
      change({ specification: reversed(), reason: 'Turned round.' }),
    );
    const { resultId } = saved.body as AnalysisView;
    expect(resultId).not.toBe(analysis.resultId);
    const view = await desk.view();
    expect(view.report.pins).toEqual({ [analysis.id]: resultId });
    expect(view.pins).toMatchObject([{ resultId, cut: { number: 1 } }]);
    const steps = (await desk.browser.get(desk.inReport('/steps?after=2'))).body as StepsView;
    expect(steps.steps).toMatchObject([
      { step: { kind: 'movePin', analysisId: analysis.id, resultId } },
    ]);
  });

  it('needs no reason for another name, nor before a report shows it', async () => {
    const unused = await desk.browser.put(path(), change({ specification: reversed() }));
    expect(unused.body).toMatchObject({ version: 2 });
    await desk.send(showing(analysis.id));
    const { specification } = unused.body as AnalysisView;
    const renamed = change({ name: 'Wet work, 12 months', baseVersion: 2, specification });
    expect((await desk.browser.put(path(), renamed)).body).toMatchObject({
      version: 3,
      name: 'Wet work, 12 months',
    });
  });

  it('follows its code book, and says when it no longer can', async () => {
    await desk.send(showing(analysis.id));
    await changeCodeBook((json) => json.replaceAll('"label":"Over 6 h"', '"label":"6 h or more"'));
    const followed = await viewed();
    expect(followed).toMatchObject({ codeBookNumber: 2, version: 1, problem: null });
    expect(followed.result.frame.exposure.levels.map(({ label }) => label)).toContain(
      '6 h or more',
    );
    expect((await desk.view()).report.pins).toEqual({ [analysis.id]: followed.resultId });
    await changeCodeBook((json) => {
      const content = JSON.parse(json) as { columns: { name: string; kind: string }[] };
      const columns = content.columns.map((column) =>
        column.name === 'Workplace' ? { ...column, kind: 'identifier', levels: [] } : column,
      );
      return JSON.stringify({ ...content, columns });
    });
    const stuck = await viewed();
    expect(stuck).toMatchObject({ codeBookNumber: 2, resultId: followed.resultId });
    expect(stuck.problem).toMatch(/^[A-Z].*\.$/u);
  });

  it('follows the words of its outcome and its study', async () => {
    await desk.send(showing(analysis.id));
    const { outcome } = analysis.result.frame;
    const words = { ...outcome, noun: 'eczema of the hands' };
    expect((await desk.browser.put(desk.at('/outcomes/eczema'), words)).status).toBe(200);
    await desk.browser.patch(desk.at(''), { peopleNoun: 'nurses' });
    const { result, version, resultId } = await viewed();
    expect(result.frame).toMatchObject({ outcome: words, peopleNoun: 'nurses' });
    expect(version).toBe(3);
    expect((await desk.view()).report.pins).toEqual({ [analysis.id]: resultId });
  });

  it('goes when no report shows it, and takes its pins along', async () => {
    await desk.send(showing(analysis.id));
    await desk.send({ kind: 'removeBlock', blockId: 't' });
    expect((await desk.browser.delete(path())).status).toBe(204);
    expect((await desk.browser.get(path())).status).toBe(404);
    expect((await desk.view()).report.pins).toEqual({});
    const back = await desk.send({ kind: 'restoreBlock', blockId: 't' });
    expect(back.body).toMatchObject({ status: 422, code: 'analysisUnknown' });
  });
});

describe('an analysis rejects', () => {
  it('a newer version underneath', async () => {
    await desk.browser.put(path(), change({ name: 'Newer' }));
    const response = await desk.browser.put(path(), change({ name: 'Older' }));
    expect(response.body).toMatchObject({
      status: 409,
      code: 'staleAnalysis',
      facts: { version: 2 },
    });
    expect((await viewed()).name).toBe('Newer');
  });

  it('a change without a reason once a report shows it', async () => {
    await desk.send(showing(analysis.id));
    const changes = [
      { specification: reversed() },
      { specification: { ...analysis.specification, level: 0.9 } },
      { specification: reversed(), reason: '   ' },
    ];
    for (const parts of changes) {
      const response = await desk.browser.put(path(), change(parts));
      expect(response.body).toMatchObject({
        status: 422,
        code: 'reasonRequired',
        facts: { reports: ['Twelve-month results'] },
      });
    }
    expect((await viewed()).version).toBe(1);
  });

  it('its removal while a report shows it', async () => {
    await desk.send(showing(analysis.id));
    expect((await desk.browser.delete(path())).body).toMatchObject({
      status: 409,
      code: 'analysisInUse',
      title: 'A report shows this analysis: Twelve-month results.',
    });
  });

  it.each([
    ['a reference level that is not in the data', { exposure: { referenceLevelId: 'gone' } }],
    ['an event level that is not there', { outcome: { eventLevelIds: ['gone'] } }],
    ['a column that is not there', { exposure: { columnId: 'gone' } }],
    ['everybody as an event', { outcome: { eventLevelIds: ['event', 'non-event'] } }],
    ['an unknown method', { methods: { riskRatio: 'gone' } }],
  ])('%s, in plain words', async (_name, parts) => {
    const { specification } = counts.request;
    const broken = {
      ...specification,
      outcome: { ...specification.outcome, ...('outcome' in parts ? parts.outcome : {}) },
      exposure: { ...specification.exposure, ...('exposure' in parts ? parts.exposure : {}) },
      methods: { ...specification.methods, ...('methods' in parts ? parts.methods : {}) },
    };
    const request = { ...counts.request, specification: broken };
    const response = await desk.browser.post(desk.at('/analyses'), request);
    expect(response.body).toMatchObject({ status: 422, code: 'analysisNotComputable' });
    expect((response.body as { detail: string }).detail).toMatch(/^[A-Z].*\.$/u);
  });

  it.each([
    ['a cut that is not there', { cutId: 'gone' }, 'cutId'],
    ['no name', { name: ' ' }, 'name'],
  ])('%s, beside its field', async (_name, parts, field) => {
    const response = await desk.browser.post(desk.at('/analyses'), { ...counts.request, ...parts });
    expect(response.body).toMatchObject({ status: 422, fields: [{ path: field }] });
  });

  it('an outcome that the study does not have', async () => {
    const { specification } = counts.request;
    const outcome = { ...specification.outcome, outcomeId: 'gone' };
    const request = { ...counts.request, specification: { ...specification, outcome } };
    const response = await desk.browser.post(desk.at('/analyses'), request);
    expect(response.body).toMatchObject({
      fields: [{ path: 'specification.outcome.outcomeId' }],
    });
  });

  it('another study’s cut and another study’s address', async () => {
    const other = await openReportDesk(application);
    await typeCounts(other);
    const stolen = await other.browser.post(other.at('/analyses'), counts.request);
    expect(stolen.body).toMatchObject({ fields: [{ path: 'cutId' }] });
    const elsewhere = other.at(`/analyses/${analysis.id}`);
    expect((await other.browser.get(elsewhere)).status).toBe(404);
    expect((await other.browser.put(elsewhere, change())).status).toBe(404);
    expect((await other.browser.delete(elsewhere)).status).toBe(404);
  });

  it('people who may not edit data', async () => {
    for (const role of ['reader', 'writer', 'editor'] as const) {
      const by = await application.memberBrowser(desk.study, role);
      expect((await by.post(desk.at('/analyses'), counts.request)).status).toBe(403);
      expect((await by.put(path(), change())).status).toBe(403);
      expect((await by.delete(path())).status).toBe(403);
      expect((await by.get(path())).status).toBe(200);
    }
  });
});
