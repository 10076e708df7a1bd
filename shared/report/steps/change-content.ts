import * as z from 'zod/mini';
import { failure, success } from '#shared/core';
import type { Result } from '#shared/core';
import { parseContent } from '../blocks/block-kinds';
import type { Block, Report } from '../report';
import { actionForBlock, findVisibleBlock, withBlock } from './block-access';
import { editBlockText } from './edit-text';
import type { EditText, ReplaceContent, Step, StepIssue } from './step';
import type { AppliedStep, StepDefinition } from './step-definition';
import { idSchema, versionSchema } from './step-schemas';

/** Replacing a block's content. */
export const REPLACE_CONTENT: StepDefinition<ReplaceContent> = {
  schema: z.object({
    kind: z.literal('replaceContent'),
    blockId: idSchema,
    baseVersion: versionSchema,
    content: z.unknown(),
  }),
  undoBarrier: false,
  contentChangedOf: (step) => step.blockId,
  actionFor: (report, step) => actionForBlock(report, step.blockId),
  apply: replaceContent,
};

/** Changing a block's text. */
export const EDIT_TEXT: StepDefinition<EditText> = {
  schema: z.object({
    kind: z.literal('editText'),
    blockId: idSchema,
    baseVersion: versionSchema,
    steps: z.array(z.unknown()).check(z.minLength(1), z.maxLength(2000)),
  }),
  undoBarrier: false,
  contentChangedOf: (step) => step.blockId,
  actionFor: (report, step) => actionForBlock(report, step.blockId),
  apply: editText,
};

function replaceContent(report: Report, step: ReplaceContent): Result<AppliedStep, StepIssue> {
  const block = blockAtVersion(report, step);
  if (!block.ok) return block;
  const content = parseContent(block.value.kind, step.content);
  if (!content.ok) return content;
  return success(
    withContent(report, block.value, content.value, {
      ...step,
      baseVersion: block.value.version + 1,
      content: block.value.content,
    }),
  );
}

function editText(report: Report, step: EditText): Result<AppliedStep, StepIssue> {
  const block = blockAtVersion(report, step);
  if (!block.ok) return block;
  const edited = editBlockText(block.value, step.steps);
  if (!edited.ok) return edited;
  return success(
    withContent(report, block.value, edited.value.content, {
      ...step,
      baseVersion: block.value.version + 1,
      steps: edited.value.inverse,
    }),
  );
}

function blockAtVersion(report: Report, step: ReplaceContent | EditText): Result<Block, StepIssue> {
  const found = findVisibleBlock(report, step.blockId);
  if (!found.ok || found.value.version === step.baseVersion) return found;
  const facts = { blockId: step.blockId, base: step.baseVersion, present: found.value.version };
  return failure({ code: 'staleEdit', facts });
}

function withContent(report: Report, block: Block, content: unknown, inverse: Step): AppliedStep {
  const changed = { ...block, content, version: block.version + 1 };
  return { report: withBlock(report, changed), inverse };
}
