import { describe, expect, it } from 'vitest';
import { fractionInExposedAt } from './read-impact';
import { readValue } from './read-value';
import { resultOf } from './testing/counts-analysis';
import type { CountsAnalysis } from './testing/counts-analysis';
import type { AddressedQuantity, AddressFacet, ResultScope } from './value-address';

/** Deaths under two treatments, by age: the University Group Diabetes Program, in two strata. */
const TWO_STRATA: CountsAnalysis = {
  levels: ['no', 'yes'],
  counts: {
    young: [
      [5, 120],
      [8, 106],
    ],
    old: [
      [16, 85],
      [22, 98],
    ],
  },
};

const pooled: ResultScope = { kind: 'pooled' };

function read(
  analysis: CountsAnalysis,
  quantity: AddressedQuantity,
  facet: AddressFacet = 'value',
  scope: ResultScope = pooled,
): number {
  const address = { analysisId: 'a', quantity, levelId: 'yes', scope, facet };
  const value = readValue(resultOf(analysis), address);
  return value.ok && value.value.kind === 'real' ? value.value.value : NaN;
}

describe('between two strata', () => {
  it('sets the second against the first, on each scale', () => {
    const [young, old] = [8 / 106 - 5 / 120, 22 / 98 - 16 / 85];
    expect(read(TWO_STRATA, 'interaction:riskDifference')).toBeCloseTo(old - young, 12);
    const ratio = 22 / 98 / (16 / 85) / (8 / 106 / (5 / 120));
    expect(read(TWO_STRATA, 'interaction:riskRatio')).toBeCloseTo(ratio, 12);
    expect(read(TWO_STRATA, 'interaction:riskRatio', 'lower')).toBeLessThan(ratio);
    expect(read(TWO_STRATA, 'interaction:oddsRatio', 'pValue')).toBeGreaterThan(0);
  });

  it('gives the relative excess risk of two factors of two levels', () => {
    const base = 5 / 120;
    const expected = 22 / 98 / base - 16 / 85 / base - 8 / 106 / base + 1;
    expect(read(TWO_STRATA, 'excessRisk')).toBeCloseTo(expected, 12);
  });

  it('is not there with more strata', () => {
    const { young, old } = TWO_STRATA.counts as Record<
      string,
      readonly (readonly [number, number])[]
    >;
    const more = { ...TWO_STRATA, counts: { young: young!, middle: old!, old: old! } };
    expect(read(more, 'interaction:riskRatio')).toBeNaN();
    expect(read(more, 'excessRisk')).toBeNaN();
  });
});

describe('impact', () => {
  const crude: ResultScope = { kind: 'crude' };

  it('comes from the risk ratio, crude or pooled, and is marked as needing a causal reading', () => {
    const ratio = 30 / 204 / (21 / 205);
    expect(read(TWO_STRATA, 'fractionInExposed', 'value', crude)).toBeCloseTo(1 - 1 / ratio, 12);
    expect(read(TWO_STRATA, 'fractionInExposed')).not.toBeNaN();
    const result = resultOf(TWO_STRATA);
    const fraction = fractionInExposedAt(result, { scope: crude, levelId: 'yes' });
    expect(fraction).toMatchObject({ value: { needsCausalReading: true } });
    expect(fractionInExposedAt(result, { scope: crude, levelId: 'no' })).toBeUndefined();
  });

  it('gives the population fraction of counts as they are, never of pooled numbers', () => {
    const all = 51 / 409;
    const expected = (all - 21 / 205) / all;
    expect(read(TWO_STRATA, 'populationFraction', 'value', crude)).toBeCloseTo(expected, 12);
    expect(read(TWO_STRATA, 'populationFraction')).toBeNaN();
  });

  it('gives E-values of the ratio and of its limit nearer to 1', () => {
    const ratio = 30 / 204 / (21 / 205);
    const expected = ratio + Math.sqrt(ratio * (ratio - 1));
    expect(read(TWO_STRATA, 'eValue', 'value', crude)).toBeCloseTo(expected, 12);
    expect(read(TWO_STRATA, 'eValue', 'lower', crude)).toBe(1);
    expect(read(TWO_STRATA, 'eValue', 'upper', crude)).toBeNaN();
  });

  it('is not given by cases and controls', () => {
    const sampled = { ...TWO_STRATA, design: 'caseControl' as const };
    expect(read(sampled, 'fractionInExposed', 'value', crude)).toBeNaN();
    expect(read(sampled, 'populationFraction', 'value', crude)).toBeNaN();
  });
});

describe('standardised to a population', () => {
  const by = (riskDifference: string, standardShares?: Record<string, number>): CountsAnalysis => ({
    ...TWO_STRATA,
    specification: {
      otherMethods: { poolings: { riskDifference }, ...(standardShares && { standardShares }) },
    },
  });
  const weighed = (young: number, old: number): number =>
    (young * (8 / 106 - 5 / 120) + old * (22 / 98 - 16 / 85)) / (young + old);

  it.each([
    ['standardisedToAll', weighed(226, 183)],
    ['standardisedToIndex', weighed(106, 98)],
    ['standardisedToReference', weighed(120, 85)],
  ])('%s', (id, expected) => {
    expect(read(by(id), 'riskDifference')).toBeCloseTo(expected, 12);
  });

  it('takes chosen shares, and refuses without them or with others', () => {
    const chosen = by('standardisedToChosen', { young: 3, old: 1 });
    expect(read(chosen, 'riskDifference')).toBeCloseTo(weighed(3, 1), 12);
    for (const shares of [undefined, { young: 3 }]) {
      const { pooled: contrasts } = resultOf(by('standardisedToChosen', shares));
      expect(contrasts[0]?.measures.riskDifference).toMatchObject({
        issue: { code: 'invalidWeights' },
      });
    }
  });

  it('names the stratum in which a group is empty', () => {
    const counts = {
      young: [
        [5, 120],
        [8, 106],
      ],
      old: [
        [16, 85],
        [0, 0],
      ],
    } as const;
    const { pooled: contrasts } = resultOf({ ...by('standardisedToAll'), counts });
    expect(contrasts[0]?.measures.riskDifference).toMatchObject({
      issue: { code: 'emptyGroupInStratum', facts: { stratum: 'old' } },
    });
  });
});
