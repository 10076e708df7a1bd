import type { AnalysisResult } from '../analysis-result';
import type { ResultScope } from '../value-address';

/** How hard a guard speaks: a note informs, a caution warns, a refusal says what cannot be done. */
export type GuardSeverity = 'note' | 'caution' | 'refusal';

/** A fact that the words of a finding need: a number at full precision, an id, or a list of ids. */
export type GuardFact = string | number | readonly string[];

/** Facts by name; each guard's file says which it gives. Shares are 0..1. */
export type GuardFacts = Readonly<Record<string, GuardFact>>;

/** Where a finding belongs; `levelId` is null when it is about all levels. */
export interface GuardPlace {
  readonly scope: ResultScope;
  readonly levelId: string | null;
}

/** What a guard found at one place. */
export interface GuardPoint {
  readonly place: GuardPlace;
  readonly facts: GuardFacts;
}

/** What is known about the data beyond the result. */
export interface GuardContext {
  /** An identifier column in which some values come more than once; null when there is none. */
  readonly repeatedIdentifiers: {
    readonly columnId: string;
    readonly columnLabel: string;
    /** How many identifiers come more than once, and how many records they have together. */
    readonly identifiers: number;
    readonly records: number;
  } | null;
}

/**
 * A rule that looks at a result before a reader does. It gives codes and facts; the words are the
 * wording's, one per guard id.
 */
export interface Guard<Id extends string = string> {
  readonly id: Id;
  readonly severity: GuardSeverity;
  readonly source: string;
  find(result: AnalysisResult, context: GuardContext): readonly GuardPoint[];
}
