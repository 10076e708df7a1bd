import type { StepsRequest } from '#shared/api';
import type { StudyAction } from '#shared/permissions';
import { actionForStep, parseStep, type Report, type Step } from '#shared/report';
import type { Dependencies } from '../../dependencies';
import type { Outcome } from '../../errors/server-issue';
import { openReport } from './open-report';
import { refuseStep } from './refuse-step';

/** What a person must be allowed to do to make all of these steps on this report. */
export async function actionsForSteps(
  dependencies: Dependencies,
  studyId: string,
  reportId: string,
  { steps }: StepsRequest,
): Promise<Outcome<readonly StudyAction[]>> {
  const opened = await openReport(dependencies, studyId, reportId);
  if (!opened.ok) return opened;
  let { report } = opened.value;
  const actions = new Set<StudyAction>();
  for (const { step: sent } of steps) {
    const step = parseStep(sent);
    if (!step.ok) return refuseStep(step.issue);
    actions.add(actionForStep(report, step.value));
    report = withInserted(report, step.value);
  }
  return { ok: true, value: [...actions] };
}

/** What somebody must be allowed to do to write in this block. */
export async function actionsForBlock(
  dependencies: Dependencies,
  studyId: string,
  reportId: string,
  blockId: string,
): Promise<Outcome<readonly StudyAction[]>> {
  const opened = await openReport(dependencies, studyId, reportId);
  if (!opened.ok) return opened;
  const step: Step = { kind: 'replaceContent', blockId, baseVersion: 1, content: null };
  return { ok: true, value: [actionForStep(opened.value.report, step)] };
}

/** Later steps of one request may be about a block that an earlier one inserts. */
function withInserted(report: Report, step: Step): Report {
  if (step.kind !== 'insertBlock') return report;
  const state = { version: 1, positionVersion: 1, removedAt: null };
  return { ...report, blocks: [...report.blocks, { ...step.block, ...state }] };
}
