import type { BoundValueFormat } from '#shared/report/text';

/** What an atom of a text prints, and how it is read aloud. */
export interface AtomText {
  readonly text: string;
  readonly spoken: string;
  readonly state: 'bound' | 'missing';
}

/** Words for the atoms of a text, under the results and the house style of the moment. */
export interface AtomWords {
  readonly valueOf: (addressKey: string, format: BoundValueFormat) => AtomText;
  readonly referenceOf: (blockId: string) => AtomText;
}
