import * as z from 'zod';
import { STUDY_DESIGNS } from '#shared/effects/study-design';
import { STUDY_ROLES } from '#shared/permissions';
import { emailSchema } from './session';

const idSchema = z.string().min(1).max(100);

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

export const milestoneSchema = z.object({
  id: idSchema,
  title: z.string().trim().min(1, 'Give the milestone a title.').max(200),
  dueDate: z.iso.date('Give a date such as 2026-03-31.'),
});

export const memberSchema = z.object({
  personId: z.string(),
  name: z.string(),
  email: z.string(),
  initials: z.string(),
  role: z.enum(STUDY_ROLES),
});

export const newStudyRequestSchema = z.object({
  title: z.string().trim().min(1, 'Give the study a title.').max(200),
  design: z.enum(STUDY_DESIGNS),
  population: z.string().trim().max(1000).default(''),
  peopleNoun: z.string().trim().min(1, 'Say who the records are, as in "workers".').max(60),
});

export const studyChangeRequestSchema = newStudyRequestSchema.partial();

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

export const studyViewSchema = studySummarySchema.extend({
  population: z.string(),
  peopleNoun: z.string(),
  outcomes: z.array(outcomeWordsSchema),
  milestones: z.array(milestoneSchema),
  members: z.array(memberSchema),
});

export const newMemberRequestSchema = z.object({
  email: emailSchema,
  role: z.enum(STUDY_ROLES),
});

export const memberChangeRequestSchema = z.object({ role: z.enum(STUDY_ROLES) });

export type Milestone = z.infer<typeof milestoneSchema>;
export type Member = z.infer<typeof memberSchema>;
export type NewStudyRequest = z.infer<typeof newStudyRequestSchema>;
export type StudyChangeRequest = z.infer<typeof studyChangeRequestSchema>;
export type StudySummary = z.infer<typeof studySummarySchema>;
export type StudyView = z.infer<typeof studyViewSchema>;
export type NewMemberRequest = z.infer<typeof newMemberRequestSchema>;
export type MemberChangeRequest = z.infer<typeof memberChangeRequestSchema>;
