import { describe, expect, it } from 'vitest';
import {
  FOURFOLD_TESTS,
  ODDS_RATIO_INTERVALS,
  RISK_DIFFERENCE_INTERVALS,
  RISK_INTERVALS,
  RISK_RATIO_INTERVALS,
} from '#shared/stats';
import exact from './exact.json';
import fourfold from './fourfold.json';
import openData from './open-data.json';
import published from './published-examples.json';

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
