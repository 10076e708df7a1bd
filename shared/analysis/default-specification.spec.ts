import { describe, expect, it } from 'vitest';
import { RISK_INTERVALS } from '#shared/stats';
import { EFFECT_MEASURE_IDS, hasInterval } from '#shared/effects';
import {
  DEFAULT_INTERVAL_METHODS,
  defaultSpecification,
  reverseContrast,
} from './default-specification';

const PARTS = {
  outcome: { outcomeId: 'o1', columnId: 'outcome', eventLevelIds: ['yes'] },
  exposure: { columnId: 'exposure', referenceLevelId: 'never' },
};

describe('defaultSpecification', () => {
  it('starts with 95% and the first methods, crude without strata', () => {
    expect(defaultSpecification(PARTS)).toMatchObject({
      level: 0.95,
      methods: {
        risk: 'wilson',
        riskDifference: 'newcombe',
        riskRatio: 'katz',
        oddsRatio: 'woolf',
      },
      adjustment: 'crude',
      standing: { planned: 'postHoc' },
    });
  });

  it('pools over strata, and keeps what was stated', () => {
    const stated = { ...PARTS, stratumColumnIds: ['site'], level: 0.9 };
    expect(defaultSpecification(stated)).toMatchObject({
      adjustment: 'mantelHaenszel',
      level: 0.9,
    });
  });

  it('names methods that the registers have', () => {
    expect(Object.keys(RISK_INTERVALS)).toContain(DEFAULT_INTERVAL_METHODS.risk);
    for (const id of EFFECT_MEASURE_IDS) {
      expect(hasInterval(id, DEFAULT_INTERVAL_METHODS[id])).toBe(true);
    }
  });
});

describe('reverseContrast', () => {
  it('changes the reference and nothing else, and turns back', () => {
    const before = defaultSpecification(PARTS);
    const after = reverseContrast(before, 'daily');
    expect(after.exposure).toEqual({ columnId: 'exposure', referenceLevelId: 'daily' });
    expect(reverseContrast(after, 'never')).toEqual(before);
  });
});
