import { describe, expect, it } from 'vitest';
import { eValue, fractionInExposed, populationFraction } from '#shared/stats';
import reference from './impact.json';
import { valueOf } from './quantities';

type Case = (typeof reference.cases)[number];

/** Numerical derivatives in the R script hold eight digits of a variance. */
const DERIVED = 1e-7;
/** The spread of 40,000 simulated populations: its own error is 0.35 %, and small tables skew. */
const SIMULATED = 0.03;

describe('population fractions against R', () => {
  it.each(casesOf('population'))('$index against $reference at $level', (one) => {
    const table = { index: countOf(one.index!), reference: countOf(one.reference!) };
    const { kind, value, interval } = valueOf(populationFraction(table, one.level!, 'population'));
    expect(kind).toBe(one.reading);
    expectAll([value, interval.lower, interval.upper], one.fraction!, DERIVED);
  });

  it.each(casesOf('population').filter(({ reference: group }) => group![0]! >= 30))(
    "$index against $reference: Walter's variance is the spread of simulated populations",
    ({ deviation, simulatedDeviation }) => {
      expect(Math.abs(simulatedDeviation! / deviation! - 1)).toBeLessThan(SIMULATED);
    },
  );
});

describe('E-values against R', () => {
  it.each(casesOf('eValue'))('$ratio', ({ ratio, eValues }) => {
    const [value = NaN, lower = NaN, upper = NaN] = ratio!;
    const { ofValue, ofLimit } = valueOf(eValue({ value, lower, upper }));
    expectAll([ofValue, ofLimit], eValues!, 1e-9);
  });
});

it('the fraction among the exposed takes the limits of the printed risk ratio', () => {
  // Hammond and Horn (1958): 10.729780 (8.017457 to 14.359688).
  const interval = { lower: 8.017457, upper: 14.359688, level: 0.95, method: 'katz' };
  const fraction = valueOf(fractionInExposed({ value: 10.72978, interval }));
  expect(fraction).toMatchObject({ kind: 'attributable', needsCausalReading: true });
  const { value, interval: limits } = fraction;
  expectAll([value, limits.lower, limits.upper], [0.9068014, 0.8752722, 0.9303606], 1e-6);
});

function casesOf(kind: string): readonly Case[] {
  const found = reference.cases.filter((one) => one.kind === kind);
  expect(found.length).toBeGreaterThan(3);
  return found;
}

function countOf([events = NaN, total = NaN]: readonly number[]) {
  return { events, total };
}

function expectAll(
  values: readonly number[],
  expected: readonly number[],
  tolerance: number,
): void {
  values.forEach((value, place) => {
    const wanted = expected[place]!;
    expect(Math.abs(value - wanted)).toBeLessThanOrEqual(tolerance * (1 + Math.abs(wanted)));
  });
}
