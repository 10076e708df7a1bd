import type { ComposedReport, LayoutElement } from '#shared/layout';
import type { Phrasebook } from '#shared/wording';
import { abbreviationsOf, textsOfElement } from './abbreviations';
import { createElementFinisher } from './finish-element';
import { remembered } from './remembered';
import { numberCaptions } from './numbering';

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
  const textsOf = remembered(textsOfElement);
  return (title, elements, phrasebook) => {
    const numbers = numberCaptions(elements);
    const seen = new Set<string>();
    return {
      title,
      elements: elements.map((element) => finishElement(element, { numbers, seen, phrasebook })),
      abbreviations: abbreviationsOf(elements, textsOf, phrasebook),
    };
  };
}
