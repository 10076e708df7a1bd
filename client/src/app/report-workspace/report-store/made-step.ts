import type { AcceptedStep, StepSubmission } from '#shared/api';
import { parseStep, type Step } from '#shared/report';

/** A step that was made here. Its id makes a repeated request harmless. */
export interface MadeStep {
  readonly id: string;
  /** Steps that one action made; they are undone together. */
  readonly groupId: string;
  /** Id of the step that this one takes back. */
  readonly undoes: string | null;
  readonly step: Step;
}

/** The step as it is sent. */
export function submissionOf(made: MadeStep): StepSubmission {
  return { ...made, step: { ...made.step } };
}

/** Reads a submission that this browser kept; null when it cannot be read any more. */
export function madeStepOf(kept: unknown): MadeStep | null {
  const submission = kept as Partial<StepSubmission> | null;
  if (typeof submission?.id !== 'string' || typeof submission.groupId !== 'string') return null;
  const step = parseStep(submission.step);
  if (!step.ok) return null;
  const undoes = typeof submission.undoes === 'string' ? submission.undoes : null;
  return { id: submission.id, groupId: submission.groupId, undoes, step: step.value };
}

/** A step that the server has taken, with who made it. */
export interface TakenStep extends MadeStep {
  readonly seq: number;
  readonly person: string;
  readonly at: string;
}

/** Reads a step of the server's answer; null for a kind of step that this page does not know. */
export function takenStepOf(accepted: AcceptedStep): TakenStep | null {
  const made = madeStepOf(accepted);
  if (made === null) return null;
  return { ...made, seq: accepted.seq, person: accepted.person, at: accepted.at };
}
