import type { Guard } from './guard';

/**
 * A level has no records at all; as the reference it takes every contrast away.
 * Facts: role ("index" or "reference").
 */
export const emptyGroup = {
  id: 'emptyGroup',
  severity: 'caution',
  source: 'A share of nothing is not defined.',
  find: ({ crude, frame }) =>
    crude.levels
      .filter(({ count }) => count.total === 0)
      .map(({ levelId }) => ({
        place: { scope: { kind: 'crude' }, levelId },
        facts: { role: levelId === frame.exposure.referenceLevelId ? 'reference' : 'index' },
      })),
} as const satisfies Guard<'emptyGroup'>;
