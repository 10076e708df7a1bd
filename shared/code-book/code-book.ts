/** What a column means; decides what it may be used for. */
export const COLUMN_KINDS = [
  'category',
  'orderedCategory',
  'number',
  'date',
  'personTime',
  'count',
  'identifier',
  'pairIdentifier',
  'clusterIdentifier',
  'ignored',
] as const;

/** One of the column kinds. */
export type ColumnKind = (typeof COLUMN_KINDS)[number];

/**
 * A level of a category. `codes` are the values in the file that it stands for (several when levels
 * were merged). The id lasts: labels, order and merges may change, addresses stay.
 */
export interface CodeBookLevel {
  readonly id: string;
  readonly codes: readonly string[];
  readonly label: string;
  readonly sentenceLabel: string;
}

/** A half-open band `[lower, upper)` of a numeric column; null is unbounded. */
export interface CodeBookBand {
  readonly id: string;
  readonly lower: number | null;
  readonly upper: number | null;
  readonly label: string;
  readonly sentenceLabel: string;
}

/** A code in the file that stands for no answer, with its meaning. The blank is the code ''. */
export interface MissingCode {
  readonly code: string;
  readonly reason: string;
}

/**
 * One column. `groupPattern` says how the people at a level are named in a sentence: "{people}"
 * stands for the study's people, "{level}" for the level's sentence label, as in
 * "{people} with {level}", "{people} who {level}", "{level} {people}" or "{level}" alone;
 * `withinPattern` how a stratum is, as in "in {level}" or "among {level}". Null leaves both to the
 * phrasebook, which names column and level. `levels` are in print order. A numeric column becomes
 * usable as a factor through `bands`. `referenceLevelId` names a level or a band.
 */
export interface CodeBookColumn {
  readonly id: string;
  readonly name: string;
  readonly kind: ColumnKind;
  readonly label: string;
  readonly sentenceLabel: string;
  readonly unit: string | null;
  readonly levels: readonly CodeBookLevel[];
  readonly bands: readonly CodeBookBand[];
  readonly missingCodes: readonly MissingCode[];
  readonly referenceLevelId: string | null;
  readonly groupPattern?: string | null;
  readonly withinPattern?: string | null;
}

/** How a row counts: as one record, by a count column, or by two (a synthetic outcome column). */
export type CountLayout =
  | { readonly kind: 'records' }
  | { readonly kind: 'count'; readonly columnId: string }
  | {
      readonly kind: 'eventsAndTotal';
      readonly eventsColumnId: string;
      readonly totalColumnId: string;
    }
  | {
      readonly kind: 'casesAndControls';
      readonly casesColumnId: string;
      readonly controlsColumnId: string;
    };

/** Column id of the outcome that two count columns stand for. */
export const COUNTED_OUTCOME_COLUMN_ID = 'counted-outcome';

/**
 * The meaning of a data set's columns. With two count columns, `columns` also holds the synthetic
 * outcome column (id COUNTED_OUTCOME_COLUMN_ID, level ids 'event' and 'non-event').
 */
export interface CodeBook {
  readonly schemaVersion: 1;
  readonly layout: CountLayout;
  readonly columns: readonly CodeBookColumn[];
}

/** One column's part in the name of a stratum; `pattern` is the column's `withinPattern`. */
export interface StratumWords {
  readonly columnLabel: string;
  readonly levelLabel: string;
  readonly pattern: string | null;
}

/** A level or band as a factor uses it, in print order. A stratum also has `within`. */
export interface FactorLevel {
  readonly id: string;
  readonly label: string;
  readonly sentenceLabel: string;
  readonly within?: readonly StratumWords[];
}
