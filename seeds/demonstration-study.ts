import type { AnalysisSpecification, OutcomeWords } from '#shared/analysis';
import type { NewStudyRequest } from '#shared/api';
import type { CodeBook } from '#shared/code-book';
import type { OutsideEstimateEntry } from '#shared/outside-estimates';
import type { Framing } from '#shared/wording';

/** A block of a demonstration report, before it has an id and a place. */
export interface DemonstrationBlock {
  readonly id: string;
  readonly kind: string;
  readonly content: unknown;
}

/** What the blocks of a report need to know: ids of the analyses, by their short keys. */
export interface BlockPlan {
  readonly analysisIds: Readonly<Record<string, string>>;
  readonly nextId: () => string;
}

/** A demonstration report. */
export interface DemonstrationReport {
  readonly title: string;
  readonly houseStyleId: string;
  readonly framing: Framing;
  readonly blocks: (plan: BlockPlan) => readonly DemonstrationBlock[];
}

/** An analysis of a demonstration study; `key` names it among the report's blocks. */
export interface DemonstrationAnalysis {
  readonly key: string;
  readonly name: string;
  readonly specification: (outcomeId: string) => AnalysisSpecification;
  /** Adjusted estimates beside it, computed elsewhere from the same invented records. */
  readonly outside?: readonly OutsideEstimateEntry[];
}

/**
 * A demonstration study: invented, and said to be. `describe` edits the code book that intake
 * proposes for the first file; later cuts carry it over. Analyses use the last cut.
 */
export interface DemonstrationStudy {
  readonly study: NewStudyRequest;
  readonly outcome: Omit<OutcomeWords, 'id'>;
  /** Milestones by title, with the days from the day of seeding. */
  readonly milestones: readonly { readonly title: string; readonly inDays: number }[];
  readonly dataSetName: string;
  readonly cuts: readonly { readonly file: string; readonly dataDate: string }[];
  readonly describe: (proposed: CodeBook) => CodeBook;
  readonly analyses: readonly DemonstrationAnalysis[];
  readonly reports: readonly DemonstrationReport[];
}
