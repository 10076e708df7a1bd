import { failure, success } from '#shared/core';
import type { Result } from '#shared/core';
import type { StudyAction } from '#shared/permissions';
import type { Report } from '../report';
import { EDIT_TEXT, REPLACE_CONTENT } from './change-content';
import { INSERT_BLOCK, REMOVE_BLOCK, RESTORE_BLOCK } from './insert-and-remove';
import { MOVE_BLOCK } from './move-block';
import { MOVE_PIN, SET_FRAMING, SET_HOUSE_STYLE, SET_TITLE } from './report-settings';
import type { Step, StepIssue, StepKind } from './step';
import type { AppliedStep, StepDefinition, StepMoment } from './step-definition';

/** Every kind of step. */
const STEP_KINDS: { readonly [Kind in StepKind]: StepDefinition<Extract<Step, { kind: Kind }>> } = {
  insertBlock: INSERT_BLOCK,
  removeBlock: REMOVE_BLOCK,
  restoreBlock: RESTORE_BLOCK,
  moveBlock: MOVE_BLOCK,
  replaceContent: REPLACE_CONTENT,
  editText: EDIT_TEXT,
  setFraming: SET_FRAMING,
  setTitle: SET_TITLE,
  setHouseStyle: SET_HOUSE_STYLE,
  movePin: MOVE_PIN,
};

/**
 * Applies a step to a report: gives the report after it, its `seq` one higher, and the step that
 * takes it back. Contents are stored as their kind reads them, so unknown parts are dropped.
 *
 * Stale steps give `staleEdit` or `staleMove`; `rebaseStep` may bring a text step up to date.
 */
export function applyStep(
  report: Report,
  step: Step,
  moment: StepMoment,
): Result<AppliedStep, StepIssue> {
  const applied = definitionOf(step).apply(report, step, moment);
  if (!applied.ok) return applied;
  const after = { ...applied.value.report, seq: report.seq + 1 };
  return success({ report: after, inverse: applied.value.inverse });
}

/** Reads unknown JSON as a step; gives `unknownStep` or `stepNotReadable` with the field. */
export function parseStep(value: unknown): Result<Step, StepIssue> {
  const kind = (value as { kind?: unknown } | null)?.kind;
  if (typeof kind !== 'string' || !Object.hasOwn(STEP_KINDS, kind)) {
    return failure({ code: 'unknownStep', facts: { kind: String(kind).slice(0, 60) } });
  }
  const parsed = STEP_KINDS[kind as StepKind].schema.safeParse(value);
  if (parsed.success) return success(parsed.data);
  const field = parsed.error.issues[0]?.path.join('.') ?? '';
  return failure({ code: 'stepNotReadable', facts: { kind, field } });
}

/** What a person must be allowed to do to make this step on this report. */
export function actionForStep(report: Report, step: Step): StudyAction {
  return definitionOf(step).actionFor(report, step);
}

/** Whether steps before this one can no longer be undone once it is made. */
export function isUndoBarrier(step: Step): boolean {
  return definitionOf(step).undoBarrier;
}

/** The block whose content version the step raises; null for steps that leave contents alone. */
export function contentChangedBy(step: Step): string | null {
  return definitionOf(step).contentChangedOf(step);
}

function definitionOf(step: Step): StepDefinition {
  return STEP_KINDS[step.kind];
}
