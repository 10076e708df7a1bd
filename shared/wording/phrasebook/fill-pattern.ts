import type { PhrasePart } from '../phrase';
import type { PatternKey, Phrasebook, SlotOf } from './phrasebook';

/** What fills a slot: words, or parts that stay bound. */
export type SlotFilling = string | PhrasePart | readonly PhrasePart[];

/** A filling for every slot of a pattern. */
export type Fillings<Key extends PatternKey> = Readonly<Record<SlotOf<Key>, SlotFilling>>;

/** The parts of a pattern with its slots filled; neighbouring words become one part. */
export function fillPattern<Key extends PatternKey>(
  book: Phrasebook,
  key: Key,
  fillings: Fillings<Key>,
): readonly PhrasePart[] {
  const named: Readonly<Record<string, SlotFilling>> = fillings;
  return joinParts(
    book.patterns[key]
      .split(/(\{\w+\})/)
      .map((piece) => (SLOT.test(piece) ? (named[piece.slice(1, -1)] ?? '') : piece)),
  );
}

/** The words of a pattern whose slots are filled by words. */
export function fillWords<Key extends PatternKey>(
  book: Phrasebook,
  key: Key,
  fillings: Readonly<Record<SlotOf<Key>, string>>,
): string {
  return fillPattern(book, key, fillings)
    .map(({ text }) => text)
    .join('');
}

/** One run of parts out of several fillings; neighbouring words become one part. */
export function joinParts(fillings: readonly SlotFilling[]): readonly PhrasePart[] {
  return fillings.flatMap(partsOf).reduce<PhrasePart[]>((joined, part) => {
    const last = joined.at(-1);
    const merges = last?.kind === 'text' && part.kind === 'text' && last.italic === part.italic;
    if (part.text === '') {
      return joined;
    }
    return merges
      ? [...joined.slice(0, -1), { ...last, text: last.text + part.text }]
      : [...joined, part];
  }, []);
}

/** A sentence begins with a capital letter, whatever word came first. */
export function startSentence(parts: readonly PhrasePart[]): readonly PhrasePart[] {
  const [first, ...rest] = parts;
  return first ? [{ ...first, text: capitalised(first.text) }, ...rest] : [];
}

/** Words with a capital first letter. */
export function capitalised(words: string): string {
  return words.charAt(0).toUpperCase() + words.slice(1);
}

const SLOT = /^\{\w+\}$/;

function partsOf(filling: SlotFilling): readonly PhrasePart[] {
  if (typeof filling === 'string') {
    return [{ kind: 'text', text: filling }];
  }
  return 'kind' in filling ? [filling] : filling;
}
