import * as z from 'zod';
import type { HouseStyle } from '#shared/house-style';
import type { PinnedAnalysis } from '#shared/report';
import { REPORT_STAGES } from '#shared/report/report';
import { FRAMINGS } from '#shared/wording/phrase';

const idSchema = z.string().min(1).max(100);

/** A report to begin. */
export const newReportRequestSchema = z.object({
  title: z.string().trim().min(1, 'Give the report a title.').max(300),
  houseStyleId: idSchema.default('open-clinical'),
});

/** A report in a list. */
export const reportSummarySchema = z.object({
  id: z.string(),
  studyId: z.string(),
  title: z.string(),
  stage: z.enum(REPORT_STAGES),
  seq: z.int(),
  blockCount: z.int(),
  /** Kinds of the first dozen blocks in view, in their order; the desk sketches the page by it. */
  blockKinds: z.array(z.string()).max(12),
  updatedAt: z.string(),
  updatedBy: z.string().nullable(),
});

/** A block of a report; `removedAt` marks the tombstone of a removed one. */
export const blockSchema = z.object({
  id: idSchema,
  kind: z.string().max(60),
  orderKey: z.string().max(200),
  content: z.unknown(),
  version: z.int(),
  positionVersion: z.int(),
  removedAt: z.string().nullable(),
});

/** A step as plain data; `#shared/report` parses `step` by its kind before applying it. */
export const stepSubmissionSchema = z.object({
  id: z.uuid(),
  groupId: z.uuid(),
  undoes: z.uuid().nullable(),
  step: z.looseObject({ kind: z.string() }),
});

/** Steps to apply in order, all or none. */
export const stepsRequestSchema = z.object({
  steps: z.array(stepSubmissionSchema).min(1).max(200),
});

/** A step that was applied: by whom, when, and what takes it back. */
export const acceptedStepSchema = stepSubmissionSchema.extend({
  seq: z.int(),
  person: z.string(),
  personId: z.string(),
  at: z.string(),
  inverse: z.looseObject({ kind: z.string() }),
});

/** Steps after a sequence number, and the newest number. */
export const stepsViewSchema = z.object({ seq: z.int(), steps: z.array(acceptedStepSchema) });

/** What a person typed into a block and has not made a step yet. */
export const draftSchema = z.object({
  blockId: z.string(),
  baseVersion: z.int(),
  content: z.unknown(),
  savedAt: z.string(),
});

/** Typing to keep, against one version of its block. */
export const draftRequestSchema = z.object({ baseVersion: z.int(), content: z.unknown() });

/** A report with all that is needed to compose it, and the drafts of who asks. */
export const reportViewSchema = z.object({
  report: z.object({
    id: z.string(),
    studyId: z.string(),
    title: z.string(),
    framing: z.enum(FRAMINGS),
    houseStyleId: z.string(),
    stage: z.enum(REPORT_STAGES),
    seq: z.int(),
    blocks: z.array(blockSchema),
    pins: z.record(z.string(), z.string()),
  }),
  pins: z.array(z.custom<PinnedAnalysis>((value) => typeof value === 'object' && value !== null)),
  houseStyle: z.custom<HouseStyle>((value) => typeof value === 'object' && value !== null),
  drafts: z.array(draftSchema),
});

/** A report to begin. */
export type NewReportRequest = z.infer<typeof newReportRequestSchema>;
/** A report in a list. */
export type ReportSummary = z.infer<typeof reportSummarySchema>;
/** A step as a client sends it. */
export type StepSubmission = z.infer<typeof stepSubmissionSchema>;
/** Steps to apply in order, all or none. */
export type StepsRequest = z.infer<typeof stepsRequestSchema>;
/** A step that was applied. */
export type AcceptedStep = z.infer<typeof acceptedStepSchema>;
/** Steps after a sequence number, and the newest number. */
export type StepsView = z.infer<typeof stepsViewSchema>;
/** What a person typed into a block and has not made a step yet. */
export type DraftView = z.infer<typeof draftSchema>;
/** Typing to keep, against one version of its block. */
export type DraftRequest = z.infer<typeof draftRequestSchema>;
/** A report with all that is needed to compose it. */
export type ReportView = z.infer<typeof reportViewSchema>;
