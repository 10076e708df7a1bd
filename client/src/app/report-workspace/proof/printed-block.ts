import { addressKey } from '#shared/analysis';
import type { Caption, LayoutElement } from '#shared/layout';
import { type PrintedNumber, runsOf, valueLedger } from '#shared/report';

/** What a block prints, and its numbers. */
export interface PrintedBlock {
  readonly elements: readonly LayoutElement[];
  /** Numbers with a source, in the order of print. */
  readonly bound: readonly PrintedNumber[];
  /** The figures of each bound number, by the key of its address. */
  readonly figures: ReadonlyMap<string, string>;
  /** Numbers without a source: typed ones, and those that have lost theirs. */
  readonly typed: readonly string[];
  readonly missing: number;
  /** Label and number of its table or figure. */
  readonly caption: Caption | null;
}

/** A block that prints nothing. */
export const NOTHING_PRINTED: PrintedBlock = printedBlock([]);

/** Reads the numbers of a block once, as many ask for them. */
export function printedBlock(elements: readonly LayoutElement[]): PrintedBlock {
  const bound = valueLedger({ title: '', elements, abbreviations: [] });
  const runs = elements.flatMap(runsOf);
  const ofState = (state: string): readonly string[] =>
    runs.filter((run) => run.origin?.state === state).map((run) => run.text);
  return {
    elements,
    bound,
    figures: new Map(bound.map(({ address, text }) => [addressKey(address), bare(text)])),
    typed: ofState('typed'),
    missing: ofState('missing').length,
    caption: elements.map(captionOf).find((caption) => caption !== null) ?? null,
  };
}

/** The caption of an element; null for those that have none. */
export function captionOf(element: LayoutElement): Caption | null {
  switch (element.kind) {
    case 'table':
    case 'figure':
      return element.caption;
    case 'heading':
    case 'paragraph':
    case 'list':
    case 'problem':
      return null;
  }
}

/** Figures without the signs that a table's head says once for all of its cells. */
function bare(text: string): string {
  return text.replace(/^\+|\s*%$/gu, '');
}
