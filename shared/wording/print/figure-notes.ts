import { levelPercent } from '#shared/format';
import type { HouseStyle } from '#shared/house-style';
import { fillPattern } from '../phrasebook/fill-pattern';
import type { Phrasebook } from '../phrasebook/phrasebook';
import type { Phrase } from '../phrase';
import { shareMethod } from './method-words';
import { missingNotes } from './missing-notes';
import { printContext, type PrintedAnalysis } from './print-context';
import { referenceGroup, standingNotes } from './table-notes';

/** The notes of a bar chart of the analysis: reference, whiskers, missing records, standing. */
export function figureNotes(
  analysis: PrintedAnalysis,
  style: HouseStyle,
  book: Phrasebook,
): readonly Phrase[] {
  const context = printContext(analysis, style, book);
  const { result } = analysis;
  const level = levelPercent(result.specification.level, style);
  const method = shareMethod(result);
  const whiskers: Phrase = { parts: fillPattern(book, 'note.whiskers', { level, method }) };
  const shares: readonly Phrase[] =
    result.frame.design === 'caseControl'
      ? [{ parts: fillPattern(book, 'note.sharesOfCases', {}) }]
      : [];
  const reference: Phrase = {
    parts: fillPattern(book, 'note.figureReference', { reference: referenceGroup(context) }),
  };
  return [...shares, reference, whiskers, ...missingNotes(context), ...standingNotes(context)];
}
