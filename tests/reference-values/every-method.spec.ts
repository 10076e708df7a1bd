import { describe, expect, it } from 'vitest';
import {
  ODDS_RATIO_INTERVALS,
  RISK_DIFFERENCE_INTERVALS,
  RISK_INTERVALS,
  RISK_RATIO_INTERVALS,
} from '#shared/stats';
import openData from './open-data.json';
import published from './published-examples.json';

const checked = new Set([...openData.cases, ...published.cases].map(({ quantity }) => quantity));

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
