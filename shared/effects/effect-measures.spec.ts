import { describe, expect, it } from 'vitest';
import type { FourfoldTable } from '#shared/stats';
import { EFFECT_MEASURES, hasInterval } from './effect-measures';
import { EFFECT_MEASURE_IDS } from './measure-ids';
import { STUDY_DESIGNS, designGivesRisk } from './study-design';

const TABLE: FourfoldTable = {
  index: { events: 56, total: 70 },
  reference: { events: 48, total: 80 },
};

describe.each(EFFECT_MEASURE_IDS.map((id) => EFFECT_MEASURES[id]))('$label', (measure) => {
  const estimate = measure.estimate(TABLE, measure.defaultIntervalId, 0.95);

  it('stands under its id and has its default interval', () => {
    expect(EFFECT_MEASURES[measure.id]).toBe(measure);
    expect(hasInterval(measure.id, measure.defaultIntervalId)).toBe(true);
    expect(hasInterval(measure.id, 'toString')).toBe(false);
  });

  it('says its value as a fraction of whole numbers', () => {
    const fraction = measure.fraction(TABLE);
    const value = estimate.ok ? estimate.value.value : NaN;
    expect(fraction && fraction.numerator / fraction.denominator).toBe(value);
  });

  it('turns its estimate as swapping the groups does', () => {
    const swapped = { index: TABLE.reference, reference: TABLE.index };
    const direct = measure.estimate(swapped, measure.defaultIntervalId, 0.95);
    const turned = estimate.ok ? measure.reverse(estimate.value) : estimate;
    if (!direct.ok || !turned.ok) {
      throw new Error('Both ways are defined');
    }
    expect(turned.value.value).toBeCloseTo(direct.value.value, 12);
    expect(turned.value.interval.lower).toBeCloseTo(direct.value.interval.lower, 12);
    expect(turned.value.interval.upper).toBeCloseTo(direct.value.interval.upper, 12);
  });

  it('takes no unknown interval method', () => {
    expect(() => measure.estimate(TABLE, 'guess', 0.95)).toThrow('guess');
  });

  it('has the null value between opposite effects', () => {
    const none = { index: { events: 3, total: 10 }, reference: { events: 6, total: 20 } };
    const result = measure.estimate(none, measure.defaultIntervalId, 0.95);
    expect(result.ok && result.value.value).toBe(measure.nullValue);
  });
});

describe('an interval method with its own estimate', () => {
  const tea: FourfoldTable = {
    index: { events: 3, total: 4 },
    reference: { events: 1, total: 4 },
  };

  it('gives the value, which is no fraction of the counts', () => {
    const { oddsRatio } = EFFECT_MEASURES;
    const estimate = oddsRatio.estimate(tea, 'conditionalExact', 0.95);
    expect(estimate.ok && estimate.value.value).toBeCloseTo(6.40832, 5);
    expect(oddsRatio.fraction(tea, 'conditionalExact')).toBeNull();
    expect(oddsRatio.fraction(tea, 'woolf')).toEqual({ numerator: 9, denominator: 1 });
  });

  it('keeps what is known from below of an infinite ratio', () => {
    const apart = { ...tea, reference: { events: 0, total: 4 } };
    for (const [measure, method] of [
      ['riskRatio', 'koopman'],
      ['riskRatio', 'chanZhang'],
      ['oddsRatio', 'conditionalExact'],
      ['oddsRatio', 'cornfield'],
    ] as const) {
      const estimate = EFFECT_MEASURES[measure].estimate(apart, method, 0.95);
      expect(estimate).toMatchObject({ ok: false, issue: { code: 'zeroCell' } });
      expect(Number(!estimate.ok && estimate.issue.facts?.atLeast)).toBeGreaterThan(0);
    }
  });
});

describe('designs', () => {
  it('give every measure, but odds only where the outcome was sampled', () => {
    for (const design of STUDY_DESIGNS) {
      const given = EFFECT_MEASURE_IDS.filter((id) => EFFECT_MEASURES[id].givenBy(design));
      expect(given).toEqual(designGivesRisk(design) ? [...EFFECT_MEASURE_IDS] : ['oddsRatio']);
    }
    expect(STUDY_DESIGNS.filter((design) => !designGivesRisk(design))).toEqual(['caseControl']);
  });
});

describe('reverse', () => {
  it('of a ratio that touches 0 is not defined', () => {
    const interval = { lower: 0, upper: 2, level: 0.95, method: 'koopman' };
    const turned = EFFECT_MEASURES.riskRatio.reverse({ value: 0, interval });
    expect(turned).toMatchObject({ issue: { code: 'zeroCell' } });
  });

  it('of no difference is no negative zero', () => {
    const interval = { lower: 0, upper: 0.1, level: 0.95, method: 'wald' };
    const turned = EFFECT_MEASURES.riskDifference.reverse({ value: 0, interval });
    expect(turned.ok && Object.is(turned.value.value, 0)).toBe(true);
    expect(turned.ok && Object.is(turned.value.interval.upper, 0)).toBe(true);
  });
});
