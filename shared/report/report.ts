import type { AnalysisResult } from '#shared/analysis';
import type { OutsideEstimate } from '#shared/outside-estimates';
import type { Framing } from '#shared/wording';

/** Where a report stands on its way. */
export const REPORT_STAGES = [
  'drafting',
  'inReview',
  'signedOff',
  'submitted',
  'superseded',
] as const;

/** One of the stages. */
export type ReportStage = (typeof REPORT_STAGES)[number];

/**
 * A block as stored. `content` belongs to its kind and is parsed by it. `version` counts content
 * changes, `positionVersion` moves; a removed block stays as a tombstone.
 */
export interface Block {
  readonly id: string;
  readonly kind: string;
  readonly orderKey: string;
  readonly content: unknown;
  readonly version: number;
  readonly positionVersion: number;
  readonly removedAt: string | null;
}

/**
 * An analysis as a report uses it: its name, its cut, and the immutable result that is pinned.
 */
export interface PinnedAnalysis {
  readonly analysisId: string;
  /** "A2": lasting number of the analysis within its study. */
  readonly number: string;
  readonly name: string;
  readonly resultId: string;
  readonly cut: { readonly id: string; readonly number: number; readonly dataDate: string };
  readonly result: AnalysisResult;
  /** Adjusted estimates that models outside computed, beside the analysis as they are now. */
  readonly outside?: readonly OutsideEstimate[];
}

/**
 * A report with its blocks, removed ones included, in no particular order (`visibleBlocks` sorts).
 * `seq` is the number of the last step; `pins` holds the result id that each analysis is shown
 * with, by analysis id.
 */
export interface Report {
  readonly id: string;
  readonly studyId: string;
  readonly title: string;
  readonly framing: Framing;
  readonly houseStyleId: string;
  readonly stage: ReportStage;
  readonly seq: number;
  readonly blocks: readonly Block[];
  readonly pins: Readonly<Record<string, string>>;
}
