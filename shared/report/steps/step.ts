import type { Issue } from '#shared/core';
import type { Framing } from '#shared/wording';
import type { ContentIssueCode } from '../content-issue';

/** Puts a new block into the report. */
export interface InsertBlock {
  readonly kind: 'insertBlock';
  readonly block: {
    readonly id: string;
    readonly kind: string;
    readonly orderKey: string;
    readonly content: unknown;
  };
}

/** Takes a block out; it stays as a tombstone and can be restored. */
export interface RemoveBlock {
  readonly kind: 'removeBlock';
  readonly blockId: string;
}

/** Brings a removed block back to its place. */
export interface RestoreBlock {
  readonly kind: 'restoreBlock';
  readonly blockId: string;
}

/** Gives a block another place; made against one `positionVersion` of it. */
export interface MoveBlock {
  readonly kind: 'moveBlock';
  readonly blockId: string;
  readonly basePositionVersion: number;
  readonly orderKey: string;
}

/** Gives a block another content; made against one `version` of it. */
export interface ReplaceContent {
  readonly kind: 'replaceContent';
  readonly blockId: string;
  readonly baseVersion: number;
  readonly content: unknown;
}

/** Changes a block's editable text by ProseMirror steps, made against one `version` of it. */
export interface EditText {
  readonly kind: 'editText';
  readonly blockId: string;
  readonly baseVersion: number;
  readonly steps: readonly unknown[];
}

/** Sets what leads in every effect of the report that doesn't say otherwise itself. */
export interface SetFraming {
  readonly kind: 'setFraming';
  readonly framing: Framing;
}

/** Renames the report. */
export interface SetTitle {
  readonly kind: 'setTitle';
  readonly title: string;
}

/** Prints the report in another house style. */
export interface SetHouseStyle {
  readonly kind: 'setHouseStyle';
  readonly houseStyleId: string;
}

/** Shows an analysis with another result; null takes the pin away. */
export interface MovePin {
  readonly kind: 'movePin';
  readonly analysisId: string;
  readonly resultId: string | null;
}

/** One change of a report, as plain data. */
export type Step =
  | InsertBlock
  | RemoveBlock
  | RestoreBlock
  | MoveBlock
  | ReplaceContent
  | EditText
  | SetFraming
  | SetTitle
  | SetHouseStyle
  | MovePin;

/** The kinds of step. */
export type StepKind = Step['kind'];

/** Why a step cannot be made. */
export type StepIssueCode =
  | ContentIssueCode
  | 'unknownStep'
  | 'stepNotReadable'
  | 'blockUnknown'
  | 'blockExists'
  | 'blockRemoved'
  | 'blockNotRemoved'
  | 'orderKeyNotReadable'
  | 'textNotEditable'
  | 'textStepFailed'
  | 'staleEdit'
  | 'staleMove'
  | 'undoBarrier';

/**
 * A refused step. Issues about a block carry `facts.blockId`; stale ones also `base` and
 * `present`, the two versions.
 */
export type StepIssue = Issue<StepIssueCode>;
