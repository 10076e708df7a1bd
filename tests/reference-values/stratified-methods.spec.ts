import { describe, expect, it } from 'vitest';
import {
  DIFFERENCES_OF_DIFFERENCES,
  ODDS_RATIO_HOMOGENEITIES,
  POOLED_ODDS_RATIOS,
  POOLED_RISK_DIFFERENCES,
  POOLED_RISK_RATIOS,
  excessRisk,
  generalAssociation,
  ratioOfRatios,
  rowMeanScores,
  scoreCorrelation,
  standardisedRisks,
} from '#shared/stats';
import type {
  Estimate,
  FourfoldTable,
  Interaction,
  StratifiedTable,
  TestOutcome,
} from '#shared/stats';
import { valueOf } from './quantities';
import reference from './stratified-methods.json';

type Case = (typeof reference.cases)[number];

/** Sums and closed forms. */
const DIRECT = 1e-9;
/** R's models stop at 1e-15 of the deviance, which leaves 1e-8 of a covariance. */
const FITTED = 1e-6;
/** R's root finder stops at 1e-15 of a logarithm, and its hypergeometric weights at 1e-13. */
const ROOT = 1e-10;
/** mantelhaen.test searches exact limits with a tolerance of about 1e-4, on inverses above 1. */
const PRINTED = 5e-3;

describe('a common odds ratio, exactly, against R', () => {
  it.each(casesOf('conditional'))('$strata', (one) => {
    const strata = strataOf(one);
    const exact = valueOf(POOLED_ODDS_RATIOS.exactConditional.pooled(strata, 0.95));
    const midP = valueOf(POOLED_ODDS_RATIOS.exactMidP.pooled(strata, 0.95));
    expectAll(numbersOf(exact), [one.value!, ...one.exact!] as number[], ROOT);
    expectAll(numbersOf(midP), [one.value!, ...one.midP!] as number[], ROOT);
    if (one.mantelhaenTest) {
      expectAll(numbersOf(exact), one.mantelhaenTest, PRINTED);
    }
  });
});

describe('homogeneity of odds ratios against R', () => {
  it.each(casesOf('homogeneity'))('$strata', (one) => {
    for (const method of Object.values(ODDS_RATIO_HOMOGENEITIES)) {
      const { outcome, leftOut } = method.test(strataOf(one));
      expect(leftOut).toEqual([]);
      const { statistic, pValue } = valueOf(outcome);
      expectAll([Number(statistic), pValue], one[method.id]!, DIRECT);
    }
  });
});

describe('pooled differences and ratios against R', () => {
  it.each(casesOf('pooled'))('$strata', (one) => {
    const strata = strataOf(one);
    const { sato, greenlandRobins } = POOLED_RISK_DIFFERENCES;
    expectAll(numbersOf(valueOf(sato.pooled(strata, 0.95))), one.sato!, DIRECT);
    expectAll(
      numbersOf(valueOf(greenlandRobins.pooled(strata, 0.95))),
      one.greenlandRobins!,
      DIRECT,
    );
    const ratio = POOLED_RISK_RATIOS.greenlandRobins.pooled(strata, 0.95);
    expectAll(numbersOf(valueOf(ratio)), one.riskRatio as number[], DIRECT);
  });
});

describe('generalised Cochran–Mantel–Haenszel tests against R', () => {
  it.each(casesOf('generalised'))('$tables', (one) => {
    const strata = one.tables!.map((counts, at) => ({ id: `${at}`, table: { counts } }));
    const scores = { rowScores: one.rowScores!, columnScores: one.columnScores! };
    expectAll(outcomeOf(valueOf(generalAssociation(strata))), one.generalAssociation!, DIRECT);
    const means = valueOf(rowMeanScores(strata, scores.columnScores));
    expectAll(outcomeOf(means), one.rowMeanScores!, DIRECT);
    const correlation = valueOf(scoreCorrelation(strata, scores));
    expectAll(outcomeOf(correlation), one.scoreCorrelation!, DIRECT);
  });
});

describe('standardised risks against R', () => {
  it.each(casesOf('standardised'))('$strata by $shares', (one) => {
    const strata = strataOf(one);
    const shares = Object.fromEntries(strata.map(({ id }, at) => [id, one.shares![at]!]));
    const found = valueOf(standardisedRisks(strata, { kind: 'chosen', shares }, 0.95));
    for (const name of ['index', 'reference', 'difference', 'ratio'] as const) {
      expectAll(numbersOf(valueOf(found[name])), one[name]!, FITTED);
    }
    const weighed = strata.map((stratum, at) => ({
      ...stratum,
      share: one.shares![at]!,
      members: one.shares![at]!,
    }));
    for (const id of ['standardisedToChosen', 'standardisedToAll'] as const) {
      const difference = POOLED_RISK_DIFFERENCES[id].pooled(weighed, 0.95);
      expectAll(numbersOf(valueOf(difference)), one.difference!, FITTED);
      const ratio = POOLED_RISK_RATIOS[id].pooled(weighed, 0.95);
      expectAll(numbersOf(valueOf(ratio)), one.ratio!, FITTED);
    }
  });

  it.each(casesOf('standardised'))('$strata by the groups themselves', (one) => {
    const strata = strataOf(one);
    const groups = { standardisedToIndex: 'index', standardisedToReference: 'reference' } as const;
    for (const [id, kind] of Object.entries(groups)) {
      const shares = Object.fromEntries(strata.map(({ id, table }) => [id, table[kind].total]));
      const chosen = valueOf(standardisedRisks(strata, { kind: 'chosen', shares }, 0.95));
      const pooled = POOLED_RISK_DIFFERENCES[id as keyof typeof groups].pooled(strata, 0.95);
      expectAll(numbersOf(valueOf(pooled)), numbersOf(valueOf(chosen.difference)), DIRECT);
    }
  });
});

describe('interaction against R', () => {
  it.each(casesOf('interaction'))('$strata', (one) => {
    const [first, second] = strataOf(one).map(({ table }) => table) as [
      FourfoldTable,
      FourfoldTable,
    ];
    for (const ratio of ['riskRatio', 'oddsRatio'] as const) {
      const found = valueOf(ratioOfRatios(first, second, ratio, 0.95));
      expectAll(interactionOf(found), one[ratio] as number[], FITTED);
    }
    const { waldContrast, squareAndAddContrast } = DIFFERENCES_OF_DIFFERENCES;
    const wald = valueOf(waldContrast.contrast(first, second, 0.95));
    expectAll(interactionOf(wald), one.wald!, FITTED);
    const added = valueOf(squareAndAddContrast.contrast(first, second, 0.95));
    expectAll(numbersOf(added.estimate), one.squareAndAdd!, DIRECT);
    expect(added.test).toEqual(wald.test);
  });

  it.each(casesOf('excess'))('relative excess risk of $groups', (one) => {
    const [both, firstOnly, secondOnly, neither] = one.groups!.map(([events, total]) => ({
      events: events!,
      total: total!,
    }));
    const counts = {
      both: both!,
      firstOnly: firstOnly!,
      secondOnly: secondOnly!,
      neither: neither!,
    };
    for (const from of ['riskRatios', 'oddsRatios'] as const) {
      expectAll(interactionOf(valueOf(excessRisk(counts, from, 0.95))), one[from]!, FITTED);
    }
  });
});

function casesOf(kind: string): readonly Case[] {
  const found = reference.cases.filter((one) => one.kind === kind);
  expect(found.length).toBeGreaterThan(1);
  return found;
}

function strataOf(one: Case): StratifiedTable {
  return one.strata!.map(([a = NaN, m = NaN, c = NaN, n = NaN], place) => ({
    id: `s${place}`,
    table: { index: { events: a, total: m }, reference: { events: c, total: n } },
  }));
}

function numbersOf({ value, interval }: Estimate): readonly number[] {
  return [value, interval.lower, interval.upper];
}

function outcomeOf({ statistic, degreesOfFreedom, pValue }: TestOutcome): readonly number[] {
  return [Number(statistic), Number(degreesOfFreedom), pValue];
}

function interactionOf({ estimate, test }: Interaction): readonly number[] {
  return [...numbersOf(estimate), Number(test.statistic), test.pValue];
}

function expectAll(
  values: readonly number[],
  expected: readonly number[],
  relative: number,
): void {
  expect(values).toHaveLength(expected.length);
  values.forEach((value, place) => {
    const wanted = expected[place]!;
    const error = Math.abs(value - wanted);
    expect(error, `${value} for ${wanted}`).toBeLessThanOrEqual(relative * Math.abs(wanted));
  });
}
