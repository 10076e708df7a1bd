import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { computeAnalysis, defaultSpecification, findGuards, frameOf } from '#shared/analysis';
import type { AnalysisResult, OutcomeWords } from '#shared/analysis';
import type { CodeBookColumn } from '#shared/code-book';
import type { StudyDesign } from '#shared/effects';
import type { Tally } from '#shared/tally';
import { testColumn } from '../../shared/analysis/testing/counts-analysis';
import openData from './open-data.json';

/** Published worked data through the whole computation, from the rows of a file to the guards. */
interface Analysis {
  readonly file: string;
  readonly outcome: string;
  readonly event: string;
  readonly exposure: string;
  readonly levels: readonly string[];
  readonly strata: readonly [column: string, levels: readonly string[]];
  readonly design: StudyDesign;
}

const ADMISSIONS: Analysis = {
  file: 'UCBAdmissions_aggregated.csv',
  outcome: 'Admit',
  event: 'Admitted',
  exposure: 'Gender',
  levels: ['Female', 'Male'],
  strata: ['Dept', ['A', 'B', 'C', 'D', 'E', 'F']],
  design: 'crossSectional',
};

const SURVIVAL: Analysis = {
  file: 'Titanic_aggregated.csv',
  outcome: 'Survived',
  event: 'Yes',
  exposure: 'Age',
  levels: ['Adult', 'Child'],
  strata: ['Class', ['1st', '2nd', '3rd', 'Crew']],
  design: 'cohort',
};

const OESOPHAGUS: Analysis = {
  file: 'esoph_aggregated.csv',
  outcome: 'status',
  event: 'case',
  exposure: 'tobgp',
  levels: ['0-9g/day', '10-19', '20-29', '30+'],
  strata: ['alcgp', ['0-39g/day', '40-79', '80-119', '120+']],
  design: 'caseControl',
};

describe('admissions', () => {
  const result = resultOf(ADMISSIONS);
  const [contrast] = result.crude.contrasts;
  const [pooled] = result.pooled;

  it('crude and pooled numbers are the reference values', () => {
    const query = 'Gender (Male=exposed, Female=reference) x Admit (Admitted=event)';
    expectValue(contrast?.measures.riskDifference, expectedOf(query, 'riskDifference.value'));
    expectLimits(contrast?.measures.riskDifference, expectedOf(query, 'riskDifference.newcombe'));
    expectLimits(contrast?.measures.riskRatio, expectedOf(query, 'riskRatio.katz'));
    expectLimits(contrast?.measures.oddsRatio, expectedOf(query, 'oddsRatio.woolf'));
    const strata = 'Gender x Admit by Dept';
    expectValue(pooled?.measures.riskDifference, expectedOf(strata, 'pooledRiskDifference.value'));
    const sato = expectedOf(strata, 'pooledRiskDifference.satoLimits');
    expectLimits(pooled?.measures.riskDifference, sato);
    expectLimits(pooled?.measures.oddsRatio, expectedOf(strata, 'pooledOddsRatio.limits'));
  });

  it('turn round: +14.2 points crude, -1.8 pooled, and the guard states both', () => {
    const finding = findGuards(result).find(({ guardId }) => guardId === 'turnedRound');
    expect(finding?.facts.measureId).toBe('riskDifference');
    expect((100 * Number(finding?.facts.crude)).toFixed(1)).toBe('14.2');
    expect((100 * Number(finding?.facts.pooled)).toFixed(1)).toBe('-1.8');
    expect(findGuards(result).map(({ guardId }) => guardId)).toContain('strataDisagree');
  });
});

describe('survival', () => {
  const result = resultOf(SURVIVAL);

  it('leaves the crew, which has no children, out of the pooled numbers and says so', () => {
    const [pooled] = result.pooled;
    const crew = { stratumId: 'Crew', issue: { code: 'emptyGroup', facts: { group: 'index' } } };
    expect(pooled?.leftOut).toEqual([crew]);
    const query = 'Age (Child exposed) x Survived (Yes) by Class (Crew has no children)';
    expectValue(pooled?.measures.riskRatio, expectedOf(query, 'pooledRiskRatio.value'));
    expectLimits(pooled?.measures.oddsRatio, expectedOf(query, 'pooledOddsRatio.limits'));
    expect(pooled?.homogeneity.oddsRatio).toMatchObject({ value: { degreesOfFreedom: 2 } });
    const left = findGuards(result).find(({ guardId }) => guardId === 'stratumLeftOut');
    expect(left?.place.scope).toEqual({ kind: 'stratum', stratumId: 'Crew' });
  });

  it('cannot give a ratio where every child survived', () => {
    const first = result.strata.find(({ stratumId }) => stratumId === '1st');
    expect(first?.contrasts[0]?.measures.oddsRatio).toMatchObject({ issue: { code: 'zeroCell' } });
    expect(first?.contrasts[0]?.measures.riskRatio.ok).toBe(true);
  });
});

describe('cases and controls', () => {
  const result = resultOf(OESOPHAGUS);

  it('give odds ratios of the reference values, and no risk', () => {
    const query = 'tobgp x case/control, reference 0-9g/day';
    const limits = openData.cases.filter(
      (one) => one.query === query && one.quantity === 'oddsRatio.woolf',
    );
    expect(limits).toHaveLength(3);
    result.crude.contrasts.forEach(({ measures }, place) => {
      expectLimits(measures.oddsRatio, limits[place]!.expected);
      expect(measures.riskRatio).toMatchObject({ issue: { code: 'notGivenByDesign' } });
    });
    const [trend] = expectedOf(query, 'trend.pValue');
    expect(result.crude.trend.ok && result.crude.trend.value.pValue).toBeCloseTo(trend!, 10);
    expect(findGuards(result).map(({ guardId }) => guardId)).toContain('noRiskByDesign');
  });

  it('are warned of when the levels stand in alphabetical order', () => {
    const sorted = resultOf({
      ...OESOPHAGUS,
      exposure: 'alcgp',
      levels: ['0-39g/day', '120+', '40-79', '80-119'],
      strata: ['tobgp', OESOPHAGUS.levels],
    });
    const finding = findGuards(sorted).find(({ guardId }) => guardId === 'levelsOutOfOrder');
    expect(finding?.facts.levelIds).toEqual(['0-39g/day', '40-79', '80-119', '120+']);
  });
});

function resultOf(analysis: Analysis): AnalysisResult {
  const [stratumColumn, strata] = analysis.strata;
  const rows = rowsOf(analysis.file);
  const outcomes = [...new Set(rows.map((row) => row[analysis.outcome] ?? ''))];
  const columns: readonly CodeBookColumn[] = [
    testColumn(analysis.outcome, 'category', outcomes),
    testColumn(analysis.exposure, 'orderedCategory', analysis.levels),
    testColumn(stratumColumn, 'category', strata),
  ];
  const specification = defaultSpecification({
    outcome: { outcomeId: 'o', columnId: analysis.outcome, eventLevelIds: [analysis.event] },
    exposure: { columnId: analysis.exposure, referenceLevelId: analysis.levels[0]! },
    stratumColumnIds: [stratumColumn],
  });
  const codeBook = { schemaVersion: 1, layout: { kind: 'records' }, columns } as const;
  const study = { design: analysis.design, peopleNoun: 'people', population: 'all' };
  const frame = frameOf(codeBook, specification, OUTCOME, study);
  const result = frame.ok
    ? computeAnalysis(specification, frame.value, tallyOf(columns, rows))
    : frame;
  if (!result.ok) {
    throw new Error(result.issue.code);
  }
  return result.value;
}

const OUTCOME: OutcomeWords = {
  id: 'o',
  noun: 'event',
  verbPhrase: 'had the event',
  timeFrame: null,
  desirability: 'harmful',
};

type Row = Readonly<Record<string, string>>;

function rowsOf(file: string): readonly Row[] {
  const text = readFileSync(new URL(`../data/${file}`, import.meta.url), 'utf8');
  const [head = [], ...rows] = text
    .trim()
    .split('\n')
    .map((line) => line.trim().split(',').map((cell) => cell.replaceAll('"', '')));
  return rows.map((cells) => Object.fromEntries(head.map((name, place) => [name, cells[place]!])));
}

function tallyOf(columns: readonly CodeBookColumn[], rows: readonly Row[]): Tally {
  const axes = columns.map(({ id, levels }) => ({
    columnId: id,
    levelIds: levels.map((level) => level.id),
  }));
  const cells = rows.map((row) => ({
    at: axes.map(({ columnId, levelIds }) => levelIds.indexOf(row[columnId] ?? '')),
    count: Number(row.count),
  }));
  const counted = cells.reduce((sum, { count }) => sum + count, 0);
  return { axes, cells, counted, restricted: 0, leftOut: [] };
}

function expectedOf(query: string, quantity: string): readonly number[] {
  const found = openData.cases.find((one) => one.query === query && one.quantity === quantity);
  if (!found) {
    throw new Error(`No reference value: ${query}, ${quantity}`);
  }
  return found.expected;
}

type Measure = AnalysisResult['crude']['contrasts'][number]['measures']['oddsRatio'] | undefined;

function expectValue(measure: Measure, [expected = NaN]: readonly number[]): void {
  expect(measure?.ok && measure.value.value).toBeCloseTo(expected, 9);
}

function expectLimits(measure: Measure, [lower = NaN, upper = NaN]: readonly number[]): void {
  expect(measure?.ok && measure.value.interval.lower).toBeCloseTo(lower, 7);
  expect(measure?.ok && measure.value.interval.upper).toBeCloseTo(upper, 7);
}
