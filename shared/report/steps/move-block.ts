import * as z from 'zod/mini';
import { failure, success } from '#shared/core';
import type { Result } from '#shared/core';
import { isOrderKey } from '../order';
import type { Report } from '../report';
import { actionForBlock, findVisibleBlock, withBlock } from './block-access';
import type { MoveBlock, StepIssue } from './step';
import type { AppliedStep, StepDefinition } from './step-definition';
import { idSchema, versionSchema } from './step-schemas';

/** Moving a block. */
export const MOVE_BLOCK: StepDefinition<MoveBlock> = {
  schema: z.object({
    kind: z.literal('moveBlock'),
    blockId: idSchema,
    basePositionVersion: versionSchema,
    orderKey: z.string(),
  }),
  undoBarrier: false,
  contentChangedOf: () => null,
  actionFor: (report, step) => actionForBlock(report, step.blockId),
  apply: moveBlock,
};

function moveBlock(report: Report, step: MoveBlock): Result<AppliedStep, StepIssue> {
  const { blockId, orderKey, basePositionVersion: base } = step;
  if (!isOrderKey(orderKey)) return failure({ code: 'orderKeyNotReadable', facts: { blockId } });
  const found = findVisibleBlock(report, blockId);
  if (!found.ok) return found;
  const present = found.value.positionVersion;
  if (base !== present) return failure({ code: 'staleMove', facts: { blockId, base, present } });
  return success({
    report: withBlock(report, { ...found.value, orderKey, positionVersion: present + 1 }),
    inverse: { ...step, basePositionVersion: present + 1, orderKey: found.value.orderKey },
  });
}
