import { failure, success } from '#shared/core';
import type { Result } from '#shared/core';
import type { Report } from '../report';
import { contentChangedBy, isUndoBarrier } from './apply-step';
import { findBlock } from './block-access';
import { rebaseStep } from './rebase-step';
import type { Step, StepIssue } from './step';

/** A step as the report keeps it: what was done, what takes it back, and what it took back. */
export interface RecordedStep {
  readonly id: string;
  readonly undoes: string | null;
  readonly step: Step;
  readonly inverse: Step;
}

/**
 * The step that takes a recorded step back now.
 *
 * `newer` are the steps recorded after it, oldest first. Undo is a new step against the present
 * report: text is mapped over newer text, steps that were undone themselves don't count. Gives
 * `undoBarrier` when a pin was moved since, `staleEdit` when the same place was changed since.
 */
export function undoStep(
  report: Report,
  undone: RecordedStep,
  newer: readonly RecordedStep[],
): Result<Step, StepIssue> {
  if (newer.some(({ step }) => isUndoBarrier(step)) || isUndoBarrier(undone.step)) {
    return failure({ code: 'undoBarrier' });
  }
  const blockId = contentChangedBy(undone.inverse);
  const onBlock = newer.filter(
    ({ step }) => blockId !== null && contentChangedBy(step) === blockId,
  );
  const rebased = rebaseStep(undone.inverse, renumbered(undone.inverse, withoutUndone(onBlock)));
  return rebased.ok ? success(againstPresent(rebased.value, report)) : rebased;
}

/** Leaves out each step that the very next one took back; together they changed nothing. */
function withoutUndone(steps: readonly RecordedStep[]): readonly RecordedStep[] {
  return steps.reduce<readonly RecordedStep[]>(
    (kept, step) =>
      step.undoes !== null && kept.at(-1)?.id === step.undoes ? kept.slice(0, -1) : [...kept, step],
    [],
  );
}

/** Versions count the steps that were left out too; for rebasing they follow one another. */
function renumbered(inverse: Step, newer: readonly RecordedStep[]): readonly Step[] {
  const base = 'baseVersion' in inverse ? inverse.baseVersion : 0;
  return newer.map(({ step }, index) =>
    'baseVersion' in step ? { ...step, baseVersion: base + index } : step,
  );
}

function againstPresent(step: Step, report: Report): Step {
  const found = 'blockId' in step ? findBlock(report, step.blockId) : null;
  if (found?.ok !== true) return step;
  const { version, positionVersion } = found.value;
  if ('baseVersion' in step) return { ...step, baseVersion: version };
  return 'basePositionVersion' in step ? { ...step, basePositionVersion: positionVersion } : step;
}
