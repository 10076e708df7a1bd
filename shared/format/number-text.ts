/**
 * A printed number. `text` is what stands on the page; the figure in it is `value * scale` with
 * `decimals` decimals, so that a spreadsheet can keep the number and show the same digits.
 */
export interface NumberText {
  readonly text: string;
  /** Full precision; a share is 0..1. */
  readonly value: number;
  readonly scale: number;
  readonly decimals: number;
  readonly signed: boolean;
}

/** How the sign is written: only a minus, plus and minus, or none because words carry it. */
export type SignDisplay = 'minus' | 'plusAndMinus' | 'none';

/** U+2212. */
export const MINUS = '\u2212';

/** U+00A0, between a number and what belongs to it. */
export const NO_BREAK_SPACE = '\u00a0';

/** U+202F, between thousands. */
export const NARROW_NO_BREAK_SPACE = '\u202f';
