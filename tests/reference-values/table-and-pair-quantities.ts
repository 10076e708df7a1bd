import {
  MATCHED_ODDS_RATIO_INTERVALS,
  PAIRED_DIFFERENCE_INTERVALS,
  PAIRED_TESTS,
  cramersV,
  excessRisk,
  fisherOfTable,
  generalAssociation,
  likelihoodRatioOfTable,
  linearByLinear,
  rowMeanScores,
  scoreCorrelation,
} from '#shared/stats';
import type { PairedTable, StratifiedContingency, TestOutcome } from '#shared/stats';
import type { Result } from '#shared/core';
import type { ReferenceCase } from './quantities';
import { valueOf } from './value-of';

type Read = (reference: ReferenceCase) => readonly number[];

/** Scores of income and satisfaction in the example of Agresti (2002). */
const SATISFACTION = { rowScores: [3, 10, 20, 35], columnScores: [1, 3, 4, 5] };
/** Drinks a day in the example of Graubard and Korn (1987). */
const DRINKS = [0, 0.5, 1.5, 4, 7];

/** Readers of tables of any size, of pairs and of interaction. */
export const TABLE_AND_PAIR_READERS: Readonly<Record<string, Read>> = {
  'fisherFreemanHalton.pValue': (one) => [valueOf(fisherOfTable({ counts: rowsOf(one) })).pValue],
  'likelihoodRatioOfTable.statistic': (one) =>
    outcome(likelihoodRatioOfTable({ counts: rowsOf(one) })).slice(0, 1),
  cramersV: (one) => [valueOf(cramersV({ counts: rowsOf(one) }))],
  'linearByLinear.alcohol': (one) => trend(one, DRINKS),
  'linearByLinear.equallySpaced': (one) => trend(one, [1, 2, 3, 4, 5]),
  'generalAssociation.statisticAndP': (one) => outcome(generalAssociation(tablesOf(one))),
  'rowMeanScores.satisfaction': (one) =>
    outcome(rowMeanScores(tablesOf(one), SATISFACTION.columnScores)),
  'scoreCorrelation.satisfaction': (one) =>
    outcome(scoreCorrelation(tablesOf(one), SATISFACTION)),
  'excessRisk.oddsRatios': excessOf,
  'mcnemar.z': (one) => [Math.sqrt(Number(valueOf(PAIRED_TESTS.mcnemar.test(pairsOf(one))).statistic))],
  ...pairedTests(),
  ...pairedLimits(),
};

function pairedTests(): Record<string, Read> {
  const readers = Object.values(PAIRED_TESTS).flatMap((test): [string, Read][] => [
    [`${test.id}.statistic`, (one) => outcome(test.test(pairsOf(one))).slice(0, 1)],
    [`${test.id}.pValue`, (one) => outcome(test.test(pairsOf(one))).slice(1)],
  ]);
  return Object.fromEntries(readers);
}

function pairedLimits(): Record<string, Read> {
  const methods = [
    ...Object.values(PAIRED_DIFFERENCE_INTERVALS),
    ...Object.values(MATCHED_ODDS_RATIO_INTERVALS),
  ];
  const readers = methods.map((method): [string, Read] => [
    method.id,
    (one) => {
      const { lower, upper } = valueOf(method.interval(pairsOf(one), one.level ?? 0.95));
      return [lower, upper];
    },
  ]);
  return Object.fromEntries(readers);
}

function excessOf(one: ReferenceCase): readonly number[] {
  const [both, firstOnly, secondOnly, neither] = rowsOf(one).map(([events = 0, others = 0]) => ({
    events,
    total: events + others,
  }));
  const counts = { both: both!, firstOnly: firstOnly!, secondOnly: secondOnly!, neither: neither! };
  const { value, interval } = valueOf(excessRisk(counts, 'oddsRatios', 0.95)).estimate;
  return [value, interval.lower, interval.upper];
}

function trend(one: ReferenceCase, rowScores: readonly number[]): readonly number[] {
  const table = { counts: rowsOf(one), rowScores, columnScores: [1, 0] };
  return outcome(linearByLinear(table)).slice(0, 1);
}

function outcome(result: Result<TestOutcome, unknown>): readonly number[] {
  const { statistic, pValue } = valueOf(result);
  return [Number(statistic), pValue];
}

function rowsOf({ counts }: ReferenceCase): readonly (readonly number[])[] {
  return (counts ?? []) as readonly (readonly number[])[];
}

function tablesOf({ strata }: ReferenceCase): StratifiedContingency {
  return (strata ?? []).map((counts, place) => ({ id: `${place + 1}`, table: { counts } }));
}

function pairsOf({ pairs = [] }: ReferenceCase): PairedTable {
  const [both = 0, onlyFirst = 0, onlySecond = 0, neither = 0] = pairs;
  return { both, onlyFirst, onlySecond, neither };
}
