import type { EffectMeasureId, StudyDesign } from '#shared/effects';
import { BALANCE_SLOTS } from './balance-slots';
import { GUARD_SLOTS } from './guard-slots';
import { OUTSIDE_SLOTS } from './outside-slots';
import { PRINT_SLOTS } from './print-slots';
import { REASON_SLOTS } from './reason-slots';
import { SENTENCE_SLOTS } from './sentence-slots';

/** Every pattern that a phrasebook holds, with the slots that it may name. */
export const PATTERN_SLOTS = {
  ...SENTENCE_SLOTS,
  ...REASON_SLOTS,
  ...BALANCE_SLOTS,
  ...PRINT_SLOTS,
  ...GUARD_SLOTS,
  ...OUTSIDE_SLOTS,
} as const;

/** Key of a pattern. */
export type PatternKey = keyof typeof PATTERN_SLOTS;

/** Names of the slots of a pattern. */
export type SlotOf<Key extends PatternKey> = (typeof PATTERN_SLOTS)[Key][number];

/** How a measure is called under a design. */
export interface MeasureTerms {
  readonly name: string;
  readonly short: string;
  /** Head of its column. */
  readonly head: string;
}

/** How the share of people with the outcome is called; `occurrence` has the slot {outcome}. */
export interface OccurrenceTerms {
  readonly noun: string;
  readonly head: string;
  readonly occurrence: string;
}

/** The nouns that a design allows. */
export interface DesignTerms {
  readonly harmful: OccurrenceTerms;
  readonly beneficial: OccurrenceTerms;
  readonly measures: Readonly<Record<EffectMeasureId, MeasureTerms>>;
}

/** The words of one language. Data, read from `templates/phrasebooks` by `parsePhrasebook`. */
export interface Phrasebook {
  readonly schemaVersion: 1;
  readonly language: string;
  readonly terms: Readonly<Record<StudyDesign, DesignTerms>>;
  readonly patterns: Readonly<Record<PatternKey, string>>;
  /** Abbreviations that generated words may use, by their short form. */
  readonly abbreviations: Readonly<Record<string, string>>;
}
