import { failure, type Result, success } from '#shared/core';
import type { Report, StepIssue } from '#shared/report';
import { type EditConflict, openConflicts } from './edit-conflict';
import type { MadeStep, TakenStep } from './made-step';
import { rebasePending } from './rebase-pending';
import { type Chain, linkStep } from './step-chain';

/**
 * A report that this person and others change at once.
 *
 * `taken` is the report as the server has it, with the steps since the page was opened; `pending`
 * are steps made here that the server has not answered yet; `local` is what the person sees: both
 * together. Edits that somebody else's newer edit contradicts wait in `conflicts`.
 */
export interface SharedReport {
  readonly taken: Chain;
  readonly pending: readonly MadeStep[];
  readonly local: Chain;
  readonly conflicts: readonly EditConflict[];
}

/** Opens a report as the server has it. */
export function openSharedReport(report: Report): SharedReport {
  const taken: Chain = { report, links: [] };
  return { taken, pending: [], local: taken, conflicts: [] };
}

/** Makes a step here, against the report as this person sees it. */
export function makeStep(
  shared: SharedReport,
  made: MadeStep,
  at: string,
): Result<SharedReport, StepIssue> {
  const local = linkStep(shared.local, made, at);
  if (!local.ok) return failure(local.issue);
  return success({ ...shared, local: local.value, pending: [...shared.pending, made] });
}

/** Takes in what the server has accepted, in the order of its numbers; known steps are skipped. */
export function takeSteps(
  shared: SharedReport,
  taken: readonly TakenStep[],
  at: string,
): Result<SharedReport, StepIssue> {
  let after = shared;
  for (const step of taken) {
    const next = takeStep(after, step, at);
    if (!next.ok) return next;
    after = next.value;
  }
  return success(after);
}

/** Gives up steps that the server will never take; gives back the report without them. */
export function dropSteps(shared: SharedReport, ids: readonly string[], at: string): SharedReport {
  if (!shared.pending.some((made) => ids.includes(made.id))) return shared;
  const pending = shared.pending.filter((made) => !ids.includes(made.id));
  return refold({ ...shared, pending }, at, null);
}

/** The waiting steps with these ids, as they apply to the report now. */
export function sendableSteps(shared: SharedReport, ids: readonly string[]): readonly MadeStep[] {
  return shared.local.links
    .slice(shared.taken.links.length)
    .filter((link) => ids.includes(link.id))
    .map(({ id, groupId, undoes, step }) => ({ id, groupId, undoes, step }));
}

/** Opens a conflict that the server has found; waiting edits of its block are part of it. */
export function contest(shared: SharedReport, conflict: EditConflict, at: string): SharedReport {
  const others = shared.conflicts.filter((each) => each.blockId !== conflict.blockId);
  return withoutConflicted({ ...shared, conflicts: [...others, conflict] }, at);
}

/** Ends a conflict; what to make of it is a new step. */
export function settleConflict(shared: SharedReport, blockId: string): SharedReport {
  const conflicts = shared.conflicts.filter((conflict) => conflict.blockId !== blockId);
  return { ...shared, conflicts };
}

/** Whether the server's numbers have a gap that only asking for the steps between can close. */
export function missesSteps(shared: SharedReport, taken: readonly TakenStep[]): boolean {
  const newer = taken.filter((step) => step.seq > shared.taken.report.seq);
  return newer.some((step, index) => step.seq !== shared.taken.report.seq + 1 + index);
}

function takeStep(
  shared: SharedReport,
  step: TakenStep,
  at: string,
): Result<SharedReport, StepIssue> {
  if (step.seq <= shared.taken.report.seq) return success(dropSteps(shared, [step.id], at));
  const taken = linkStep(shared.taken, step, step.at);
  if (!taken.ok) return failure(taken.issue);
  const own = shared.pending.some((made) => made.id === step.id);
  const rebased = own
    ? withoutPending(shared, step.id)
    : { ...shared, pending: rebasePending(shared.pending, step.step) };
  return success(refold({ ...rebased, taken: taken.value }, at, step.person, shared.local.report));
}

function withoutPending(shared: SharedReport, id: string): SharedReport {
  return { ...shared, pending: shared.pending.filter((made) => made.id !== id) };
}

/**
 * Applies what is pending to what the server has. What does not apply any more is set aside: edits
 * of a block become a conflict with what the person saw before, other steps have lost their point.
 */
function refold(
  shared: SharedReport,
  at: string,
  author: string | null,
  seen: Report = shared.local.report,
): SharedReport {
  let local = shared.taken;
  const kept: MadeStep[] = [];
  const failed: MadeStep[] = [];
  for (const made of shared.pending) {
    const next = linkStep(local, made, at);
    if (next.ok) local = next.value;
    (next.ok ? kept : failed).push(made);
  }
  const moment = { seen, now: shared.taken.report, author, at };
  const conflicts = openConflicts(shared.conflicts, failed, moment);
  return withoutConflicted({ ...shared, pending: kept, local, conflicts }, at);
}

/** A block in conflict shows the server's version until the person has chosen. */
function withoutConflicted(shared: SharedReport, at: string): SharedReport {
  const contested = new Set(shared.conflicts.map((conflict) => conflict.blockId));
  const changes = ({ step }: MadeStep): boolean =>
    (step.kind === 'editText' || step.kind === 'replaceContent') && contested.has(step.blockId);
  if (!shared.pending.some(changes)) return shared;
  const pending = shared.pending.filter((made) => !changes(made));
  return refold({ ...shared, pending }, at, null);
}
