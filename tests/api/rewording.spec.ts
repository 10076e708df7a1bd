import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import type { AnalysisView, CodeBookView, CutView } from '#shared/api';
import type { Study } from '../../server/models/study/study-store';
import type { Browser } from '../builders/browser';
import { startTestApplication, type TestApplication } from '../builders/test-application';

const OUTCOME = {
  id: 'hand-eczema',
  noun: 'hand eczema',
  verbPhrase: 'developed hand eczema',
  timeFrame: '12 months',
  desirability: 'harmful',
};
const COUNTS = {
  dataSetName: 'Typed',
  dataDate: '2026-03-31',
  exposureLabel: 'Wet work',
  outcomeLabel: 'Hand eczema',
  stratumLabel: null,
  layout: 'eventsAndTotal',
  rows: [
    { level: 'Little', stratum: null, events: 10, other: 100 },
    { level: 'Much', stratum: null, events: 20, other: 100 },
  ],
};

let application: TestApplication;
let browser: Browser;
let study: Study;
let analysisId: string;

beforeAll(async () => {
  application = await startTestApplication();
});

beforeEach(async () => {
  study = await application.addStudy();
  browser = await application.memberBrowser(study, 'lead');
  await browser.put(at(`/outcomes/${OUTCOME.id}`), OUTCOME);
  const cut = (await browser.post(at('/typed-counts'), COUNTS)).body as CutView;
  analysisId = await addAnalysis(cut);
});

afterAll(async () => {
  await application.close();
  expect(application.bugs).toEqual([]);
});

function at(path: string): string {
  return `/api/studies/${study.id}${path}`;
}

async function addAnalysis(cut: CutView): Promise<string> {
  const book = (await browser.get(at(`/data-sets/${cut.dataSetId}/code-book`)))
    .body as CodeBookView;
  const exposure = book.content.columns.find(({ label }) => label === 'Wet work')!;
  const outcome = book.content.columns.find(({ id }) => id === 'counted-outcome')!;
  const specification = {
    schemaVersion: 1,
    outcome: { outcomeId: OUTCOME.id, columnId: outcome.id, eventLevelIds: ['event'] },
    exposure: { columnId: exposure.id, referenceLevelId: exposure.levels[0]!.id },
    stratumColumnIds: [],
    restrictions: [],
    level: 0.95,
    methods: { risk: 'wilson', riskDifference: 'newcombe', riskRatio: 'katz', oddsRatio: 'woolf' },
    adjustment: 'crude',
    trendScores: null,
    standing: { planned: 'prespecified', importance: 'primary', analysisSet: 'all' },
  };
  const request = { name: 'Wet hands', cutId: cut.id, specification };
  const response = await browser.post(at('/analyses'), request);
  expect(response.status).toBe(201);
  return (response.body as AnalysisView).id;
}

async function analysis(): Promise<AnalysisView> {
  return (await browser.get(at(`/analyses/${analysisId}`))).body as AnalysisView;
}

describe('an analysis follows the words', () => {
  it('of its outcome, in a version that says why', async () => {
    expect((await analysis()).version).toBe(1);
    const changed = { ...OUTCOME, noun: 'eczema of the hands' };
    await browser.put(at(`/outcomes/${OUTCOME.id}`), changed);
    const followed = await analysis();
    expect(followed.version).toBe(2);
    expect(followed.result.frame.outcome.noun).toBe('eczema of the hands');
    expect(followed.changes.map(({ reason }) => reason)).toContain(
      'The words of the study or of the outcome changed.',
    );
  });

  it('of its study', async () => {
    await browser.patch(at(''), { peopleNoun: 'nurses' });
    expect((await analysis()).result.frame.peopleNoun).toBe('nurses');
  });

  it('but not when nothing changed, nor for another outcome', async () => {
    await browser.put(at(`/outcomes/${OUTCOME.id}`), OUTCOME);
    await browser.put(at('/outcomes/asthma'), { ...OUTCOME, id: 'asthma', noun: 'asthma' });
    await browser.patch(at(''), { title: 'Another title' });
    expect((await analysis()).version).toBe(1);
  });
});
