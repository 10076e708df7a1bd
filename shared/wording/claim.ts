import type { OutcomeWords, ResultScope } from '#shared/analysis';
import type { Result } from '#shared/core';
import type { FactorLevel } from '#shared/code-book';
import type { EffectMeasureId, StudyDesign } from '#shared/effects';
import type { Estimate, EstimationIssue, GroupCount, TestOutcome } from '#shared/stats';

/** One of the compared groups as a claim speaks of it. */
export interface ClaimGroup {
  readonly level: FactorLevel;
  readonly count: GroupCount;
  readonly risk: Result<Estimate, EstimationIssue>;
}

/**
 * The meaning of one effect: who against whom, in whom, of what, how large, how sure. Words are
 * made of it by `phraseOfClaim`; the same claim always reads the same.
 */
export interface Claim {
  readonly analysisId: string;
  readonly design: StudyDesign;
  readonly peopleNoun: string;
  readonly outcome: OutcomeWords;
  readonly exposureSentenceLabel: string;
  readonly scope: ResultScope;
  /** Words of the stratum that the claim is restricted to; null for crude and pooled claims. */
  readonly stratum: FactorLevel | null;
  readonly strataLabel: string | null;
  readonly index: ClaimGroup;
  readonly reference: ClaimGroup;
  readonly measures: Readonly<Record<EffectMeasureId, Result<Estimate, EstimationIssue>>>;
  readonly test: Result<TestOutcome, EstimationIssue>;
  readonly planned: 'prespecified' | 'postHoc';
}
