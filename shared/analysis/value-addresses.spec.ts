import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { addressKey, parseAddress } from './address-key';
import { listValues } from './list-values';
import { numberOf } from './quantity';
import { readValue } from './read-value';
import { resultOf } from './testing/counts-analysis';
import type { AddressedQuantity, AddressFacet, ResultScope, ValueAddress } from './value-address';

const RESULT = resultOf({
  levels: ['no', 'yes'],
  counts: {
    kitchen: [
      [5, 120],
      [8, 106],
    ],
    ward: [
      [16, 85],
      [22, 98],
    ],
  },
  exposureKind: 'orderedCategory',
});
const CRUDE: ResultScope = { kind: 'crude' };

function at(
  quantity: AddressedQuantity,
  facet: AddressFacet = 'value',
  levelId: string | null = 'yes',
  scope: ResultScope = CRUDE,
): ValueAddress {
  return { analysisId: 'a1', quantity, levelId, scope, facet };
}

describe('readValue', () => {
  it('gives exact fractions where the counts make them', () => {
    expect(readValue(RESULT, at('risk'))).toEqual({
      ok: true,
      value: { kind: 'fraction', numerator: 30, denominator: 204 },
    });
    expect(readValue(RESULT, at('riskDifference'))).toEqual({
      ok: true,
      value: { kind: 'fraction', numerator: 30 * 205 - 21 * 204, denominator: 204 * 205 },
    });
    expect(readValue(RESULT, at('oddsRatio'))).toMatchObject({
      value: { numerator: 30 * 184, denominator: 21 * 174 },
    });
  });

  it('gives the estimate of a method that has its own, not the sample’s fraction', () => {
    const result = resultOf({
      levels: ['no', 'yes'],
      counts: [
        [1, 4],
        [3, 4],
      ],
      specification: {
        methods: { ...RESULT.specification.methods, oddsRatio: 'conditionalExact' },
      },
    });
    const read = readValue(result, at('oddsRatio'));
    expect(read).toMatchObject({ ok: true, value: { kind: 'real' } });
    expect(read.ok && numberOf(read.value)).toBeCloseTo(6.40832, 5);
  });

  it('gives counts, limits, tests and pooled numbers', () => {
    const ward: ResultScope = { kind: 'stratum', stratumId: 'ward' };
    expect(readValue(RESULT, at('events', 'value', 'no', ward))).toEqual({
      ok: true,
      value: { kind: 'count', count: 16 },
    });
    const pooled: ResultScope = { kind: 'pooled' };
    const difference = readValue(RESULT, at('riskDifference', 'value', 'yes', pooled));
    expect(difference).toMatchObject({ ok: true, value: { kind: 'real' } });
    const test = readValue(RESULT, at('homogeneity:oddsRatio', 'pValue', 'yes', pooled));
    expect(test.ok).toBe(true);
    expect(readValue(RESULT, at('trend', 'statistic', null)).ok).toBe(true);
  });

  it('says why there is no number', () => {
    const issueAt = (address: ValueAddress): unknown => {
      const value = readValue(RESULT, address);
      return value.ok ? null : value.issue.code;
    };
    expect(issueAt(at('risk', 'value', 'gone'))).toBe('addressNotInResult');
    expect(issueAt(at('riskRatio', 'value', 'no'))).toBe('addressNotInResult');
    expect(issueAt(at('riskRatio', 'pValue'))).toBe('addressNotInResult');
    expect(issueAt(at('fisher', 'statistic'))).toBe('addressNotInResult');
    expect(issueAt(at('events', 'value', 'yes', { kind: 'stratum', stratumId: 'x' }))).toBe(
      'addressNotInResult',
    );
    expect(issueAt(at('shareOfCases'))).toBe('notGivenByDesign');
  });

  it('gives limits of the shares of all cases and of all controls', () => {
    const sampled = resultOf({
      design: 'caseControl',
      levels: ['no', 'yes'],
      counts: [
        [38, 638],
        [34, 163],
      ],
    });
    const limit = (quantity: AddressedQuantity, facet: 'lower' | 'upper'): number => {
      const value = readValue(sampled, at(quantity, facet, 'yes'));
      return value.ok ? numberOf(value.value) : Number.NaN;
    };
    // R 4: prop.test(34, 72, correct = FALSE) and prop.test(129, 729, correct = FALSE)
    expect(limit('shareOfCases', 'lower')).toBeCloseTo(0.361265103378, 10);
    expect(limit('shareOfCases', 'upper')).toBeCloseTo(0.585993295099, 10);
    expect(limit('shareOfControls', 'lower')).toBeCloseTo(0.150965924954, 10);
    expect(limit('shareOfComparedCases', 'lower')).toBeNaN();
  });

  it('leaves fractions whose products pass 2^53 as real numbers', () => {
    const large = resultOf({
      levels: ['no', 'yes'],
      counts: [
        [90_000_001, 600_000_000],
        [90_000_007, 600_000_003],
      ],
    });
    const ratio = readValue(large, at('riskRatio'));
    expect(ratio).toMatchObject({ ok: true, value: { kind: 'real' } });
  });
});

describe('listValues', () => {
  const values = listValues(RESULT, 'a1');

  it('lists each place once, with the value that its address reads', () => {
    const keys = values.map(({ address }) => addressKey(address));
    expect(new Set(keys).size).toBe(keys.length);
    for (const { address, quantity } of values) {
      expect(readValue(RESULT, address)).toEqual({ ok: true, value: quantity });
      expect(Number.isFinite(numberOf(quantity))).toBe(true);
    }
  });

  it('misses no finite number of the result', () => {
    const listed = new Set(values.map(({ quantity }) => numberOf(quantity)));
    const { crude, strata, pooled } = RESULT;
    const expected = [crude, ...strata].flatMap(({ levels, contrasts, association, trend }) => [
      ...levels.flatMap(({ count, risk }) => [count.events, count.total, ...numbersIn(risk)]),
      ...contrasts.flatMap((one) => numbersIn([one.measures, one.pearson, one.fisher])),
      ...numbersIn([association, trend]),
    ]);
    const together = pooled.flatMap((one) =>
      numbersIn([one.measures, one.homogeneity, one.conditionalIndependence]),
    );
    for (const number of [...expected, ...together]) {
      expect(listed, `${number}`).toContain(number);
    }
  });
});

/** Values, limits, statistics and p values anywhere in a part of a result. */
function numbersIn(part: unknown): readonly number[] {
  const wanted = ['value', 'lower', 'upper', 'statistic', 'pValue'];
  if (typeof part !== 'object' || part === null) {
    return [];
  }
  return Object.entries(part).flatMap(([name, inner]) =>
    typeof inner === 'number' && wanted.includes(name) ? [inner] : numbersIn(inner),
  );
}

describe('addressKey', () => {
  it('is one readable line', () => {
    const address = at('riskDifference', 'upper', 'daily', { kind: 'stratum', stratumId: 'a|b' });
    expect(addressKey(address)).toBe('a1/riskDifference/daily/stratum:a%7Cb/upper');
    expect(addressKey(at('trend', 'pValue', null))).toBe('a1/trend/@all/crude/pValue');
  });

  it('comes back as it was, whatever the ids hold', () => {
    const id = fc.string({ unit: 'grapheme', minLength: 0, maxLength: 12 });
    const scope = fc.oneof(
      fc.constant<ResultScope>({ kind: 'crude' }),
      fc.constant<ResultScope>({ kind: 'pooled' }),
      id.map((stratumId): ResultScope => ({ kind: 'stratum', stratumId })),
    );
    const address: fc.Arbitrary<ValueAddress> = fc.record({
      analysisId: id,
      quantity: fc.constantFrom<AddressedQuantity>('risk', 'leftOut', 'homogeneity:oddsRatio'),
      levelId: fc.oneof(fc.constant(null), fc.constant('@all'), fc.constant(''), id),
      scope,
      facet: fc.constantFrom<AddressFacet>('value', 'lower', 'pValue'),
    });
    fc.assert(
      fc.property(address, (one) => {
        expect(parseAddress(addressKey(one))).toEqual({ ok: true, value: one });
      }),
      { seed: 20250611 },
    );
  });

  it.each([
    '',
    'a',
    'a/risk/l/crude',
    'a/risk/l/crude/value/x',
    'a/odds/l/crude/value',
    'a/risk/l/stratum/value',
    'a/risk/l/crude/top',
    'a/risk/%E0/crude/value',
  ])('refuses %j', (key) => {
    expect(parseAddress(key)).toMatchObject({ ok: false, issue: { code: 'malformedAddress' } });
  });
});
