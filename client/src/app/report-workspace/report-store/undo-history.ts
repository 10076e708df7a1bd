import { failure, type Result, success } from '#shared/core';
import { contentChangedBy, isUndoBarrier, rebaseStep, type Step } from '#shared/report';
import { sameJson } from './edit-conflict';
import { blockWithId, type Chain, type ChainLink } from './step-chain';

/** Actions of this person that can be taken back, and those that were: ids of their groups. */
export interface UndoHistory {
  readonly done: readonly string[];
  readonly undone: readonly string[];
}

/** Nothing done yet. */
export const EMPTY_HISTORY: UndoHistory = { done: [], undone: [] };

/** A new action; what was undone before can no longer be done again. */
export function withAction(history: UndoHistory, groupId: string): UndoHistory {
  if (history.done.at(-1) === groupId) return history;
  return { done: [...history.done, groupId], undone: [] };
}

/** Why an action cannot be taken back. */
export type UndoIssue = 'nothingToUndo' | 'changedSince' | 'numbersMovedSince';

/** A step that takes back another one, with the id of that one. */
export interface UndoStep {
  readonly undoes: string;
  readonly step: Step;
}

/**
 * The steps that take an action back as the report is now, last made first.
 *
 * Undo is a new step: what others did since stays. Numbers that moved are a barrier, as the words
 * before were written for other numbers. The steps are worked out one after the other by `apply`,
 * which gives the chain after each.
 */
export function undoSteps(
  chain: Chain,
  groupId: string,
  apply: (chain: Chain, undo: UndoStep) => Chain | null,
): Result<readonly UndoStep[], UndoIssue> {
  const first = chain.links.findIndex((link) => link.groupId === groupId);
  if (first === -1) return failure('nothingToUndo');
  if (crossesBarrier(chain.links.slice(first), groupId)) return failure('numbersMovedSince');
  const group = chain.links.filter((link) => link.groupId === groupId && isUndone(link));
  return takenBack(chain, group.toReversed(), apply);
}

/** Pins move by themselves: one that came with a block stays when the block goes. */
function isUndone({ step }: ChainLink): boolean {
  return step.kind !== 'movePin';
}

function takenBack(
  start: Chain,
  group: readonly ChainLink[],
  apply: (chain: Chain, undo: UndoStep) => Chain | null,
): Result<readonly UndoStep[], UndoIssue> {
  let chain = start;
  const steps: UndoStep[] = [];
  for (const link of group) {
    const step = inverseNow(chain, link);
    const undo = step === null ? null : { undoes: link.id, step };
    const after = undo === null ? null : apply(chain, undo);
    if (undo === null || after === null) return failure('changedSince');
    steps.push(undo);
    chain = after;
  }
  return success(steps);
}

function crossesBarrier(links: readonly ChainLink[], groupId: string): boolean {
  return links.some(
    (link) => link.groupId !== groupId && isUndoBarrier(link.step) && link.movedNumbers,
  );
}

/** The inverse of a step, brought up to date; null when a newer edit stands in its way. */
function inverseNow(chain: Chain, link: ChainLink): Step | null {
  const blockId = contentChangedBy(link.inverse);
  if (blockId === null) return link.inverse;
  const present = blockWithId(chain.report, blockId);
  if (present === undefined) return null;
  if (sameJson(present.content, link.contentAfter)) {
    return atVersion(link.inverse, present.version);
  }
  const place = chain.links.findIndex((each) => each.id === link.id);
  const newer = chain.links.slice(place + 1).map((each) => each.step);
  const rebased = rebaseStep(link.inverse, newer);
  return rebased.ok ? rebased.value : null;
}

function atVersion(step: Step, version: number): Step {
  return 'baseVersion' in step ? { ...step, baseVersion: version } : step;
}
