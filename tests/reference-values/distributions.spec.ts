import { describe, expect, it } from 'vitest';
import * as stats from '#shared/stats';
import reference from './distributions.json';

const TOLERANCE = 1e-9;

const FUNCTIONS: Readonly<Record<string, (...parts: readonly number[]) => number>> = {
  normalQuantile: (p = NaN) => stats.normalQuantile(p),
  normalCumulative: (z = NaN) => stats.normalCumulative(z),
  normalUpperTail: (z = NaN) => stats.normalUpperTail(z),
  chiSquareUpperTail: (x = NaN, df = NaN) => stats.chiSquareUpperTail(x, df),
  betaQuantile: (p = NaN, a = NaN, b = NaN) => stats.betaQuantile(p, a, b),
  betaCumulative: (x = NaN, a = NaN, b = NaN) => stats.betaCumulative(x, a, b),
  hypergeometricProbability: (count = NaN, marked = NaN, unmarked = NaN, drawn = NaN) =>
    stats.hypergeometricProbability(count, { marked, unmarked, drawn }),
  logGamma: (x = NaN) => stats.logGamma(x),
};

describe('distribution functions against R, far tails included', () => {
  it.each(reference.cases)('$function($arguments) is $expected', (one) => {
    const value = FUNCTIONS[one.function]!(...one.arguments);
    const deviation = Math.abs(value - one.expected);
    expect(deviation).toBeLessThanOrEqual(TOLERANCE * Math.abs(one.expected));
  });

  it('reaches probabilities near 1e-300', () => {
    const smallest = Math.min(...reference.cases.map(({ expected }) => Math.abs(expected || 1)));
    expect(smallest).toBeLessThan(1e-290);
  });
});
