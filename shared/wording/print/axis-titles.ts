import type { HouseStyle } from '#shared/house-style';
import { capitalised, fillWords } from '../phrasebook/fill-pattern';
import type { Phrasebook } from '../phrasebook/phrasebook';
import { occurrenceWords, printContext, type PrintedAnalysis } from './print-context';

/** The title of the value axis of a bar chart: "Risk of hand eczema within 12 months, %". */
export function valueAxisTitle(
  analysis: PrintedAnalysis,
  style: HouseStyle,
  book: Phrasebook,
): string {
  const context = printContext(analysis, style, book);
  const words =
    analysis.result.frame.design === 'caseControl'
      ? fillWords(book, 'axis.exposed', {})
      : occurrenceWords(context);
  return fillWords(book, 'head.percent', { head: capitalised(words) });
}
