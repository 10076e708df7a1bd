import { formatCount, levelPercent } from '#shared/format';
import type { HouseStyle } from '#shared/house-style';
import { fillPattern, startSentence, type SlotFilling } from '../phrasebook/fill-pattern';
import type { Phrasebook } from '../phrasebook/phrasebook';
import type { Phrase } from '../phrase';
import {
  figureStrataWords,
  occurrenceWords,
  printAddress,
  printContext,
  strataWords,
  WHOLE,
  type PrintContext,
  type PrintedAnalysis,
} from './print-context';

/**
 * The title of a table of the analysis: outcome and time, by exposure, within strata, in whom, and
 * how many. No full stop; the number before it is the caption's.
 */
export function tableTitle(analysis: PrintedAnalysis, style: HouseStyle, book: Phrasebook): Phrase {
  const context = printContext(analysis, style, book);
  const fillings = { ...shared(context, strataWords(context)), size: sizePart(context) };
  const parts = isCaseControl(context)
    ? fillPattern(book, 'title.exposed', { ...fillings, outcome: outcomeNoun(context) })
    : fillPattern(book, 'title.table', { ...fillings, subject: occurrenceWords(context) });
  return { parts: startSentence(parts) };
}

/** The title of a figure of the analysis, which names its intervals. */
export function figureTitle(
  analysis: PrintedAnalysis,
  style: HouseStyle,
  book: Phrasebook,
): Phrase {
  const context = printContext(analysis, style, book);
  const level = levelPercent(analysis.result.specification.level, style);
  const fillings = { ...shared(context, figureStrataWords(context)), level };
  const parts = isCaseControl(context)
    ? fillPattern(book, 'title.exposedFigure', { ...fillings, outcome: outcomeNoun(context) })
    : fillPattern(book, 'title.figure', { ...fillings, subject: occurrenceWords(context) });
  return { parts: startSentence(parts) };
}

function isCaseControl({ result }: PrintContext): boolean {
  return result.frame.design === 'caseControl';
}

function outcomeNoun({ result }: PrintContext): string {
  return result.frame.outcome.noun;
}

type Shared = Record<'exposure' | 'strata' | 'population', SlotFilling>;

function shared(context: PrintContext, strata: string | null): Shared {
  const { result, book } = context;
  const population = result.frame.population.trim().replace(/\.$/, '');
  return {
    exposure: result.frame.exposure.sentenceLabel,
    strata: strata === null ? '' : fillPattern(book, 'title.strata', { strata }),
    population: population === '' ? '' : fillPattern(book, 'title.population', { population }),
  };
}

function sizePart(context: PrintContext): SlotFilling {
  const { result, style, book } = context;
  return fillPattern(book, 'title.size', {
    count: {
      kind: 'value',
      text: formatCount(result.counted, style).text,
      address: printAddress(context, 'counted', WHOLE),
    },
  });
}
