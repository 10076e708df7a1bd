import { failure, success } from '#shared/core';
import type { Result } from '#shared/core';
import { cellsOf, issueOfLevel, issueOfTable, marginsOf } from '../check-counts';
import { criticalValue } from '../distributions';
import type { Estimate, EstimationIssue } from '../estimate';
import type { FourfoldTable } from '../fourfold-table';
import type { MethodWords } from '../intervals';
import { fractionOfRatio } from './impact-estimate';
import type { ImpactEstimate } from './impact-estimate';

/** Names and sources of the impact measures, by the method that their interval names. */
export const IMPACT_METHODS = {
  ofRiskRatio: {
    id: 'ofRiskRatio',
    label: 'Fraction in the exposed, with the limits of the risk ratio',
    shortLabel: 'from the risk ratio',
    citation:
      'Miettinen OS. Proportion of disease caused or prevented by a given exposure, trait or ' +
      'intervention. American Journal of Epidemiology 1974;99:325-332.',
  },
  walter: {
    id: 'walter',
    label: "Population fraction with Walter's variance",
    shortLabel: 'Walter',
    citation:
      'Walter SD. The estimation and interpretation of attributable risk in health research. ' +
      'Biometrics 1976;32:829-849.',
  },
} as const satisfies Readonly<Record<string, MethodWords>>;

/**
 * Attributable fraction among the exposed, or the prevented fraction of a protective exposure.
 *
 * Takes a risk ratio (crude or adjusted) above 0 with its limits, exposed over unexposed; gives a
 * share of the exposed cases (or would-be cases), its limits those of the ratio. A ratio of 0 with
 * no log limits still gives a prevented fraction of 1.
 *
 * Source: Miettinen (1974) American Journal of Epidemiology 99:325-332.
 * Example: a ratio of 2 (1.6 to 2.5) gives 0.5 (0.375 to 0.6).
 */
export function fractionInExposed(riskRatio: Estimate): Result<ImpactEstimate, EstimationIssue> {
  const { value, interval } = riskRatio;
  const finite = [value, interval.lower, interval.upper].every(Number.isFinite);
  const ordered = interval.lower >= 0 && interval.lower <= value && value <= interval.upper;
  if (!finite || !ordered) {
    return failure({ code: 'invalidCounts' });
  }
  return value >= 1 && interval.lower === 0
    ? failure({ code: 'zeroCell' })
    : success(fractionOfRatio(riskRatio, 'ofRiskRatio'));
}

/** What was sampled: a population (cohort or cross-section), or cases and controls apart. */
export type Sampling = 'population' | 'casesAndControls';

/**
 * Population attributable fraction, crude, or the population prevented fraction.
 *
 * Takes events and totals of exposed (index) and unexposed (reference) as they came from one
 * population; gives a share of all cases. Cases and controls sampled apart: `notGivenByDesign`.
 * No unexposed cases: `zeroCell`; no cases: `noEvents`; an empty group: `emptyGroup`.
 *
 * Source: Walter (1976) Biometrics 32:829-849, variance of log(1 - AF) under sampling of the whole
 * population (the formula is checked against the delta method and by simulation in R).
 */
export function populationFraction(
  table: FourfoldTable,
  level: number,
  sampling: Sampling,
): Result<ImpactEstimate, EstimationIssue> {
  const issue = issueOfLevel(level) ?? issueOfTable(table) ?? issueOfPopulation(table, sampling);
  if (issue) {
    return failure(issue);
  }
  const factor = Math.exp(criticalValue(level) * Math.sqrt(varianceOfLogRest(table)));
  // 1 / (1 - AF) is the ratio of the population's risk to that of the unexposed.
  const value = 1 / unattributedShare(table);
  const interval = { lower: value / factor, upper: value * factor, level, method: 'walter' };
  return success(fractionOfRatio({ value, interval }, 'walter'));
}

function issueOfPopulation(table: FourfoldTable, sampling: Sampling): EstimationIssue | null {
  if (sampling === 'casesAndControls') {
    return { code: 'notGivenByDesign' };
  }
  if (marginsOf(table).events === 0) {
    return { code: 'noEvents', facts: { events: 0 } };
  }
  return table.reference.events === 0 ? { code: 'zeroCell', facts: { group: 'reference' } } : null;
}

/** 1 - AF: the unexposed group's risk over that of the population. */
function unattributedShare(table: FourfoldTable): number {
  const { events, total } = marginsOf(table);
  return (table.reference.events / events) * (total / table.reference.total);
}

function varianceOfLogRest(table: FourfoldTable): number {
  const { indexEvents, indexOthers, referenceEvents, referenceOthers } = cellsOf(table);
  const fraction = 1 - unattributedShare(table);
  const spread = indexOthers + fraction * (indexEvents + referenceOthers);
  return Math.max(0, spread / marginsOf(table).total / referenceEvents);
}

/** Whether a ratio is crude or adjusted for other factors. */
export type RatioAdjustment = 'crude' | 'adjusted';

/** The share of the population that is exposed, and a crude risk ratio. */
export interface LevinParts {
  readonly exposedShare: number;
  readonly riskRatio: number;
  readonly adjustment: RatioAdjustment;
}

/**
 * Population attributable fraction of the share exposed and a crude risk ratio (Levin's formula).
 *
 * Gives a share of 1 without limits. An adjusted ratio is refused (`adjustedInCrudeFormula`): the
 * formula is biased with it, whereas the share of cases that are exposed would do.
 *
 * Source: Levin (1953) Acta Unio Internationalis Contra Cancrum 9:531-541; Miettinen (1974)
 * American Journal of Epidemiology 99:325-332 for the refusal.
 */
export function levinFraction(parts: LevinParts): Result<number, EstimationIssue> {
  const { exposedShare, riskRatio, adjustment } = parts;
  const valid = exposedShare >= 0 && exposedShare <= 1 && riskRatio >= 0;
  if (!valid || !Number.isFinite(riskRatio)) {
    return failure({ code: 'invalidCounts' });
  }
  if (adjustment === 'adjusted') {
    return failure({ code: 'adjustedInCrudeFormula' });
  }
  const excess = exposedShare * (riskRatio - 1);
  return excess <= -1 ? failure({ code: 'zeroCell' }) : success(excess / (1 + excess));
}

/**
 * Population attributable fraction of the share of cases that are exposed and a risk ratio, which
 * may be adjusted: share × (1 - 1/ratio). Gives a share of 1 without limits.
 *
 * Source: Miettinen (1974) American Journal of Epidemiology 99:325-332.
 */
export function fractionOfExposedCases(
  exposedShareOfCases: number,
  riskRatio: number,
): Result<number, EstimationIssue> {
  const valid = exposedShareOfCases >= 0 && exposedShareOfCases <= 1 && Number.isFinite(riskRatio);
  return valid && riskRatio > 0
    ? success(exposedShareOfCases * (1 - 1 / riskRatio))
    : failure({ code: 'invalidCounts' });
}
