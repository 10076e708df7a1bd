import type { StepsRequest, StepsView, StepSubmission } from '#shared/api';
import { parseStep, type Step } from '#shared/report';
import type { Dependencies } from '../../dependencies';
import { refuse, type Outcome } from '../../errors/server-issue';
import type { Unit } from '../../models/unit-of-work';
import type { User } from '../../models/user/user-store';
import { bringUpToDate } from './bring-up-to-date';
import { discardFinishedDrafts } from '../drafts/discard-finished-drafts';
import { type Journal, noteStep, startJournal, type StepFrame, storeJournal } from './journal';
import { openReport } from './open-report';
import { pinShownAnalyses } from './pin-shown-analyses';
import { presentSteps } from './present-steps';
import { refuseStep } from './refuse-step';
import { stepProblem } from './step-problem';

/** Who sends steps to which report. */
export interface StepSender {
  readonly person: User;
  readonly studyId: string;
  readonly reportId: string;
}

/**
 * Accepts steps of a report: all of them in one transaction, or none.
 *
 * A step whose id is known was accepted before and is not applied again. A text step that was made
 * against an older version is mapped over the newer ones. A block that shows an analysis for the
 * first time pins its present result, by a step of its own before it. Gives the accepted steps of
 * the request with those, as they were applied.
 */
export async function acceptSteps(
  dependencies: Dependencies,
  sender: StepSender,
  { steps }: StepsRequest,
): Promise<Outcome<StepsView>> {
  const { unitOfWork, stores } = dependencies.database;
  const { person, studyId, reportId } = sender;
  return unitOfWork<Outcome<StepsView>>(`report:${reportId}`, async (unit) => {
    const opened = await openReport(dependencies, studyId, reportId, unit);
    if (!opened.ok) return opened;
    const ids = steps.map(({ id }) => id);
    const known = await stores.steps.findMany(reportId, ids, unit);
    const fresh = newSubmissions(steps, new Set(known.map(({ id }) => id)));
    const journal = await noteAll(dependencies, startJournal(opened.value), person, fresh, unit);
    if (!journal.ok) return journal;
    await storeJournal(dependencies, journal.value, person.id, unit);
    await discardFinishedDrafts(dependencies, journal.value, person.id, unit);
    const accepted = [...known, ...journal.value.made];
    const presented = await presentSteps(dependencies, accepted, unit);
    return { ok: true, value: { seq: journal.value.report.seq, steps: presented } };
  });
}

/** Each submission once, without those that were accepted before. */
function newSubmissions(
  steps: readonly StepSubmission[],
  known: ReadonlySet<string>,
): readonly StepSubmission[] {
  const first = new Map(steps.toReversed().map((step) => [step.id, step]));
  return steps.filter((step) => !known.has(step.id) && first.get(step.id) === step);
}

async function noteAll(
  dependencies: Dependencies,
  start: Journal,
  person: User,
  submissions: readonly StepSubmission[],
  unit: Unit,
): Promise<Outcome<Journal>> {
  let journal = start;
  for (const submission of submissions) {
    const noted = await noteOne(dependencies, journal, person, submission, unit);
    if (!noted.ok) return noted;
    journal = noted.value;
  }
  return { ok: true, value: journal };
}

async function noteOne(
  dependencies: Dependencies,
  journal: Journal,
  person: User,
  { id, groupId, undoes, step: sent }: StepSubmission,
  unit: Unit,
): Promise<Outcome<Journal>> {
  const parsed = parseStep(sent);
  if (!parsed.ok) return refuseStep(parsed.issue);
  const problem = stepProblem(dependencies, journal.report, parsed.value);
  if (problem !== null) return refuse(problem.code, problem);
  const frame: StepFrame = { id, groupId, undoes, personId: person.id };
  const current = await bringUpToDate(dependencies, journal, parsed.value, unit);
  if (!current.ok) return current;
  const pinned = await pinShownAnalyses(dependencies, journal, frame, current.value, unit);
  if (!pinned.ok) return pinned;
  return applyNoted(dependencies, pinned.value, frame, current.value);
}

function applyNoted(
  dependencies: Dependencies,
  journal: Journal,
  frame: StepFrame,
  step: Step,
): Outcome<Journal> {
  const noted = noteStep(dependencies, journal, frame, step);
  return noted.ok ? noted : refuseStep(noted.issue);
}
