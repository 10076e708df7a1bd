import { failure, success } from '#shared/core';
import type { Result } from '#shared/core';
import type { StudyAction } from '#shared/permissions';
import { blockKindOf } from '../blocks/block-kinds';
import type { Block, Report } from '../report';
import type { StepIssue } from './step';

/** The block with this id, removed or not. */
export function findBlock(report: Report, blockId: string): Result<Block, StepIssue> {
  const block = report.blocks.find((one) => one.id === blockId);
  return block === undefined
    ? failure({ code: 'blockUnknown', facts: { blockId } })
    : success(block);
}

/** The block with this id, as long as it has not been removed. */
export function findVisibleBlock(report: Report, blockId: string): Result<Block, StepIssue> {
  const found = findBlock(report, blockId);
  if (!found.ok || found.value.removedAt === null) return found;
  return failure({ code: 'blockRemoved', facts: { blockId } });
}

/** The report with one block replaced by its successor. */
export function withBlock(report: Report, block: Block): Report {
  const blocks = report.blocks.map((one) => (one.id === block.id ? block : one));
  return { ...report, blocks };
}

/** What a person must be allowed to do to change a block of this kind. */
export function actionForKind(kind: string): StudyAction {
  const found = blockKindOf(kind);
  return found.ok && found.value.rights === 'numbers' ? 'editNumbersBlocks' : 'editWordsBlocks';
}

/** What a person must be allowed to do to change this block. */
export function actionForBlock(report: Report, blockId: string): StudyAction {
  const found = findBlock(report, blockId);
  return actionForKind(found.ok ? found.value.kind : '');
}
