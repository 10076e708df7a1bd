import type { ValueAddress } from '#shared/analysis';

/** Which way an effect points, in words. */
export type Direction = 'higher' | 'lower' | 'same';

/**
 * One part of a phrase. `text` is ready to print (spaces and punctuation included), the rest says
 * what it stands for. Parts other than `text` are bound: a writer cannot retype them.
 */
export type PhrasePart =
  | { readonly kind: 'text'; readonly text: string }
  | { readonly kind: 'value'; readonly text: string; readonly address: ValueAddress }
  | {
      readonly kind: 'limits';
      readonly text: string;
      readonly lower: ValueAddress;
      readonly upper: ValueAddress;
    }
  | { readonly kind: 'group'; readonly text: string; readonly levelId: string }
  | { readonly kind: 'direction'; readonly text: string; readonly direction: Direction };

/** What a claim becomes under a framing and a house style. */
export interface Phrase {
  readonly parts: readonly PhrasePart[];
}

/** What leads the sentence. Both groups' risks stay in every framing where the design gives them. */
export const FRAMINGS = ['absolute', 'both', 'relative'] as const;

/** One of the framings. */
export type Framing = (typeof FRAMINGS)[number];

/** The printable text of a phrase. */
export function phraseText(phrase: Phrase): string {
  return phrase.parts.map((part) => part.text).join('');
}
