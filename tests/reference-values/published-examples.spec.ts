import { describe, expect, it } from 'vitest';
import { numberNeeded } from '#shared/effects';
import published from './published-examples.json';
import { computed } from './quantities';

describe('published worked examples', () => {
  it.each(published.cases)('$quantity of $counts$strata$pairs prints $printed ($source)', (example) => {
    const values = computed(example);
    expect(values).toHaveLength(example.printed.length);
    values.forEach((value, place) => {
      expectPrinted(value, example.printed[place]!);
    });
  });

  it('numbers needed of Altman (1998) and Barrowman (2002)', () => {
    expect(numberNeeded(estimate(0.1, -0.05, 0.25), null)).toEqual({
      value: { change: 'more', count: 10 },
      limits: { kind: 'throughInfinity', fewer: 20, more: 4 },
    });
    // Printed as 6 (3.1 to 111.1); whole numbers go outwards.
    expect(numberNeeded(estimate(0.166, 0.009, 0.322), null)).toEqual({
      value: { change: 'more', count: 7 },
      limits: { kind: 'oneSided', change: 'more', nearest: 3, farthest: 112 },
    });
  });
});

function estimate(value: number, lower: number, upper: number) {
  return { value, interval: { lower, upper, level: 0.95, method: 'published' } };
}

/** A value agrees when it rounds to what was printed: within half a unit of the last digit. */
function expectPrinted(value: number, printed: string): void {
  const [digits = '', exponent = '0'] = printed.split('e');
  const decimals = (digits.split('.')[1] ?? '').length - Number(exponent);
  const half = 0.5 * 10 ** -decimals;
  expect(Math.abs(value - Number(printed)), printed).toBeLessThanOrEqual(half * (1 + 1e-9));
}
