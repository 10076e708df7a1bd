import { afterAll, afterEach, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import type { StepsView } from '#shared/api';
import { composeReport, type Step } from '#shared/report';
import { composeStoredReport } from '../../server/services/reports/compose-stored-report';
import { movePins } from '../../server/services/reports/move-pins';
import { phrasebook } from '../builders/house-styles';
import { blockOf } from '../builders/reports';
import { openReportDesk, type ReportDesk } from '../builders/report-desk';
import { wardResult, wetWorkResult } from '../builders/results';
import { storeAnalysis, type StoredAnalysis } from '../builders/stored-analysis';
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

describe('pins', () => {
  let analysis: StoredAnalysis;

  beforeEach(async () => {
    analysis = await storeAnalysis(application.dependencies, desk.study, desk.lead, wardResult());
  });

  function tableOf(analysisId: string): Step {
    const content = { ...(blockOf('t', 'stratifiedTable', null).content as object), analysisId };
    const block = { id: 't', kind: 'stratifiedTable', orderKey: 'a0', content };
    return { kind: 'insertBlock', block };
  }

  it('are set by a step of their own before the block that shows the analysis', async () => {
    const response = await desk.send(tableOf(analysis.id));
    const { steps } = response.body as StepsView;
    expect(steps.map(({ step }) => step.kind)).toEqual(['movePin', 'insertBlock']);
    const view = await desk.view();
    expect(view.report.pins).toEqual({ [analysis.id]: analysis.resultId });
    expect(view.pins).toMatchObject([
      {
        analysisId: analysis.id,
        number: 'A1',
        name: 'Wet work',
        resultId: analysis.resultId,
        cut: { number: 1, dataDate: '2026-01-31' },
      },
    ]);
  });

  it('are set too when a block turns to another analysis, or a value in prose is bound', async () => {
    await desk.insertProse('p', 'x');
    const address = `${analysis.id}/risk/over6/crude/value`;
    const node = { type: 'boundValue', attrs: { address, format: 'auto' } };
    const steps = [{ stepType: 'replace', from: 1, to: 1, slice: { content: [node] } }];
    await desk.send({ kind: 'editText', blockId: 'p', baseVersion: 1, steps });
    expect((await desk.view()).report.pins).toEqual({ [analysis.id]: analysis.resultId });
  });

  it('move in drafts by a step, and stay in reports that are further on', async () => {
    await desk.send(tableOf(analysis.id));
    const newer = await analysis.addResult(wetWorkResult());
    const { dependencies } = application;
    const move = {
      studyId: desk.study.id,
      analysisId: analysis.id,
      resultId: newer,
      personId: desk.lead.id,
    };
    const moveAll = () =>
      dependencies.database.unitOfWork(`study:${desk.study.id}`, (unit) =>
        movePins(dependencies, move, unit),
      );
    await dependencies.database.sequelize.query(
      `UPDATE reports SET stage = 'inReview' WHERE id = '${desk.reportId}'`,
    );
    await moveAll();
    expect((await desk.view()).report.pins).toEqual({ [analysis.id]: analysis.resultId });
    await dependencies.database.sequelize.query(
      `UPDATE reports SET stage = 'drafting' WHERE id = '${desk.reportId}'`,
    );
    await moveAll();
    const view = await desk.view();
    expect(view.report.pins).toEqual({ [analysis.id]: newer });
    const { steps } = (await desk.browser.get(desk.inReport('/steps?after=2'))).body as StepsView;
    expect(steps).toMatchObject([{ step: { kind: 'movePin', resultId: newer } }]);
  });

  it('give exports and screen the same elements', async () => {
    await desk.send(tableOf(analysis.id));
    await desk.insertProse('p', 'See the table.');
    const stored = await composeStoredReport(
      application.dependencies,
      desk.study.id,
      desk.reportId,
    );
    const view = await desk.view();
    const { houseStyle, pins } = view;
    const onScreen = composeReport({
      report: view.report,
      pins,
      houseStyle,
      phrasebook: phrasebook(),
    });
    expect(stored.ok && stored.value.composed).toEqual(onScreen);
    expect(onScreen.elements.map(({ kind }) => kind)).toEqual(['table', 'paragraph']);
  });

  describe('rejects', () => {
    it('a block of an analysis that is not there', async () => {
      const response = await desk.send(tableOf('nothing'));
      expect(response.body).toMatchObject({ status: 422, code: 'analysisUnknown' });
      expect((await desk.view()).report.seq).toBe(0);
    });

    it('a block of another study’s analysis', async () => {
      const other = await application.addStudy();
      const { id } = await storeAnalysis(application.dependencies, other, desk.lead, wardResult());
      expect((await desk.send(tableOf(id))).body).toMatchObject({ code: 'analysisUnknown' });
    });
  });
});
