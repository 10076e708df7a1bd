/** A part of a block on the page that a note speaks of: the nth element that a selector finds. */
export interface CheckAnchor {
  readonly selector: string;
  readonly index: number;
}

/** What a person can do about a check with one press. */
export type CheckRemedy =
  | {
      /** Binds the typed number at this place, counted over the block, to a value. */
      readonly kind: 'bind';
      readonly label: string;
      readonly typedIndex: number;
      readonly address: string;
    }
  | { readonly kind: 'edit'; readonly label: string }
  | { readonly kind: 'analysis'; readonly label: string; readonly analysisId: string };

/**
 * Something that a rule found in a block. `problem` stops a release, `caution` is worth a look,
 * `quiet` is only said. `id` lasts as long as the finding does.
 */
export interface ProofCheck {
  readonly id: string;
  readonly blockId: string;
  readonly weight: 'problem' | 'caution' | 'quiet';
  readonly tag: string;
  readonly subject: string;
  readonly text: string;
  /** What a quiet note says once it is opened. */
  readonly detail?: string;
  readonly anchor: CheckAnchor | null;
  readonly remedies: readonly CheckRemedy[];
}
