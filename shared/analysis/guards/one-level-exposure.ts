import type { Guard } from './guard';
import { WHOLE } from './places';

/**
 * Fewer than two exposure levels have records: there is nothing to compare.
 * Facts: levels (with records), levelIds (those).
 */
export const oneLevelExposure = {
  id: 'oneLevelExposure',
  severity: 'refusal',
  source: 'A contrast needs two groups.',
  find({ crude }) {
    const filled = crude.levels.filter(({ count }) => count.total > 0);
    const facts = { levels: filled.length, levelIds: filled.map(({ levelId }) => levelId) };
    return filled.length < 2 ? [{ place: WHOLE, facts }] : [];
  },
} as const satisfies Guard<'oneLevelExposure'>;
