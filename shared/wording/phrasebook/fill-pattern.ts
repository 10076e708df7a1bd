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
    piecesOf(book, key).map(({ slot, words }) => (slot === null ? words : (named[slot] ?? ''))),
  );
}

/** The words of a pattern whose slots are filled by words. */
export function fillWords<Key extends PatternKey>(
  book: Phrasebook,
  key: Key,
  fillings: Readonly<Record<SlotOf<Key>, string>>,
): string {
  const named: Readonly<Record<string, string>> = fillings;
  return piecesOf(book, key)
    .map(({ slot, words }) => (slot === null ? words : (named[slot] ?? '')))
    .join('');
}

/** One run of parts out of several fillings; neighbouring words become one part. */
export function joinParts(fillings: readonly SlotFilling[]): readonly PhrasePart[] {
  const joined: PhrasePart[] = [];
  for (const filling of fillings) {
    for (const part of partsOf(filling)) addPart(joined, part);
  }
  return joined;
}

function addPart(joined: PhrasePart[], part: PhrasePart): void {
  if (part.text === '') return;
  const last = joined.at(-1);
  if (last?.kind === 'text' && part.kind === 'text' && last.italic === part.italic) {
    joined[joined.length - 1] = { ...last, text: last.text + part.text };
  } else {
    joined.push(part);
  }
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

/** A pattern cut at its slots: words, or the name of the slot that stands there. */
interface Piece {
  readonly slot: string | null;
  readonly words: string;
}

const KNOWN_PIECES = new WeakMap<Phrasebook, Map<PatternKey, readonly Piece[]>>();

function piecesOf(book: Phrasebook, key: PatternKey): readonly Piece[] {
  const known = KNOWN_PIECES.get(book)?.get(key);
  return known ?? cutPattern(book, key);
}

function cutPattern(book: Phrasebook, key: PatternKey): readonly Piece[] {
  const pieces = book.patterns[key].split(/(\{\w+\})/).map(pieceOf);
  const known = KNOWN_PIECES.get(book) ?? new Map<PatternKey, readonly Piece[]>();
  KNOWN_PIECES.set(book, known.set(key, pieces));
  return pieces;
}

function pieceOf(words: string): Piece {
  return { slot: /^\{\w+\}$/.test(words) ? words.slice(1, -1) : null, words };
}

function partsOf(filling: SlotFilling): readonly PhrasePart[] {
  if (typeof filling === 'string') {
    return [{ kind: 'text', text: filling }];
  }
  return 'kind' in filling ? [filling] : filling;
}
