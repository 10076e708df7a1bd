import * as z from 'zod/mini';
import { failure, success } from '#shared/core';
import type { Result } from '#shared/core';
import { parseContent } from '../blocks/block-kinds';
import { isOrderKey } from '../order';
import type { Report } from '../report';
import {
  actionForBlock,
  actionForKind,
  findBlock,
  findVisibleBlock,
  withBlock,
} from './block-access';
import type { InsertBlock, RemoveBlock, RestoreBlock, StepIssue } from './step';
import type { AppliedStep, StepDefinition } from './step-definition';
import { idSchema } from './step-schemas';

/** Inserting a block. */
export const INSERT_BLOCK: StepDefinition<InsertBlock> = {
  schema: z.object({
    kind: z.literal('insertBlock'),
    block: z.object({
      id: idSchema,
      kind: z.string(),
      orderKey: z.string(),
      content: z.unknown(),
    }),
  }),
  undoBarrier: false,
  contentChangedOf: () => null,
  actionFor: (_report, step) => actionForKind(step.block.kind),
  apply: insertBlock,
};

/** Removing a block. */
export const REMOVE_BLOCK: StepDefinition<RemoveBlock> = {
  schema: z.object({ kind: z.literal('removeBlock'), blockId: idSchema }),
  undoBarrier: false,
  contentChangedOf: () => null,
  actionFor: (report, step) => actionForBlock(report, step.blockId),
  apply: (report, step, moment) => removeBlock(report, step, moment.at),
};

/** Restoring a removed block. */
export const RESTORE_BLOCK: StepDefinition<RestoreBlock> = {
  schema: z.object({ kind: z.literal('restoreBlock'), blockId: idSchema }),
  undoBarrier: false,
  contentChangedOf: () => null,
  actionFor: (report, step) => actionForBlock(report, step.blockId),
  apply: restoreBlock,
};

function insertBlock(report: Report, step: InsertBlock): Result<AppliedStep, StepIssue> {
  const { id, kind, orderKey } = step.block;
  if (findBlock(report, id).ok) return failure({ code: 'blockExists', facts: { blockId: id } });
  if (!isOrderKey(orderKey))
    return failure({ code: 'orderKeyNotReadable', facts: { blockId: id } });
  const content = parseContent(kind, step.block.content);
  if (!content.ok) return content;
  const block = { id, kind, orderKey, content: content.value };
  const inserted = { ...block, version: 1, positionVersion: 1, removedAt: null };
  return success({
    report: { ...report, blocks: [...report.blocks, inserted] },
    inverse: { kind: 'removeBlock', blockId: id },
  });
}

function removeBlock(
  report: Report,
  step: RemoveBlock,
  at: string,
): Result<AppliedStep, StepIssue> {
  const found = findVisibleBlock(report, step.blockId);
  if (!found.ok) return found;
  return success({
    report: withBlock(report, { ...found.value, removedAt: at }),
    inverse: { kind: 'restoreBlock', blockId: step.blockId },
  });
}

function restoreBlock(report: Report, step: RestoreBlock): Result<AppliedStep, StepIssue> {
  const found = findBlock(report, step.blockId);
  if (!found.ok) return found;
  if (found.value.removedAt === null) {
    return failure({ code: 'blockNotRemoved', facts: { blockId: step.blockId } });
  }
  return success({
    report: withBlock(report, { ...found.value, removedAt: null }),
    inverse: { kind: 'removeBlock', blockId: step.blockId },
  });
}
