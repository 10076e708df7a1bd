import type * as z from 'zod/mini';
import type { Result } from '#shared/core';
import type { StudyAction } from '#shared/permissions';
import type { Report } from '../report';
import type { Step, StepIssue } from './step';

/** What a step made of a report, and the step that takes it back. */
export interface AppliedStep {
  readonly report: Report;
  readonly inverse: Step;
}

/** The clock reading that a step is made at, as ISO text; steps never read a clock themselves. */
export interface StepMoment {
  readonly at: string;
}

/** Everything that one kind of step knows about itself. */
export interface StepDefinition<S extends Step = Step> {
  readonly schema: z.ZodMiniType<S>;
  /** Undo stops here: a later step must not be undone across it. */
  readonly undoBarrier: boolean;
  /** Block whose content version the step raises; null for steps that leave contents alone. */
  contentChangedOf(step: S): string | null;
  actionFor(report: Report, step: S): StudyAction;
  apply(report: Report, step: S, moment: StepMoment): Result<AppliedStep, StepIssue>;
}
