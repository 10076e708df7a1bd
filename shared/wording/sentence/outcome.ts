import type { OutcomeWords } from '#shared/analysis';
import { fillPattern, fillWords, joinParts } from '../phrasebook/fill-pattern';
import type { OccurrenceTerms, Phrasebook } from '../phrasebook/phrasebook';
import type { PhrasePart } from '../phrase';
import type { WordingContext } from './wording-context';

/** "risk of hand eczema within 12 months". */
export function occurrenceOf(context: WordingContext): readonly PhrasePart[] {
  const { claim, book } = context;
  const { noun, timeFrame } = claim.outcome;
  const occurrence = occurrenceTerms(context).occurrence.split('{outcome}').join(noun);
  return timeFrame === null
    ? joinParts([occurrence])
    : fillPattern(book, 'outcome.timed', { occurrence, time: timeFrame });
}

/** "developed hand eczema within 12 months". */
export function verbWords({ verbPhrase, timeFrame }: OutcomeWords, book: Phrasebook): string {
  return timeFrame === null
    ? verbPhrase
    : fillWords(book, 'verb.timed', { verb: verbPhrase, time: timeFrame });
}

/** The nouns for the share of people with the outcome: a harm is a risk, a benefit is not. */
export function occurrenceTerms({ claim, book }: WordingContext): OccurrenceTerms {
  return book.terms[claim.design][claim.outcome.desirability];
}
