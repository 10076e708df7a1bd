import type { AnalysisView, ReportView } from '#shared/api';
import { applyStep, parseStep, type Report, visibleBlocks } from '#shared/report';
import { expect, it } from 'vitest';
import { SPECIFICATION, wetWorkResult } from '../testing/wet-work';
import { insertionSteps } from './insertion-steps';

const analysis: AnalysisView = {
  id: 'a1',
  number: 'A1',
  name: 'Eczema by work',
  cutId: 'c1',
  cutNumber: 1,
  dataSetId: 'd1',
  dataSetName: 'Work',
  version: 1,
  updatedAt: '2026-01-01T00:00:00Z',
  usedIn: [],
  specification: SPECIFICATION,
  codeBookNumber: 1,
  cutDataDate: '2026-01-01',
  resultId: 'r1',
  result: wetWorkResult(),
  changes: [],
};
const report: ReportView['report'] = {
  id: 'rep',
  studyId: 's',
  title: 'Report',
  framing: 'both',
  houseStyleId: 'open-clinical',
  stage: 'drafting',
  seq: 0,
  blocks: [],
  pins: {},
};
const used = { analysis, levelId: 'much', scope: { kind: 'pooled' } as const };

it('puts table, figure and sentence at the end, in that order, as one change', () => {
  const steps = insertionSteps(report, used, { table: true, figure: true, sentence: true });
  expect(new Set(steps.map(({ groupId }) => groupId)).size).toBe(1);
  const after = steps.reduce((before: Report, { step }) => {
    const parsed = parseStep(step);
    const applied = parsed.ok
      ? applyStep(before, parsed.value, { at: '2026-01-02T00:00:00Z' })
      : parsed;
    if (!applied.ok) throw new Error(JSON.stringify(applied.issue));
    return applied.value.report;
  }, report);
  expect(visibleBlocks(after).map(({ kind }) => kind)).toEqual([
    'stratifiedTable',
    'groupedBarChart',
    'effectSentence',
  ]);
  expect(visibleBlocks(after).at(-1)?.content).toMatchObject({
    analysisId: 'a1',
    indexLevelId: 'much',
    scope: { kind: 'pooled' },
  });
});

it('puts only what is wanted', () => {
  const steps = insertionSteps(report, used, { table: false, figure: false, sentence: true });
  expect(steps).toHaveLength(1);
});
