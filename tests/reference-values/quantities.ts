import {
  FOURFOLD_TESTS,
  ODDS_RATIO_HOMOGENEITIES,
  ODDS_RATIO_INTERVALS,
  RISK_DIFFERENCE_INTERVALS,
  RISK_INTERVALS,
  RISK_RATIO_INTERVALS,
  cochranArmitage,
  cochranMantelHaenszel,
  conditionalOddsRatioOf,
  eValue,
  fisherOfFourfold,
  oddsRatioOf,
  pearsonOfTable,
  pooledOddsRatio,
  pooledRiskDifference,
  pooledRiskRatio,
  riskDifferenceOf,
  riskRatioOf,
} from '#shared/stats';
import type {
  Estimate,
  FourfoldTable,
  GroupCount,
  HomogeneityMethod,
  Interval,
  IntervalMethod,
  RatioWithLimits,
  StratifiedTable,
  TestOutcome,
} from '#shared/stats';
import type { Result } from '#shared/core';
import { TABLE_AND_PAIR_READERS } from './table-and-pair-quantities';
import { valueOf } from './value-of';

export { valueOf };

/** Counts as the reference files give them: events and others by group, or events and total. */
export interface ReferenceCase {
  readonly quantity: string;
  readonly counts?: readonly number[] | readonly (readonly number[])[];
  readonly strata?: readonly (readonly (readonly number[])[])[];
  readonly pairs?: readonly number[];
  readonly level?: number;
}

type Read = (reference: ReferenceCase) => readonly number[];

/** What this project computes for a case, in the order in which the reference gives it. */
export function computed(reference: ReferenceCase): readonly number[] {
  const read = READERS[reference.quantity];
  if (!read) {
    throw new Error(`No reader for ${reference.quantity}`);
  }
  return read(reference);
}

const READERS: Readonly<Record<string, Read>> = {
  ...limitsOf('risk', RISK_INTERVALS, groupOf),
  ...limitsOf('riskDifference', RISK_DIFFERENCE_INTERVALS, fourfoldOf),
  ...limitsOf('riskRatio', RISK_RATIO_INTERVALS, fourfoldOf),
  ...limitsOf('oddsRatio', ODDS_RATIO_INTERVALS, fourfoldOf),
  'riskDifference.value': (one) => [riskDifferenceOf(fourfoldOf(one))],
  'riskRatio.value': (one) => [riskRatioOf(fourfoldOf(one))],
  'oddsRatio.value': (one) => [oddsRatioOf(fourfoldOf(one))],
  'oddsRatio.conditionalEstimate': (one) => [conditionalOddsRatioOf(fourfoldOf(one))],
  'oddsRatio.conditionalEstimateAndLimits': (one) => [
    conditionalOddsRatioOf(fourfoldOf(one)),
    ...limits(ODDS_RATIO_INTERVALS.conditionalExact.interval(fourfoldOf(one), 0.95)),
  ],
  ...fourfoldTests(),
  ...testOf('pearson', (one) => pearsonOfTable({ counts: rowsOf(one) })),
  ...testOf('fisher', (one) => fisherOfFourfold(fourfoldOf(one))),
  ...testOf('trend', (one) =>
    cochranArmitage(
      rowsOf(one).map(([events = 0, others = 0], place) => ({
        events,
        total: events + others,
        score: place + 1,
      })),
    ),
  ),
  ...testOf('cochranMantelHaenszel', (one) => cochranMantelHaenszel(strataOf(one))),
  ...correctedTest((one) => cochranMantelHaenszel(strataOf(one), 'half')),
  ...homogeneityOf(ODDS_RATIO_HOMOGENEITIES),
  ...TABLE_AND_PAIR_READERS,
  ...estimateOf('pooledOddsRatio', (one) => pooledOddsRatio(strataOf(one), 0.95)),
  ...estimateOf('pooledRiskRatio', (one) => pooledRiskRatio(strataOf(one), 0.95)),
  'eValue.ofValue': (one) => [valueOf(eValue(ratioOf(one))).ofValue],
  'eValue.ofLimit': (one) => [valueOf(eValue(ratioOf(one))).ofLimit],
  'pooledRiskDifference.value': (one) =>
    estimate(pooledRiskDifference(strataOf(one), 0.95)).slice(0, 1),
  'pooledRiskDifference.satoLimits': (one) =>
    estimate(pooledRiskDifference(strataOf(one), 0.95)).slice(1),
  'pooledRiskDifference.greenlandRobins': (one) =>
    estimate(pooledRiskDifference(strataOf(one), 0.95, 'greenlandRobins')),
  'pooledRiskDifference.greenlandRobinsLimits': (one) =>
    estimate(pooledRiskDifference(strataOf(one), 0.95, 'greenlandRobins')).slice(1),
};

function limitsOf<Counts>(
  estimand: string,
  methods: Readonly<Record<string, IntervalMethod<Counts>>>,
  countsOf: (reference: ReferenceCase) => Counts,
): Record<string, Read> {
  const entries = Object.entries(methods).map(([id, method]): [string, Read] => [
    `${estimand}.${id}`,
    (one) => limits(method.interval(countsOf(one), one.level ?? 0.95)),
  ]);
  return Object.fromEntries(entries);
}

function fourfoldTests(): Record<string, Read> {
  const readers = Object.values(FOURFOLD_TESTS).map((member) =>
    testOf(member.id, (one) => member.test(fourfoldOf(one))),
  );
  return Object.assign({}, ...readers) as Record<string, Read>;
}

function testOf(
  name: string,
  test: (reference: ReferenceCase) => Result<TestOutcome, unknown>,
): Record<string, Read> {
  return {
    [`${name}.statistic`]: (one) => [Number(valueOf(test(one)).statistic)],
    [`${name}.pValue`]: (one) => [valueOf(test(one)).pValue],
    [`${name}.statisticAndP`]: (one) => outcome(test(one)),
  };
}

function homogeneityOf(methods: Readonly<Record<string, HomogeneityMethod>>): Record<string, Read> {
  const readers = Object.entries(methods).map(([id, method]) =>
    testOf(id, (one) => method.test(strataOf(one)).outcome),
  );
  return Object.assign({}, ...readers) as Record<string, Read>;
}

function correctedTest(
  test: (reference: ReferenceCase) => Result<TestOutcome, unknown>,
): Record<string, Read> {
  return {
    'cochranMantelHaenszel.correctedStatistic': (one) => outcome(test(one)).slice(0, 1),
    'cochranMantelHaenszel.correctedP': (one) => outcome(test(one)).slice(1),
    'cochranMantelHaenszel.correctedStatisticAndP': (one) => outcome(test(one)),
  };
}

function estimateOf(
  name: string,
  pooled: (reference: ReferenceCase) => Result<Estimate, unknown>,
): Record<string, Read> {
  return {
    [`${name}.value`]: (one) => estimate(pooled(one)).slice(0, 1),
    [`${name}.limits`]: (one) => estimate(pooled(one)).slice(1),
    [`${name}.valueAndLimits`]: (one) => estimate(pooled(one)),
  };
}

function limits(result: Result<Interval, unknown>): readonly number[] {
  const { lower, upper } = valueOf(result);
  return [lower, upper];
}

function estimate(result: Result<Estimate, unknown>): readonly number[] {
  const { value, interval } = valueOf(result);
  return [value, interval.lower, interval.upper];
}

function outcome(result: Result<TestOutcome, unknown>): readonly number[] {
  const { statistic, pValue } = valueOf(result);
  return [Number(statistic), pValue];
}

function groupOf({ counts }: ReferenceCase): GroupCount {
  const [events = 0, total = 0] = (counts ?? []) as readonly number[];
  return { events, total };
}

/** A ratio with its limits stands where counts stand elsewhere. */
function ratioOf({ counts }: ReferenceCase): RatioWithLimits {
  const [value = 0, lower = 0, upper = 0] = (counts ?? []) as readonly number[];
  return { value, lower, upper };
}

function rowsOf({ counts }: ReferenceCase): readonly (readonly number[])[] {
  return (counts ?? []) as readonly (readonly number[])[];
}

function fourfoldOf(reference: ReferenceCase): FourfoldTable {
  return tableOf(rowsOf(reference));
}

function tableOf(rows: readonly (readonly number[])[]): FourfoldTable {
  const group = ([events = 0, others = 0]: readonly number[] = []): GroupCount => ({
    events,
    total: events + others,
  });
  return { index: group(rows[0]), reference: group(rows[1]) };
}

function strataOf({ strata }: ReferenceCase): StratifiedTable {
  return (strata ?? []).map((rows, place) => ({ id: `${place + 1}`, table: tableOf(rows) }));
}
