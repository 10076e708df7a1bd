import type { LayoutElement, Run } from '#shared/layout';
import type { Phrasebook } from '#shared/wording';
import { firstUseText } from './abbreviations';
import { mapRuns, runsOf } from './element-runs';
import { captionOf } from './numbering';
import type { CaptionNumbers } from './numbering';
import { remembered } from './remembered';

/** What the report-wide pass knows when it reaches an element. */
export interface FinishContext {
  readonly numbers: CaptionNumbers;
  /** Abbreviations that were written out already; this pass adds to it. */
  readonly seen: Set<string>;
  readonly phrasebook: Phrasebook;
}

/** Finishes one element; remembers how each came out last. */
export type ElementFinisher = (element: LayoutElement, context: FinishContext) => LayoutElement;

/** A finisher that gives the same object again for as long as an element comes out the same. */
export function createElementFinisher(): ElementFinisher {
  const needsOf = remembered(findNeeds);
  const finished = new WeakMap<LayoutElement, { signature: string; result: LayoutElement }>();
  return (element, context) => {
    const needs = needsOf(element);
    if (!needs.any) return element;
    const firstUses = takeFirstUses(needs, context.seen);
    const signature = signatureOf(element, needs, firstUses, context.numbers);
    const known = finished.get(element);
    if (known?.signature === signature) return known.result;
    const result = finish(element, needs, new Set(firstUses), context);
    finished.set(element, { signature, result });
    return result;
  };
}

interface Needs {
  readonly any: boolean;
  readonly references: readonly string[];
  /** Abbreviations of running text, in order; tables and figures explain theirs in their notes. */
  readonly abbreviations: readonly string[];
}

function findNeeds(element: LayoutElement): Needs {
  const runs = runsOf(element);
  const captioned = captionOf(element) !== null;
  const references = runs.flatMap(({ reference }) => reference ?? []);
  const abbreviations = captioned ? [] : runs.flatMap(({ abbreviation }) => abbreviation ?? []);
  const any = captioned || references.length > 0 || abbreviations.length > 0;
  return { any, references, abbreviations };
}

function takeFirstUses(needs: Needs, seen: Set<string>): readonly string[] {
  const first = [...new Set(needs.abbreviations)].filter((short) => !seen.has(short));
  for (const short of first) seen.add(short);
  return first;
}

function signatureOf(
  element: LayoutElement,
  needs: Needs,
  firstUses: readonly string[],
  numbers: CaptionNumbers,
): string {
  const own = numbers.get(element.blockId)?.number ?? 0;
  const references = needs.references.map((blockId) => referenceText(blockId, numbers));
  return JSON.stringify([own, references, firstUses]);
}

function finish(
  element: LayoutElement,
  needs: Needs,
  firstUses: Set<string>,
  { numbers, phrasebook }: FinishContext,
): LayoutElement {
  const ownNumberOnly = firstUses.size === 0 && needs.references.length === 0;
  if (ownNumberOnly) return withNumber(element, numbers);
  let depth = 0;
  const withWords = mapRuns(element, (run) => {
    const text = finishedText(run, { depth, firstUses, numbers, phrasebook });
    depth += bracketsOpened(run.text);
    return text === null ? missingReference(run) : text === run.text ? run : { ...run, text };
  });
  return withNumber(withWords, numbers);
}

interface RunFinish {
  readonly depth: number;
  readonly firstUses: Set<string>;
  readonly numbers: CaptionNumbers;
  readonly phrasebook: Phrasebook;
}

/** Null where a reference leads to nothing that is printed. */
function finishedText(
  run: Run,
  { depth, firstUses, numbers, phrasebook }: RunFinish,
): string | null {
  if (run.reference !== undefined) return referenceText(run.reference, numbers);
  if (run.abbreviation === undefined || !firstUses.delete(run.abbreviation)) return run.text;
  return firstUseText(run.abbreviation, depth > 0 ? 'inBrackets' : 'inText', phrasebook);
}

function referenceText(blockId: string, numbers: CaptionNumbers): string | null {
  const found = numbers.get(blockId);
  return found === undefined ? null : `${found.label}\u00a0${String(found.number)}`;
}

function missingReference(run: Run): Run {
  const origin = run.origin ?? { blockId: '', addresses: [] };
  return { ...run, text: '[table or figure removed]', origin: { ...origin, state: 'missing' } };
}

function bracketsOpened(text: string): number {
  return text.split('(').length - text.split(')').length;
}

function withNumber(element: LayoutElement, numbers: CaptionNumbers): LayoutElement {
  const number = numbers.get(element.blockId)?.number;
  if (number === undefined) return element;
  switch (element.kind) {
    case 'table':
    case 'figure':
      return { ...element, caption: { ...element.caption, number } };
    case 'heading':
    case 'paragraph':
    case 'list':
    case 'problem':
      return element;
  }
}
