import type { ValueAddress } from '#shared/analysis';

/** Which way an effect points, in words. */
export type Direction = 'higher' | 'lower' | 'same';

/**
 * One part of a phrase. `text` is ready to print (spaces and punctuation included), the rest says
 * what it stands for. Parts other than `text` are bound: a writer cannot retype them.
 */
export type PhrasePart =
  | { readonly kind: 'text'; readonly text: string; readonly italic?: true }
  | { readonly kind: 'value'; readonly text: string; readonly address: ValueAddress }
  | {
      readonly kind: 'limits';
      readonly text: string;
      readonly lower: ValueAddress;
      readonly upper: ValueAddress;
      /** Which limit is printed first: a fall told in words puts the smaller size first. */
      readonly first: 'lower' | 'upper';
    }
  | { readonly kind: 'group'; readonly text: string; readonly levelId: string }
  | { readonly kind: 'direction'; readonly text: string; readonly direction: Direction };

/** What a claim becomes under a framing and a house style. */
export interface Phrase {
  readonly parts: readonly PhrasePart[];
}

/** What leads the sentence; both groups' risks stay in every framing that the design gives. */
export const FRAMINGS = ['absolute', 'both', 'relative'] as const;

/** One of the framings. */
export type Framing = (typeof FRAMINGS)[number];

/** The printable text of a phrase. */
export function phraseText(phrase: Phrase): string {
  return phrase.parts.map((part) => part.text).join('');
}

/** The addresses of the values that a part prints, in the order of print. */
export function addressesOfPart(part: PhrasePart): readonly ValueAddress[] {
  switch (part.kind) {
    case 'value':
      return [part.address];
    case 'limits':
      return part.first === 'lower' ? [part.lower, part.upper] : [part.upper, part.lower];
    case 'text':
    case 'group':
    case 'direction':
      return [];
  }
}
