import * as z from 'zod';
import { STUDY_DESIGNS } from '#shared/effects/study-design';
import { STUDY_ROLES } from '#shared/permissions';
import { emailSchema } from './session';

const idSchema = z.string().min(1).max(100);

/** An outcome and its words; the id is made by the client. */
export const outcomeWordsSchema = z.object({
  id: idSchema,
  noun: z.string().trim().min(1, 'Name the outcome, as in "hand eczema".').max(200),
  verbPhrase: z
    .string()
    .trim()
    .min(1, 'Say what happened to people, as in "developed hand eczema".')
    .max(200),
  timeFrame: z.string().trim().max(100).nullable(),
  desirability: z.enum(['harmful', 'beneficial']),
});

/** Something that is due on a day; the id is made by the client. */
export const milestoneSchema = z.object({
  id: idSchema,
  title: z.string().trim().min(1, 'Give the milestone a title.').max(200),
  dueDate: z.iso.date('Give a date such as 2026-03-31.'),
});

/** A person on a study, with the role held there. */
export const memberSchema = z.object({
  personId: z.string(),
  name: z.string(),
  email: z.string(),
  initials: z.string(),
  role: z.enum(STUDY_ROLES),
});

/** A study to begin; whoever begins it leads it. */
export const newStudyRequestSchema = z.object({
  title: z.string().trim().min(1, 'Give the study a title.').max(200),
  design: z.enum(STUDY_DESIGNS),
  population: z.string().trim().max(1000).default(''),
  peopleNoun: z.string().trim().min(1, 'Say who the records are, as in "workers".').max(60),
});

/** What changes of a study; what is left out stays. */
export const studyChangeRequestSchema = newStudyRequestSchema.partial();

/** A study in a list, with the role of the person who asks. */
export const studySummarySchema = z.object({
  id: z.string(),
  title: z.string(),
  design: z.enum(STUDY_DESIGNS),
  role: z.enum(STUDY_ROLES),
  invented: z.boolean(),
  latestCutNumber: z.int().nullable(),
  reportCount: z.int(),
  updatedAt: z.string(),
});

/** A study with its outcomes, milestones and members. */
export const studyViewSchema = studySummarySchema.extend({
  population: z.string(),
  peopleNoun: z.string(),
  outcomes: z.array(outcomeWordsSchema),
  milestones: z.array(milestoneSchema),
  members: z.array(memberSchema),
});

/** Somebody to add to a study, by address. */
export const newMemberRequestSchema = z.object({
  email: emailSchema,
  role: z.enum(STUDY_ROLES),
});

/** Another role for a member. */
export const memberChangeRequestSchema = z.object({ role: z.enum(STUDY_ROLES) });

/** Something that is due on a day. */
export type Milestone = z.infer<typeof milestoneSchema>;
/** A person on a study, with the role held there. */
export type Member = z.infer<typeof memberSchema>;
/** A study to begin. */
export type NewStudyRequest = z.infer<typeof newStudyRequestSchema>;
/** What changes of a study. */
export type StudyChangeRequest = z.infer<typeof studyChangeRequestSchema>;
/** A study in a list, with the role of the person who asks. */
export type StudySummary = z.infer<typeof studySummarySchema>;
/** A study with its outcomes, milestones and members. */
export type StudyView = z.infer<typeof studyViewSchema>;
/** Somebody to add to a study, by address. */
export type NewMemberRequest = z.infer<typeof newMemberRequestSchema>;
/** Another role for a member. */
export type MemberChangeRequest = z.infer<typeof memberChangeRequestSchema>;
