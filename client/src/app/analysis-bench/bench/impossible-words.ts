import type { AnalysisIssue, AnalysisIssueCode } from '#shared/analysis';
import { issueWords, type Phrasebook } from '#shared/wording';
import { sentenceOf } from '../print/bench-print';
import type { BenchStore } from './bench-store';

/** What to do about an analysis that cannot be computed. */
const WAYS_OUT: Readonly<Record<AnalysisIssueCode, string>> = {
  columnMissing: 'Pick another column; this data set does not have it any more.',
  columnWithoutLevels: 'Give it levels or bands in the code book, or pick another column.',
  columnUsedTwice: 'Pick another column for one of the two.',
  levelMissing: 'Pick another level, or lift the restriction that takes it away.',
  noEventLevel: 'Pick the level that counts as the event.',
  everyLevelIsEvent: 'Leave at least one level that does not count as the event.',
  fewerThanTwoExposureLevels: 'Pick another exposure, or lift the restriction on it.',
  trendScoreMissing: 'Give every level a score, or go back to 1, 2, 3 …',
  unknownMethod: 'Pick another interval method.',
  invalidLevel: 'Give a confidence level between 50 and 100 percent.',
  tallyDoesNotFit: 'Load the page again, so that the code book and the counts agree.',
  invalidCounts: 'Look at the count column of the data.',
};

/** Why an analysis cannot be computed, and what to do. */
export function impossibleWords(
  issue: AnalysisIssue,
  book: Phrasebook,
): { readonly title: string; readonly wayOut: string } {
  return { title: sentenceOf(issueWords(issue, book)), wayOut: WAYS_OUT[issue.code] };
}

/** The first thing that is not picked yet, as a fact and a remedy. */
export function whatToPick(store: BenchStore): { readonly fact: string; readonly remedy: string } {
  const { outcome, exposure } = store.draft();
  if (store.dataSets().length === 0) {
    return { fact: 'No data yet', remedy: 'Load a file or type counts in, then come back.' };
  }
  if (store.outcome() === null) {
    return { fact: 'No outcome picked', remedy: 'Pick in the sentence what is compared.' };
  }
  if (outcome.columnId === null || outcome.eventLevelIds.length === 0) {
    const remedy = 'Pick the column that holds the outcome, and what in it counts as the event.';
    return { fact: 'Not said how the outcome is counted', remedy };
  }
  if (exposure.columnId === null) {
    return {
      fact: 'No exposure picked',
      remedy: 'Pick in the sentence whose levels are compared.',
    };
  }
  return { fact: 'No reference level picked', remedy: 'Pick the level to compare with.' };
}
