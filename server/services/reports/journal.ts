import type { Block, Report, Step } from '#shared/report';
import { applyStep, type StepIssue } from '#shared/report';
import type { Result } from '#shared/core';
import type { Dependencies } from '../../dependencies';
import type { StoredStep } from '../../models/step/step-store';
import type { Unit } from '../../models/unit-of-work';
import { timestamp } from '../../runtime/clock';
import { recordStudyChange } from '../studies/record-study-change';
import type { OpenReport } from './open-report';

/** A report with the steps that were made on it in this unit of work, not stored yet. */
export interface Journal {
  readonly opened: OpenReport;
  readonly report: Report;
  readonly made: readonly StoredStep[];
}

/** What a step brings along apart from what it does. */
export type StepFrame = Pick<StoredStep, 'id' | 'groupId' | 'undoes' | 'personId'>;

/** A journal without steps. */
export function startJournal(opened: OpenReport): Journal {
  return { opened, report: opened.report, made: [] };
}

/** Applies a step and notes it; an issue leaves the journal as it was. */
export function noteStep(
  { clock }: Dependencies,
  journal: Journal,
  frame: StepFrame,
  step: Step,
): Result<Journal, StepIssue> {
  const at = timestamp(clock);
  const applied = applyStep(journal.report, step, { at });
  if (!applied.ok) return applied;
  const { report, inverse } = applied.value;
  const noted = { ...frame, reportId: report.id, seq: report.seq, forward: step, inverse, at };
  return { ok: true, value: { ...journal, report, made: [...journal.made, noted] } };
}

/** Stores what the steps of a journal made of its report, and the steps; all in the one unit. */
export async function storeJournal(
  dependencies: Dependencies,
  { opened, report, made }: Journal,
  personId: string,
  unit: Unit,
): Promise<void> {
  if (made.length === 0) return;
  const { steps, blocks, reportPins, reports } = dependencies.database.stores;
  for (const step of made) await steps.insert(step, unit);
  for (const block of changedBlocks(opened.report, report))
    await blocks.put(report.id, block, unit);
  await reportPins.change(report.id, opened.report.pins, report.pins, unit);
  const { title, seq, framing, houseStyleId, studyId } = report;
  const change = { title, seq, framing, houseStyleId, updatedAt: timestamp(dependencies.clock) };
  const updated = { ...change, updatedBy: personId };
  const stored = await reports.update(report.id, opened.report.seq, updated, unit);
  if (!stored) throw new Error(`Report ${report.id} changed within a unit of work.`);
  const record = { studyId, personId, what: 'report.changed', before: null };
  const after = { report: report.id, seq, steps: made.map(({ id }) => id) };
  await recordStudyChange(dependencies, { ...record, after }, unit);
}

function changedBlocks(before: Report, after: Report): readonly Block[] {
  const known = new Set(before.blocks);
  return after.blocks.filter((block) => !known.has(block));
}
