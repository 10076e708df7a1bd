import { expect, it } from 'vitest';
import { emptyDraft } from '../draft/analysis-draft';
import { CODE_BOOK, OUTCOME, phrasebook, SPECIFICATION } from '../testing/wet-work';
import { contrastParts, isPicked } from './contrast-parts';

const book = phrasebook();
const words = (parts: readonly { readonly text: string }[]) =>
  parts.map(({ text }) => text).join('');

it('reads a full contrast as a sentence', () => {
  const source = { draft: SPECIFICATION, codeBook: CODE_BOOK, outcome: OUTCOME };
  const parts = contrastParts(source, book);
  expect(words(parts)).toBe(
    'Hand eczema within 12 months by work, each level against none, within place',
  );
});

it('invites to pick what is not picked', () => {
  const source = { draft: emptyDraft(), codeBook: null, outcome: null };
  expect(words(contrastParts(source, book))).toBe(
    'Pick an outcome by pick an exposure, each level against pick a level, without strata',
  );
  expect(isPicked(source, 'exposure')).toBe(false);
});
