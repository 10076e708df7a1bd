import { failure, success } from '#shared/core';
import type { Result } from '#shared/core';
import { contentChangedBy } from './apply-step';
import { rebaseText } from './rebase-text';
import type { EditText, Step, StepIssue } from './step';

/**
 * Brings a step that was made against an older version of a block up to date.
 *
 * `newer` are the steps that were accepted meanwhile, oldest first (those about other blocks or
 * older versions are ignored). Text steps are mapped over newer text steps as long as they touch
 * different places; an overlap, a replaced content or any other stale edit gives `staleEdit`.
 */
export function rebaseStep(step: Step, newer: readonly Step[]): Result<Step, StepIssue> {
  const blockId = contentChangedBy(step);
  if (blockId === null || !isContentStep(step)) return success(step);
  const meanwhile = newer
    .filter(isContentStep)
    .filter((one) => one.blockId === blockId && one.baseVersion >= step.baseVersion);
  if (meanwhile.length === 0) return success(step);
  const texts = meanwhile.filter(isTextStep);
  const mappable = isTextStep(step) && texts.length === meanwhile.length;
  const rebased = mappable ? rebaseText(step, texts) : null;
  if (rebased !== null) return success(rebased);
  const base = step.baseVersion;
  const facts = { blockId, base, present: base + meanwhile.length };
  return failure({ code: 'staleEdit', facts });
}

type ContentStep = Extract<Step, { baseVersion: number }>;

function isContentStep(step: Step): step is ContentStep {
  return contentChangedBy(step) !== null;
}

function isTextStep(step: ContentStep | Step): step is EditText {
  return step.kind === 'editText';
}
