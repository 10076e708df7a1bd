import { describe, expect, it } from 'vitest';
import type { AnalysisResult } from './analysis-result';
import { computeAnalysis } from './compute-analysis';
import { reverseContrast } from './default-specification';
import { frameOf } from './frame';
import { printedTest } from './printed-test';
import type { OtherMethodChoice } from './specification';
import { TEST_OUTCOME, inputsOf, resultOf } from './testing/counts-analysis';
import type { CountsAnalysis } from './testing/counts-analysis';

const PLAIN: CountsAnalysis = {
  levels: ['never', 'monthly', 'daily'],
  counts: [
    [48, 80],
    [20, 40],
    [56, 70],
  ],
  exposureKind: 'orderedCategory',
};

const STRATIFIED: CountsAnalysis = {
  levels: ['no', 'yes'],
  counts: {
    kitchen: [
      [5, 120],
      [8, 106],
    ],
    ward: [
      [16, 85],
      [22, 98],
    ],
    office: [
      [0, 0],
      [3, 9],
    ],
  },
};

describe('computeAnalysis', () => {
  it('counts, estimates and tests each level against the reference', () => {
    const { crude, strata, pooled, counted } = resultOf(PLAIN);
    expect(counted).toBe(190);
    expect(crude.total).toEqual({ events: 124, total: 190 });
    expect(crude.levels.map(({ count }) => count.total)).toEqual([80, 40, 70]);
    expect(crude.contrasts.map(({ indexLevelId }) => indexLevelId)).toEqual(['monthly', 'daily']);
    // Newcombe (1998), Table II, example a.
    expect(crude.contrasts[1]?.measures.riskDifference).toMatchObject({
      ok: true,
      value: { value: 0.2, interval: { method: 'newcombe', level: 0.95 } },
    });
    expect(crude.trend.ok && crude.association.ok).toBe(true);
    expect([strata, pooled]).toEqual([[], []]);
  });

  it('pools over strata and says which it could not use', () => {
    const { strata, pooled, crude } = resultOf(STRATIFIED);
    expect(strata.map(({ stratumId }) => stratumId)).toEqual(['kitchen', 'ward', 'office']);
    expect(crude.total).toEqual({ events: 54, total: 418 });
    const [contrast] = pooled;
    // University Group Diabetes Program: pooled difference 0.035, ratio 1.33.
    expect(contrast?.measures.riskDifference).toMatchObject({ ok: true });
    expect(contrast?.leftOut).toEqual([
      { stratumId: 'office', issue: { code: 'emptyGroup', facts: { group: 'reference' } } },
    ]);
    const difference = contrast?.measures.riskDifference;
    expect(difference?.ok && difference.value.value).toBeCloseTo(0.0349, 4);
    expect(contrast?.homogeneity.oddsRatio).toMatchObject({
      ok: true,
      value: { degreesOfFreedom: 1 },
    });
  });

  it('does not pool a crude analysis, nor test a trend over unordered levels', () => {
    const crude = resultOf({ ...STRATIFIED, specification: { adjustment: 'crude' } });
    expect(crude.pooled).toEqual([]);
    expect(crude.crude.trend).toEqual({ ok: false, issue: { code: 'notOrdered' } });
  });

  it('gives odds only where cases and controls were sampled', () => {
    const { crude, pooled } = resultOf({ ...STRATIFIED, design: 'caseControl' });
    const notGiven = { ok: false, issue: { code: 'notGivenByDesign' } };
    expect(crude.levels[0]?.risk).toEqual(notGiven);
    for (const { measures } of [...crude.contrasts, ...pooled]) {
      expect(measures.riskDifference).toEqual(notGiven);
      expect(measures.riskRatio).toEqual(notGiven);
      expect(measures.oddsRatio.ok).toBe(true);
    }
    expect(pooled[0]?.homogeneity.riskDifference).toEqual(notGiven);
  });

  it('reverses: the chosen level becomes the one reference', () => {
    const { codeBook, specification, study, tally } = inputsOf(PLAIN);
    const reversed = reverseContrast(specification, 'daily');
    const frame = frameOf(codeBook, reversed, TEST_OUTCOME, study);
    const result = frame.ok ? computeAnalysis(reversed, frame.value, tally) : frame;
    const contrasts = result.ok ? result.value.crude.contrasts : [];
    expect(contrasts.map(({ indexLevelId }) => indexLevelId)).toEqual(['never', 'monthly']);
    expect(contrasts[0]?.measures.riskDifference).toMatchObject({ value: { value: -0.2 } });
  });

  it('puts an issue where a number is not defined, and nothing that JSON would change', () => {
    const result = resultOf({
      levels: ['a', 'b', 'c', 'd'],
      counts: [
        [0, 10],
        [4, 10],
        [10, 10],
        [0, 0],
      ],
      exposureKind: 'orderedCategory',
    });
    const codes = result.crude.contrasts.map(({ measures }) =>
      Object.values(measures).map((one) => (one.ok ? 'ok' : one.issue.code)),
    );
    expect(codes).toEqual([
      ['ok', 'zeroCell', 'zeroCell'],
      ['ok', 'zeroCell', 'zeroCell'],
      ['emptyGroup', 'emptyGroup', 'emptyGroup'],
    ]);
    expect(JSON.parse(JSON.stringify(result))).toEqual(result);
  });

  it.each([
    ['unknownMethod', { methods: { risk: 'x', riskDifference: '', riskRatio: '', oddsRatio: '' } }],
    ['invalidLevel', { level: 95 }],
    ['trendScoreMissing', { trendScores: { no: 1 } }],
  ])('refuses %s', (code, specification) => {
    expect(() => resultOf({ ...STRATIFIED, specification })).toThrow(code);
  });

  it('refuses a tally of other columns, of unknown levels, or of broken counts', () => {
    const { codeBook, specification, study, tally } = inputsOf(STRATIFIED);
    const frame = frameOf(codeBook, specification, TEST_OUTCOME, study);
    const compute = (changed: typeof tally): unknown =>
      frame.ok && computeAnalysis(specification, frame.value, changed);
    const other = tally.axes.map((axis) => ({ ...axis, columnId: 'other' }));
    expect(compute({ ...tally, axes: other })).toMatchObject({
      issue: { code: 'tallyDoesNotFit' },
    });
    const stray = [{ at: [0, 7, 0], count: 1 }];
    expect(compute({ ...tally, cells: stray })).toMatchObject({
      issue: { code: 'tallyDoesNotFit' },
    });
    const broken = [{ at: [0, 0, 0], count: 1.5 }];
    expect(compute({ ...tally, cells: broken })).toMatchObject({
      issue: { code: 'invalidCounts' },
    });
  });
});

describe('methods that were chosen', () => {
  const chosen = (otherMethods: OtherMethodChoice): AnalysisResult =>
    resultOf({ ...STRATIFIED, specification: { otherMethods } });

  it('pool, compare strata and test as they are named', () => {
    const { pooled, strata } = chosen({
      contrastTest: 'fisherMidP',
      poolings: { riskDifference: 'greenlandRobins', oddsRatio: 'exactConditional' },
      homogeneities: { oddsRatio: 'woolf' },
    });
    const [contrast] = pooled;
    expect(contrast?.measures).toMatchObject({
      riskDifference: { value: { interval: { method: 'greenlandRobins' } } },
      riskRatio: { value: { interval: { method: 'greenlandRobins' } } },
      oddsRatio: { value: { interval: { method: 'exactConditional' } } },
    });
    expect(contrast?.homogeneity.oddsRatio).toMatchObject({ value: { method: 'woolf' } });
    expect(strata[0]?.contrasts[0]?.test).toMatchObject({ value: { method: 'fisherMidP' } });
  });

  it('leave the test of a contrast to the expected counts where none is named', () => {
    const result = resultOf(STRATIFIED);
    const [kitchen, , office] = result.strata;
    expect(kitchen?.contrasts[0]).not.toHaveProperty('test');
    expect(printedTest(result, result.crude, result.crude.contrasts[0]!).quantity).toBe('pearson');
    expect(printedTest(result, office!, office!.contrasts[0]!).quantity).toBe('fisher');
  });

  it('test a trend by another test', () => {
    const result = resultOf({
      ...PLAIN,
      specification: { otherMethods: { trendTest: 'exactTrend' } },
    });
    expect(result.crude.trend).toMatchObject({ value: { method: 'exactTrend' } });
  });

  it.each([
    { contrastTest: 'guess' },
    { trendTest: 'guess' },
    { poolings: { riskRatio: 'sato' } },
    { homogeneities: { riskDifference: 'woolf' } },
  ])('are refused where no register has them: %j', (otherMethods) => {
    const { codeBook, specification, study, tally } = inputsOf({
      ...STRATIFIED,
      specification: { otherMethods },
    });
    const frame = frameOf(codeBook, specification, TEST_OUTCOME, study);
    const result = frame.ok ? computeAnalysis(specification, frame.value, tally) : frame;
    expect(result).toMatchObject({ ok: false, issue: { code: 'unknownMethod' } });
  });
});
