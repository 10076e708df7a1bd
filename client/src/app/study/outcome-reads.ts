import type { OutcomeWords } from '#shared/analysis';

/** How an outcome's words will stand in a sentence, without any numbers. */
export function outcomeReads(outcome: OutcomeWords, peopleNoun: string): string {
  const within = outcome.timeFrame === null ? '' : ` within ${outcome.timeFrame}`;
  return `… of every 100 ${peopleNoun} ${outcome.verbPhrase}${within}.`;
}
