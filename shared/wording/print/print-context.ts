import type { AddressedQuantity, AddressFacet, AnalysisResult } from '#shared/analysis';
import type { ResultScope, ValueAddress } from '#shared/analysis';
import { decimalsOf, type PrintedDecimals } from '#shared/format';
import type { HouseStyle } from '#shared/house-style';
import { fillWords } from '../phrasebook/fill-pattern';
import type { DesignTerms, OccurrenceTerms, Phrasebook } from '../phrasebook/phrasebook';
import type { PhrasePart } from '../phrase';

/** A result and the analysis that its numbers' addresses name. */
export interface PrintedAnalysis {
  readonly analysisId: string;
  readonly result: AnalysisResult;
}

/** What the words around a table or figure are made of. */
export interface PrintContext extends PrintedAnalysis {
  readonly style: HouseStyle;
  readonly book: Phrasebook;
  readonly decimals: PrintedDecimals;
}

/** The context of one analysis. */
export function printContext(
  { analysisId, result }: PrintedAnalysis,
  style: HouseStyle,
  book: Phrasebook,
): PrintContext {
  return { analysisId, result, style, book, decimals: decimalsOf(result, style) };
}

/** The address of a number of the analysis. */
export function printAddress(
  { analysisId }: PrintContext,
  quantity: AddressedQuantity,
  place: { readonly levelId: string | null; readonly scope: ResultScope },
  facet: AddressFacet = 'value',
): ValueAddress {
  return { analysisId, quantity, ...place, facet };
}

/** The place of numbers about all records. */
export const WHOLE = { levelId: null, scope: { kind: 'crude' } } as const;

/** The nouns of the analysis' design. */
export function termsOf({ result, book }: PrintContext): DesignTerms & OccurrenceTerms {
  const terms = book.terms[result.frame.design];
  return { ...terms, ...terms[result.frame.outcome.desirability] };
}

/** "risk of hand eczema within 12 months". */
export function occurrenceWords(context: PrintContext): string {
  const { noun, timeFrame } = context.result.frame.outcome;
  const occurrence = termsOf(context).occurrence.split('{outcome}').join(noun);
  return timeFrame === null
    ? occurrence
    : fillWords(context.book, 'outcome.timed', { occurrence, time: timeFrame });
}

/** The stratifying columns inside a sentence: "workplace", "sex and class"; null without strata. */
export function strataWords({ result }: Pick<PrintContext, 'result'>): string | null {
  const columns = result.frame.strata[0]?.within?.map(({ columnLabel }) => columnLabel);
  return columns ? columns.join(' and ') : (result.frame.strataLabel?.toLowerCase() ?? null);
}

/**
 * The strata of a figure: as `strataWords`, but none in a case–control study, whose bars are shares
 * of all cases and of all controls.
 */
export function figureStrataWords({ result }: Pick<PrintContext, 'result'>): string | null {
  return result.frame.design === 'caseControl' ? null : strataWords({ result });
}

/** Words as the one part of a phrase. */
export function textPart(text: string): PhrasePart {
  return { kind: 'text', text };
}
