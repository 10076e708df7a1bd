import type { EstimationIssue } from './estimate';
import type { FourfoldTable } from './fourfold-table';

/**
 * What a method costs. `light`: microseconds, computed wherever its number may be wanted. `heavy`:
 * milliseconds to a second, computed when asked for, and off the main thread in a browser.
 */
export type MethodEffort = 'light' | 'heavy';

/** The largest group that a method accepts, and the method to use beyond it. */
export interface SizeCap {
  readonly groupCap: number;
  /** Id of a method of the same register. */
  readonly instead: string;
}

/**
 * Why a table is too large for a method, or null: `tooLarge` with the facts `cap` (members of the
 * larger group) and `instead` (id of the method to use).
 */
export function issueOfSize(
  { index, reference }: FourfoldTable,
  { groupCap, instead }: SizeCap,
): EstimationIssue | null {
  return Math.max(index.total, reference.total) > groupCap
    ? { code: 'tooLarge', facts: { cap: groupCap, instead } }
    : null;
}
