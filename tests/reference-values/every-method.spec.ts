import { describe, expect, it } from 'vitest';
import {
  FOURFOLD_TESTS,
  MATCHED_ODDS_RATIO_INTERVALS,
  ODDS_RATIO_HOMOGENEITIES,
  ODDS_RATIO_INTERVALS,
  PAIRED_DIFFERENCE_INTERVALS,
  PAIRED_TESTS,
  POOLED_ODDS_RATIOS,
  POOLED_RISK_DIFFERENCES,
  POOLED_RISK_RATIOS,
  RISK_DIFFERENCE_INTERVALS,
  RISK_INTERVALS,
  RISK_RATIO_INTERVALS,
  TREND_TESTS,
} from '#shared/stats';
import exact from './exact.json';
import fourfold from './fourfold.json';
import openData from './open-data.json';
import published from './published-examples.json';
import stratified from './stratified-methods.json';
import tablesAndPairs from './tables-and-pairs.json';

const cases = [...openData.cases, ...published.cases].map(({ quantity }) => quantity);
const checked = new Set([...cases, ...exact.quantities]);

describe('every interval method has reference values', () => {
  const registers = {
    risk: RISK_INTERVALS,
    riskDifference: RISK_DIFFERENCE_INTERVALS,
    riskRatio: RISK_RATIO_INTERVALS,
    oddsRatio: ODDS_RATIO_INTERVALS,
  };
  const methods = Object.entries(registers).flatMap(([estimand, register]) =>
    Object.keys(register).map((id) => `${estimand}.${id}`),
  );

  it.each(methods)('%s', (method) => {
    expect(checked).toContain(method);
  });
});

describe('every test of a fourfold table has reference values', () => {
  const others = Object.keys(fourfold.cases[0] ?? {});

  it.each(Object.keys(FOURFOLD_TESTS))('%s', (id) => {
    const known = exact.quantities.includes(id) || others.some((name) => id.startsWith(name));
    expect(known).toBe(true);
  });
});

describe('every method over strata, for trends and for pairs has reference values', () => {
  const names = [...stratified.cases, ...tablesAndPairs.cases].flatMap((one) => Object.keys(one));
  const methods = [
    POOLED_RISK_DIFFERENCES,
    POOLED_RISK_RATIOS,
    POOLED_ODDS_RATIOS,
    ODDS_RATIO_HOMOGENEITIES,
    TREND_TESTS,
    PAIRED_TESTS,
    PAIRED_DIFFERENCE_INTERVALS,
    MATCHED_ODDS_RATIO_INTERVALS,
  ].flatMap((register) => Object.keys(register));
  const elsewhere: Readonly<Record<string, string>> = {
    robinsBreslowGreenland: 'pooledOddsRatio.limits',
    exactConditional: 'exact',
    exactMidP: 'midP',
    standardisedToAll: 'shares',
    standardisedToIndex: 'shares',
    standardisedToReference: 'shares',
    standardisedToChosen: 'shares',
  };

  it.each(methods)('%s', (id) => {
    expect([...names, ...checked]).toContain(elsewhere[id] ?? id);
  });
});
