import type { ValueAddress } from '#shared/analysis';

/** A piece of what a bound value prints, with the addresses of the numbers in it. */
export interface BoundPart {
  readonly text: string;
  readonly addresses: readonly ValueAddress[];
  /** Set where `text` is an abbreviation that is written out at its first use. */
  readonly abbreviation?: string;
}

/**
 * What a bound value prints, in pieces. When its source is gone, `state` is `missing`, the words
 * say what is gone, and no number is shown.
 */
export interface BoundText {
  readonly state: 'bound' | 'missing';
  readonly parts: readonly BoundPart[];
}

/** The whole text of a bound value, as a chip shows it. */
export function textOfBound({ parts }: BoundText): string {
  return parts.map(({ text }) => text).join('');
}
