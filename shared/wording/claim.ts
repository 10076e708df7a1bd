import type { AddressedQuantity, OutcomeWords, Quantity, ResultScope } from '#shared/analysis';
import type { Issue, Result } from '#shared/core';
import type { FactorLevel } from '#shared/code-book';
import type { EffectMeasureId, StudyDesign } from '#shared/effects';
import type { PrecisionBasis } from '#shared/format';
import type { Estimate, EstimationIssue, GroupCount, TestOutcome } from '#shared/stats';

/** One of the compared groups as a claim speaks of it. */
export interface ClaimGroup {
  readonly level: FactorLevel;
  /** Of a pooled claim: over all strata, unadjusted. */
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
  /** How the people at a level are named; null leaves it to the phrasebook. */
  readonly groupPattern: string | null;
  /** Levels of the exposure; with more than two a case–control claim counts two groups only. */
  readonly levelCount: number;
  readonly scope: ResultScope;
  /** Words of the stratum that the claim is restricted to; null for crude and pooled claims. */
  readonly stratum: FactorLevel | null;
  /** What the strata are made by, inside a sentence: "workplace", "sex and class". */
  readonly strataLabel: string | null;
  readonly index: ClaimGroup;
  readonly reference: ClaimGroup;
  readonly measures: Readonly<Record<EffectMeasureId, Result<Estimate, EstimationIssue>>>;
  /** The estimates as fractions of counts; null where they are none. */
  readonly exact: Readonly<Record<EffectMeasureId, Quantity | null>>;
  /** Confidence level of the analysis, 0..1. */
  readonly level: number;
  readonly test: Result<TestOutcome, EstimationIssue>;
  readonly testQuantity: Extract<
    AddressedQuantity,
    'test' | 'pearson' | 'fisher' | 'conditionalIndependence'
  >;
  readonly planned: 'prespecified' | 'postHoc';
  /** What decides the decimals, so that sentence, table and figure print the same digits. */
  readonly precision: PrecisionBasis;
}

/** Why a result has no such claim. */
export type ClaimIssue = Issue<'levelNotInResult' | 'levelIsReference' | 'scopeNotInResult'>;
