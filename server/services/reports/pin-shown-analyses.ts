import { analysisIdsOf, applyStep, contentChangedBy, type Report, type Step } from '#shared/report';
import type { Dependencies } from '../../dependencies';
import { refuse, type Outcome } from '../../errors/server-issue';
import type { Unit } from '../../models/unit-of-work';
import { type Journal, noteStep, type StepFrame } from './journal';
import { refuseStep } from './refuse-step';

/**
 * Pins the present result of every analysis that the step makes a block show for the first time in
 * the report, so that the block never stands there without its numbers.
 */
export async function pinShownAnalyses(
  dependencies: Dependencies,
  journal: Journal,
  frame: StepFrame,
  step: Step,
  unit: Unit,
): Promise<Outcome<Journal>> {
  let pinned = journal;
  for (const analysisId of newlyShown(journal.report, step)) {
    const resultId = await presentResult(dependencies, journal.report.studyId, analysisId, unit);
    if (resultId === null) return refuse('analysisUnknown', { facts: { analysisId } });
    const move: Step = { kind: 'movePin', analysisId, resultId };
    const ownFrame = { ...frame, id: dependencies.ids.next(), undoes: null };
    const noted = noteStep(dependencies, pinned, ownFrame, move);
    if (!noted.ok) return refuseStep(noted.issue);
    pinned = noted.value;
  }
  return { ok: true, value: pinned };
}

/** Analyses that the changed block names and that the report does not pin yet. */
function newlyShown(report: Report, step: Step): readonly string[] {
  const blockId = step.kind === 'insertBlock' ? step.block.id : shownAgain(step);
  const applied = blockId === null ? null : applyStep(report, step, { at: '' });
  if (applied?.ok !== true) return [];
  const block = applied.value.report.blocks.find(({ id }) => id === blockId);
  const shown = block === undefined ? [] : analysisIdsOf(block);
  return shown.filter((id) => !Object.hasOwn(report.pins, id));
}

function shownAgain(step: Step): string | null {
  return step.kind === 'restoreBlock' ? step.blockId : contentChangedBy(step);
}

async function presentResult(
  { database }: Dependencies,
  studyId: string,
  analysisId: string,
  unit: Unit,
): Promise<string | null> {
  const { analyses, results } = database.stores;
  const analysis = await analyses.find(studyId, analysisId, unit);
  return analysis === null ? null : results.newestId(analysisId, unit);
}
