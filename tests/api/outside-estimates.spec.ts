import { unzipSync } from 'fflate';
import { afterAll, afterEach, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import type { AnalysisView } from '#shared/api';
import type { OutsideEstimate, OutsideEstimateEntry } from '#shared/outside-estimates';
import type { Step } from '#shared/report';
import { verifyTrail } from '../../server/services/trail/verify-trail';
import { openReportDesk, type ReportDesk } from '../builders/report-desk';
import { blockOf } from '../builders/reports';
import { startTestApplication, type TestApplication } from '../builders/test-application';
import { defineTypedAnalysis, levelOf, typeCounts } from '../builders/typed-analysis';

let application: TestApplication;
let desk: ReportDesk;
let analysis: AnalysisView;
let entry: OutsideEstimateEntry;

const HEADER = 'Level,Measure,Estimate,Lower,Upper,P,Method,Covariates,N,Source';
const LINE =
  '"Over 6 h",odds ratio,5.20,2.90,9.32,<0.001,logistic regression,age; sex,720,"R, model 2"';
const NOTHING = { status: 404, code: 'notFound' };

beforeAll(async () => {
  application = await startTestApplication();
});

beforeEach(async () => {
  desk = await openReportDesk(application);
  const counts = await typeCounts(desk);
  analysis = await defineTypedAnalysis(desk, counts);
  entry = {
    levelId: levelOf(counts.codeBook, 'Wet work', 'Over 6 h'),
    referenceLevelId: levelOf(counts.codeBook, 'Wet work', 'None'),
    measure: 'oddsRatio',
    value: '5.20',
    lower: '2.90',
    upper: '9.32',
    level: 0.95,
    pValue: '<0.001',
    method: 'logistic regression',
    covariates: ['age', 'sex'],
    numberAnalysed: 720,
    source: 'R, model 2',
    computedOn: '2026-05-12',
    note: null,
  };
});

afterEach(() => {
  expect(application.bugs).toEqual([]);
});

afterAll(async () => {
  await application.close();
});

function path(rest = '', analysisId = analysis.id): string {
  return desk.at(`/analyses/${analysisId}/outside-estimates${rest}`);
}

async function add(change: Partial<OutsideEstimateEntry> = {}): Promise<OutsideEstimate> {
  const response = await desk.browser.post(path(), { ...entry, ...change });
  expect(response.status).toBe(201);
  return response.body as OutsideEstimate;
}

async function listed(): Promise<OutsideEstimate[]> {
  return (await desk.browser.get(path())).body as OutsideEstimate[];
}

function fieldsOf(response: { body: unknown }): readonly string[] {
  const { fields } = response.body as { fields: { path: string; message: string }[] };
  return fields.map((field) => `${field.path}: ${field.message}`);
}

async function load(text: string | Buffer) {
  const bytes = typeof text === 'string' ? Buffer.from(text) : text;
  return desk.browser.post(path('/file')).attach('file', bytes, 'estimates.csv');
}

describe('an estimate from elsewhere', () => {
  it('is entered, stands beside its analysis, and keeps its digits', async () => {
    const added = await add();
    expect(added).toMatchObject({ ...entry, analysisId: analysis.id, version: 1 });
    expect(await listed()).toEqual([added]);
    const view = (await desk.browser.get(desk.at(`/analyses/${analysis.id}`))).body as AnalysisView;
    expect(view.outside).toEqual([added]);
    expect(view.outside?.[0]?.value).toBe('5.20');
  });

  it('is changed against its version, and removed; the trail keeps each', async () => {
    const added = await add();
    const change = { ...entry, covariates: ['age'], baseVersion: 1 };
    const changed = await desk.browser.put(path(`/${added.id}`), change);
    expect(changed.body).toMatchObject({ version: 2, covariates: ['age'] });
    const stale = await desk.browser.put(path(`/${added.id}`), change);
    expect(stale.body).toMatchObject({ status: 409, code: 'staleOutsideEstimate' });
    expect((await desk.browser.delete(path(`/${added.id}`))).status).toBe(204);
    expect(await listed()).toEqual([]);
    const entries = await application.dependencies.database.stores.trail.list(desk.study.id);
    expect(entries.slice(-3).map(({ what }) => what)).toEqual([
      'outsideEstimate.added',
      'outsideEstimate.changed',
      'outsideEstimate.removed',
    ]);
    const verified = await verifyTrail(application.dependencies, desk.study.id);
    expect(verified).toMatchObject({ whole: true });
  });

  it('comes from a file too, every line of it', async () => {
    const response = await load(`${HEADER}\r\n${LINE}\r\n${LINE.replace('odds', 'hazard')}\r\n`);
    expect(response.status).toBe(201);
    const list = await listed();
    expect(list.map(({ measure }) => measure)).toEqual(['oddsRatio', 'hazardRatio']);
    expect(list[0]).toMatchObject({ covariates: ['age', 'sex'], source: 'R, model 2' });
  });

  it.each(['analyst', 'lead'] as const)('is entered by a %s', async (role) => {
    const browser = await application.memberBrowser(desk.study, role);
    expect((await browser.post(path(), entry)).status).toBe(201);
  });

  it.each(['reader', 'writer', 'editor'] as const)(
    'is read, and not written, by a %s',
    async (role) => {
      await add();
      const browser = await application.memberBrowser(desk.study, role);
      expect((await browser.get(path())).body).toHaveLength(1);
      expect((await browser.post(path(), entry)).body).toMatchObject({ status: 403 });
    },
  );
});

describe('a report', () => {
  const insert = (id: string, kind: string, content: object): Step => ({
    kind: 'insertBlock',
    block: { id, kind, orderKey: `a${id}`, content: { ...content, analysisId: analysis.id } },
  });

  it('prints it in table and sentence, named as computed elsewhere, in the DOCX too', async () => {
    await add();
    const table = blockOf('t', 'stratifiedTable', null).content as { show: object };
    const sentence = blockOf('s', 'effectSentence', null).content as object;
    const shown = { ...table, show: { ...table.show, outside: true } };
    const said = { ...sentence, indexLevelId: entry.levelId, outside: true };
    await desk.send([insert('1', 'stratifiedTable', shown), insert('2', 'effectSentence', said)]);
    const view = await desk.view();
    expect(view.pins[0]?.outside).toMatchObject([{ value: '5.20' }]);
    const docx = await desk.browser.get(desk.inReport('/exports/docx')).responseType('blob');
    const words = new TextDecoder()
      .decode(unzipSync(docx.body as Uint8Array)['word/document.xml'])
      .replace(/<[^>]*>/g, '');
    expect(words).toContain('Adjusted, computed elsewhere');
    expect(words).toContain('Adjusted odds ratio (95%\u00a0CI)');
    expect(words).toContain('Logistic regression, adjusted for age and sex');
    expect(words).toContain(
      'After adjustment for age and sex (logistic regression, computed elsewhere',
    );
    expect(words.match(/5\.20/g)).toHaveLength(2);
  });
});

describe('GET /api/studies/:studyId/analyses/:analysisId/outside-estimates rejects', () => {
  it('an analysis that is not there', async () => {
    expect((await desk.browser.get(path('', 'A1'))).body).toMatchObject(NOTHING);
  });
});

describe('POST /api/studies/:studyId/analyses/:analysisId/outside-estimates rejects', () => {
  const refused = async (change: object): Promise<readonly string[]> => {
    const response = await desk.browser.post(path(), { ...entry, ...change });
    expect(response.status).toBe(422);
    return fieldsOf(response);
  };

  it('limits that do not hold the estimate, in words beside the field', async () => {
    expect(await refused({ value: '12.0' })).toEqual([
      'value: The limits 2.90 and 9.32 do not hold the estimate 12.0.',
    ]);
  });

  it('numbers that cannot be read', async () => {
    expect(await refused({ lower: '2,90', pValue: 'ns' })).toEqual([
      'lower: \u201c2,90\u201d cannot be read as a number. Write digits with a decimal point, as in 1.50.',
      'pValue: \u201cns\u201d cannot be read as a p-value. Write it as in 0.03 or <0.001.',
    ]);
  });

  it('the reference as the level, another reference, and a day that is none', async () => {
    const { referenceLevelId } = entry;
    expect((await refused({ levelId: referenceLevelId }))[0]).toMatch(/^levelId: Pick a level/);
    expect((await refused({ referenceLevelId: entry.levelId }))[0]).toMatch(/^referenceLevelId:/);
    expect(await refused({ computedOn: '2026-02-30' })).toEqual([
      'computedOn: Write the day as in 2026-05-12.',
    ]);
  });

  it('an analysis that is not there', async () => {
    expect((await desk.browser.post(path('', 'A1'), entry)).body).toMatchObject(NOTHING);
  });
});

describe('POST /api/studies/:studyId/analyses/:analysisId/outside-estimates/file rejects', () => {
  it('a file with a wrong line, whole, and says what is wrong in each', async () => {
    const wrong = LINE.replace('Over 6 h', 'Over 7 h');
    const response = await load(`${HEADER}\n${LINE}\n${wrong}\n${LINE.replace('5.20', '52.0')}\n`);
    expect(response.body).toMatchObject({ status: 422, code: 'estimatesNotReadable' });
    expect(fieldsOf(response)).toEqual([
      'lines.3: Line 3: \u201cOver 7 h\u201d is no exposure level of this analysis. Write its label, or all levels.',
      'lines.4: Line 4: The limits 2.90 and 9.32 do not hold the estimate 52.0.',
    ]);
    expect(await listed()).toEqual([]);
  });

  it('a file that is empty, broken or too large', async () => {
    expect((await load('')).body).toMatchObject({ code: 'estimatesNotReadable' });
    const broken = (await load(`${HEADER}\n"Over 6 h,1`)).body as { detail: string };
    expect(broken.detail).toContain('never closed');
    const large = await load(Buffer.alloc(300_000, 'a'));
    expect(large.body).toMatchObject({ status: 413, code: 'estimatesFileTooLarge' });
  });
});

describe('PUT /api/studies/:studyId/analyses/:analysisId/outside-estimates/:estimateId rejects', () => {
  it('an estimate that is not there, and limits that cannot be', async () => {
    const change = { ...entry, baseVersion: 1 };
    expect((await desk.browser.put(path('/none'), change)).body).toMatchObject(NOTHING);
    const { id } = await add();
    const response = await desk.browser.put(path(`/${id}`), { ...change, upper: '1.2' });
    expect(fieldsOf(response)[0]).toMatch(/^lower: The lower limit, 2.90, lies above/);
  });
});

describe('DELETE /api/studies/:studyId/analyses/:analysisId/outside-estimates/:estimateId rejects', () => {
  it('an estimate that is not there, and one beside another analysis', async () => {
    expect((await desk.browser.delete(path('/none'))).body).toMatchObject(NOTHING);
    const { id } = await add();
    expect((await desk.browser.delete(path(`/${id}`, 'A1'))).body).toMatchObject(NOTHING);
  });
});
