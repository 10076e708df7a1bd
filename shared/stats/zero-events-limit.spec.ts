import { describe, expect, it } from 'vitest';
import { RISK_INTERVALS } from './intervals';
import { allEventsLowerLimit, zeroEventsUpperLimit } from './zero-events-limit';

describe('zeroEventsUpperLimit', () => {
  it('is near three over the total', () => {
    const limit = zeroEventsUpperLimit(1000, 0.95);
    expect(limit.ok && limit.value * 1000).toBeCloseTo(2.99, 2);
  });

  it('is the upper limit of a two-sided exact interval at a level with twice the rest', () => {
    const limit = zeroEventsUpperLimit(30, 0.95);
    const twoSided = RISK_INTERVALS.clopperPearson.interval({ events: 0, total: 30 }, 0.9);
    expect(limit.ok && twoSided.ok && limit.value / twoSided.value.upper).toBeCloseTo(1, 12);
  });

  it('mirrors for everybody, and keeps its digits for millions', () => {
    const none = zeroEventsUpperLimit(10_000_000, 0.95);
    const all = allEventsLowerLimit(10_000_000, 0.95);
    expect(none.ok && all.ok && none.value + all.value).toBeCloseTo(1, 15);
    expect(none.ok && none.value * 1e7).toBeCloseTo(-Math.log(0.05), 6);
  });

  it('refuses nobody, half a person and an impossible level', () => {
    expect(zeroEventsUpperLimit(0, 0.95)).toMatchObject({ issue: { code: 'emptyGroup' } });
    expect(allEventsLowerLimit(2.5, 0.95)).toMatchObject({ issue: { code: 'invalidCounts' } });
    expect(zeroEventsUpperLimit(9, 95)).toMatchObject({ issue: { code: 'invalidLevel' } });
  });
});
