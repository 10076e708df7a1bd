import fc from 'fast-check';
import type { FourfoldTable, GroupCount, StratifiedTable } from '#shared/stats';

/** The seed of every property in this folder, so that a failure comes again. */
export const SEEDED = { seed: 20250611, numRuns: 300 } as const;

/** A group of up to so many members. */
export function groups(largest: number): fc.Arbitrary<GroupCount> {
  return fc
    .integer({ min: 1, max: largest })
    .chain((total) =>
      fc.record({ events: fc.integer({ min: 0, max: total }), total: fc.constant(total) }),
    );
}

/** A large group in which hardly anybody has the event. */
const rare: fc.Arbitrary<GroupCount> = fc.record({
  events: fc.integer({ min: 0, max: 9 }),
  total: fc.integer({ min: 10_000, max: 5_000_000 }),
});

/** Small and large groups, rare and common events alike. */
export const group: fc.Arbitrary<GroupCount> = fc.oneof(
  groups(12),
  groups(200),
  groups(5_000_000),
  rare,
  rare.map(complement),
);

/** Tables with zero cells as often as they come. */
export const fourfold: fc.Arbitrary<FourfoldTable> = fc.record({ index: group, reference: group });

/** Tables of at most 12 and 12, zero cells as often as they come. */
export const smallFourfold: fc.Arbitrary<FourfoldTable> = fc.record({
  index: groups(12),
  reference: groups(12),
});

const filledGroup = fc
  .integer({ min: 2, max: 3000 })
  .chain((total) =>
    fc.record({ events: fc.integer({ min: 1, max: total - 1 }), total: fc.constant(total) }),
  );

/** Tables without a zero cell. */
export const filledFourfold: fc.Arbitrary<FourfoldTable> = fc.record({
  index: filledGroup,
  reference: filledGroup,
});

/** Two to eight strata without zero cells. */
export const filledStrata: fc.Arbitrary<StratifiedTable> = fc
  .array(filledFourfold, { minLength: 2, maxLength: 8 })
  .map((tables) => tables.map((table, place) => ({ id: `s${place}`, table })));

/** Levels that people use; far below, adjusted intervals need not hold the estimate. */
export const level: fc.Arbitrary<number> = fc.constantFrom(0.9, 0.95, 0.99, 0.999);

/** Index and reference exchanged. */
export function swapGroups({ index, reference }: FourfoldTable): FourfoldTable {
  return { index: reference, reference: index };
}

/** Events and others exchanged. */
export function swapOutcome({ index, reference }: FourfoldTable): FourfoldTable {
  return { index: complement(index), reference: complement(reference) };
}

/** A group with events and others exchanged. */
export function complement({ events, total }: GroupCount): GroupCount {
  return { events: total - events, total };
}
