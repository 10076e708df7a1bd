import { formatCount } from '#shared/format';
import type { HouseStyle } from '#shared/house-style';
import { ADJUSTMENTS, type AdjustmentId } from '#shared/stats';
import { fillPattern, fillWords } from '../phrasebook/fill-pattern';
import type { Phrasebook } from '../phrasebook/phrasebook';
import type { Phrase } from '../phrase';
import { testMethod } from './method-words';

/** The p-values of a table, as its note speaks of them. */
export interface PrintedPValues {
  /** Ids of the tests, each once. */
  readonly methods: readonly string[];
  /** How many contrasts were tested. */
  readonly contrasts: number;
  readonly adjustment: AdjustmentId | null;
}

/** Which tests the p-values of a table are from, and whether they are adjusted for their number. */
export function pValueNotes(
  { methods, contrasts, adjustment }: PrintedPValues,
  style: HouseStyle,
  book: Phrasebook,
): readonly Phrase[] {
  if (methods.length === 0) {
    return [];
  }
  const tests = methods.map(testMethod).join(fillWords(book, 'list.semicolon', {}));
  const values = fillPattern(book, 'note.pValues', { symbol: style.pValue.symbol, tests });
  const count = formatCount(contrasts, style).text;
  const adjusted =
    adjustment === null
      ? fillPattern(book, 'note.pValuesUnadjusted', { count })
      : fillPattern(book, 'note.pValuesAdjusted', { count, method: ADJUSTMENTS[adjustment].label });
  return contrasts > 1 ? [{ parts: values }, { parts: adjusted }] : [{ parts: values }];
}
