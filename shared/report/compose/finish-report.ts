import type { ComposedReport, LayoutElement } from '#shared/layout';
import type { Phrasebook } from '#shared/wording';
import { abbreviationsInTexts, mergeAbbreviations } from './abbreviations';
import type { Abbreviation } from './abbreviations';
import { runsOf } from './element-runs';
import { createElementFinisher } from './finish-element';
import { numberCaptions } from './numbering';
import { remembered } from './remembered';

/** The report-wide pass over the elements of all blocks. */
export type Finisher = (
  title: string,
  elements: readonly LayoutElement[],
  phrasebook: Phrasebook,
) => ComposedReport;

/**
 * Makes the second pass: tables and figures get their numbers, cross-references their words,
 * abbreviations their long form at first use. Elements that come out as before are the same
 * objects as before.
 */
export function createFinisher(): Finisher {
  const finishElement = createElementFinisher();
  const abbreviationsUnder = remembered(abbreviationFinder);
  return (title, elements, phrasebook) => {
    const numbers = numberCaptions(elements);
    const seen = new Set<string>();
    const abbreviations = elements.map(abbreviationsUnder(phrasebook));
    return {
      title,
      elements: elements.map((element) => finishElement(element, { numbers, seen, phrasebook })),
      abbreviations: mergeAbbreviations(abbreviations),
    };
  };
}

function abbreviationFinder(book: Phrasebook): (element: LayoutElement) => readonly Abbreviation[] {
  return remembered((element: LayoutElement) => {
    const words = runsOf(element).map(({ text }) => text);
    return abbreviationsInTexts([words.join('\n')], book);
  });
}
