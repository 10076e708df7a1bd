import { failure, success } from '#shared/core';
import type { Result } from '#shared/core';
import { cellsOf, issueOfTable } from '../check-counts';
import { chiSquareUpperTail } from '../distributions';
import type { EstimationIssue, TestOutcome } from '../estimate';
import { fitOddsRatio } from '../fitted-odds-ratio';
import type { FourfoldTable, GroupCount, StratifiedTable } from '../fourfold-table';
import { riskDifferenceOf, riskRatioOf } from '../point-estimates';
import { issueOfTest } from '../tests-of-association/fourfold-issue';
import { issueOfLogRiskRatio } from '../intervals/risk-ratio/risk-ratio-method';
import { pooledOddsRatio } from './mantel-haenszel-ratios';
import type { UnusedStratum } from './strata-used';
import { invalidStratum, partStrata, sumOver } from './strata-used';

/** A test over strata with the strata that it could not use. */
export interface HomogeneityTest {
  readonly outcome: Result<TestOutcome, EstimationIssue>;
  readonly leftOut: readonly UnusedStratum[];
}

/**
 * Whether the odds ratio is the same in all strata: Breslow and Day's test around the
 * Mantel–Haenszel estimate, with Tarone's correction.
 *
 * Takes events and totals by stratum; gives a chi-square statistic with one degree of freedom less
 * than informative strata. Fewer than two of them: `fewerThanTwoStrata`; a pooled estimate of 0 or
 * infinity: `zeroCell`.
 *
 * Source: Breslow and Day (1980) Statistical Methods in Cancer Research I; Tarone (1985) Biometrika
 * 72:91-95.
 * Example: the admissions data give 18.8255 on 5 degrees of freedom.
 */
export function oddsRatioHomogeneity(strata: StratifiedTable): HomogeneityTest {
  return testOf(strata, issueOfTest, 'breslowDayTarone', (used) => {
    const pooled = pooledOddsRatio(used, 0.95);
    return pooled.ok ? success(breslowDayTarone(used, pooled.value.value)) : pooled;
  });
}

function breslowDayTarone(strata: StratifiedTable, oddsRatio: number): number {
  const fits = strata.map(({ table }) => fitOddsRatio(table, Math.log(oddsRatio)));
  const breslowDay = fits.reduce((sum, fit) => sum + fit.deviation ** 2 / fit.variance, 0);
  const deviation = fits.reduce((sum, fit) => sum + fit.deviation, 0);
  const variance = fits.reduce((sum, fit) => sum + fit.variance, 0);
  return breslowDay - deviation ** 2 / variance;
}

/**
 * Whether the risk difference is the same in all strata: Q around the inverse-variance mean.
 *
 * Strata with an empty group, or whose difference has no variance (both risks 0 or 1, `zeroCell`),
 * are left out. Fewer than two others: `fewerThanTwoStrata`.
 *
 * Source: Cochran (1954) Biometrics 10:101-129.
 */
export function riskDifferenceHomogeneity(strata: StratifiedTable): HomogeneityTest {
  return testOf(strata, issueOfDifference, 'inverseVariance', (used) =>
    success(inverseVarianceQ(used, riskDifferenceOf, varianceOfDifference)),
  );
}

function issueOfDifference(table: FourfoldTable): EstimationIssue | null {
  const withoutVariance = varianceOfDifference(table) === 0;
  return issueOfTable(table) ?? (withoutVariance ? { code: 'zeroCell' } : null);
}

function varianceOfDifference({ index, reference }: FourfoldTable): number {
  return varianceOfRisk(index) + varianceOfRisk(reference);
}

function varianceOfRisk({ events, total }: GroupCount): number {
  return ((events / total) * ((total - events) / total)) / total;
}

/**
 * Whether the risk ratio is the same in all strata: Q of its logarithm around the inverse-variance
 * mean.
 *
 * Strata with an empty group, or where a group has no events or both have nothing else
 * (`zeroCell`), are left out. Fewer than two others: `fewerThanTwoStrata`.
 *
 * Source: Cochran (1954) Biometrics 10:101-129.
 */
export function riskRatioHomogeneity(strata: StratifiedTable): HomogeneityTest {
  return testOf(strata, issueOfLogRatio, 'inverseVariance', (used) =>
    success(inverseVarianceQ(used, (table) => Math.log(riskRatioOf(table)), varianceOfLogRatio)),
  );
}

function issueOfLogRatio(table: FourfoldTable): EstimationIssue | null {
  const cells = cellsOf(table);
  const withoutVariance = cells.indexOthers === 0 && cells.referenceOthers === 0;
  return issueOfLogRiskRatio(table) ?? (withoutVariance ? { code: 'zeroCell' } : null);
}

function varianceOfLogRatio({ index, reference }: FourfoldTable): number {
  return (
    (index.total - index.events) / index.total / index.events +
    (reference.total - reference.events) / reference.total / reference.events
  );
}

function inverseVarianceQ(
  strata: StratifiedTable,
  valueOf: (table: FourfoldTable) => number,
  varianceOf: (table: FourfoldTable) => number,
): number {
  const weights = sumOver(strata, (table) => 1 / varianceOf(table));
  const mean = sumOver(strata, (table) => valueOf(table) / varianceOf(table)) / weights;
  return sumOver(strata, (table) => (valueOf(table) - mean) ** 2 / varianceOf(table));
}

function testOf(
  strata: StratifiedTable,
  issueOf: (table: FourfoldTable) => EstimationIssue | null,
  method: string,
  statisticOf: (used: StratifiedTable) => Result<number, EstimationIssue>,
): HomogeneityTest {
  const parted = partStrata(strata, issueOf);
  const invalid = invalidStratum(parted);
  const leftOut = parted.leftOut;
  if (invalid) {
    return { outcome: failure(invalid), leftOut };
  }
  if (parted.used.length < 2) {
    const facts = { strata: parted.used.length };
    return { outcome: failure({ code: 'fewerThanTwoStrata', facts }), leftOut };
  }
  const statistic = statisticOf(parted.used);
  const degreesOfFreedom = parted.used.length - 1;
  return {
    outcome: statistic.ok
      ? success(outcomeOf(method, Math.max(0, statistic.value), degreesOfFreedom))
      : statistic,
    leftOut,
  };
}

function outcomeOf(method: string, statistic: number, degreesOfFreedom: number): TestOutcome {
  const pValue = chiSquareUpperTail(statistic, degreesOfFreedom);
  return { method, statistic, degreesOfFreedom, pValue };
}
