import type { Direction } from '../phrase';

/** One of the two sizes of an effect, in words; or why the claim has none. */
export type BalanceSide =
  | {
      readonly available: true;
      readonly direction: Direction;
      /** "+16.2" or "4.49×". */
      readonly sizeText: string;
      /** "percentage points", "per 1,000", "the risk". */
      readonly unitText: string;
      /** "95% CI 9.7 to 23.4", signed like the size. */
      readonly intervalText: string;
      /** Number needed, or the percent form of a ratio below twofold; null where none is said. */
      readonly secondText: string | null;
    }
  | { readonly available: false; readonly reason: string };

/** A value with its limits on the gauge. */
export interface GaugeEdge {
  readonly value: number;
  readonly lower: number;
  readonly upper: number;
}

/**
 * What the gauge draws. `risks`: everything in shares of people, 0..1; the absolute edge is the
 * reference risk plus the difference with its limits, the relative edge the reference risk times
 * the ratio with its limits; the ends differ only in a pooled claim, and `gapText` says by how
 * much. `ratio`: a case–control claim has multiples only.
 */
export type BalanceGauge =
  | {
      readonly kind: 'risks';
      readonly referenceRisk: number;
      readonly absolute: GaugeEdge | null;
      readonly relative: GaugeEdge | null;
      readonly gapText: string | null;
    }
  | { readonly kind: 'ratio'; readonly relative: GaugeEdge };

/** Both sizes of a claim beside each other. */
export interface Balance {
  readonly absolute: BalanceSide;
  readonly relative: BalanceSide;
  /** Null where nothing can be drawn. */
  readonly gauge: BalanceGauge | null;
  readonly referenceLabel: string;
  readonly indexLabel: string;
  /** Both sizes in one sentence, for who cannot see the gauge. */
  readonly name: string;
}
