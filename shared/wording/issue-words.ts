import type { AnalysisIssueCode, ValueIssue } from '#shared/analysis';
import type { Issue } from '#shared/core';
import type { EstimationIssueCode } from '#shared/stats';
import type { ClaimIssue } from './claim';
import { fillWords } from './phrasebook/fill-pattern';
import { PATTERN_SLOTS, type PatternKey, type Phrasebook } from './phrasebook/phrasebook';

/** Every issue that has words here. */
export type WordedIssueCode =
  EstimationIssueCode | AnalysisIssueCode | ValueIssue['code'] | ClaimIssue['code'];

/**
 * Why something is not estimable or not there, in words that follow "because": "one of the counts
 * is zero". No capital, no full stop.
 */
export function issueWords(issue: Issue<WordedIssueCode>, book: Phrasebook): string {
  const key: PatternKey & `issue.${WordedIssueCode}` = `issue.${issue.code}`;
  const facts = issue.facts ?? {};
  const slots: readonly string[] = PATTERN_SLOTS[key];
  const fillings = Object.fromEntries(slots.map((slot) => [slot, String(facts[slot] ?? '')]));
  return fillWords(book, key, fillings as Record<'role' | 'stratum', string>);
}
