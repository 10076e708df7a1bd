import type { Block, Report } from '#shared/report';
import type { MadeStep } from './made-step';
import { blockWithId } from './step-chain';

/**
 * Two edits of one block that contradict each other. `mine` is the content that this person saw;
 * theirs is what the report holds now. Nothing is given up before the person has chosen.
 */
export interface EditConflict {
  readonly blockId: string;
  readonly mine: unknown;
  /** Whoever made the newer edit; null when that is not known. */
  readonly author: string | null;
  readonly at: string;
}

/** What was known when edits turned out to contradict newer ones. */
export interface ConflictMoment {
  /** The report as this person saw it. */
  readonly seen: Report;
  /** The report as others have left it. */
  readonly now: Report;
  readonly author: string | null;
  readonly at: string;
}

/** Adds a conflict for every block whose edits failed, unless both made the same of it. */
export function openConflicts(
  open: readonly EditConflict[],
  failed: readonly MadeStep[],
  moment: ConflictMoment,
): readonly EditConflict[] {
  const known = new Set(open.map((conflict) => conflict.blockId));
  const blockIds = new Set(failed.flatMap(editedBlock).filter((id) => !known.has(id)));
  const added = [...blockIds].flatMap((blockId) => conflictOf(blockId, moment));
  return added.length === 0 ? open : [...open, ...added];
}

function editedBlock({ step }: MadeStep): readonly string[] {
  return step.kind === 'editText' || step.kind === 'replaceContent' ? [step.blockId] : [];
}

function conflictOf(blockId: string, moment: ConflictMoment): readonly EditConflict[] {
  const mine = blockWithId(moment.seen, blockId);
  const theirs = blockWithId(moment.now, blockId);
  if (mine === undefined || isSame(mine, theirs)) return [];
  return [{ blockId, mine: mine.content, author: moment.author, at: moment.at }];
}

function isSame(mine: Block, theirs: Block | undefined): boolean {
  return theirs?.removedAt === null && sameJson(mine.content, theirs.content);
}

/** Whether two contents say the same; contents are plain JSON with keys in one order. */
export function sameJson(one: unknown, other: unknown): boolean {
  return one === other || JSON.stringify(one) === JSON.stringify(other);
}
