import * as z from 'zod';
import { isDay, OUTSIDE_MEASURES } from '#shared/outside-estimates';
import type { OutsideEstimate, OutsideEstimateEntry } from '#shared/outside-estimates';

const idSchema = z.string().min(1).max(100);
const MOST_DIGITS = 20;

const numberText = z.string().trim().min(1, 'Enter a number.').max(MOST_DIGITS);
const orNull = (most: number): z.ZodType<string | null> =>
  z
    .string()
    .trim()
    .max(most)
    .transform((text) => (text === '' ? null : text))
    .nullable();

const entryShape = {
  levelId: idSchema.nullable(),
  referenceLevelId: idSchema,
  measure: z.enum(OUTSIDE_MEASURES),
  value: numberText,
  lower: numberText,
  upper: numberText,
  level: z.number().gt(0.5).lt(1),
  pValue: orNull(MOST_DIGITS),
  method: z.string().trim().min(1, 'Say what kind of model it was.').max(200),
  covariates: z.array(z.string().trim().min(1).max(100)).max(50),
  numberAnalysed: z.int().positive().nullable(),
  source: z.string().trim().min(1, 'Say who or what computed it.').max(500),
  computedOn: z.string().refine(isDay, 'Write the day as in 2026-05-12.').nullable(),
  note: orNull(1000),
};

/** Shape of an estimate from elsewhere; whether its numbers can be is for its checks to say. */
export const outsideEstimateEntrySchema: z.ZodType<OutsideEstimateEntry> = z.object(entryShape);

/** An estimate changed against one version of it. */
export const outsideEstimateChangeRequestSchema = z.object({
  ...entryShape,
  baseVersion: z.int(),
});

/** An estimate from elsewhere as it stands beside its analysis. */
export const outsideEstimateSchema: z.ZodType<OutsideEstimate> = z.object({
  ...entryShape,
  pValue: z.string().nullable(),
  note: z.string().nullable(),
  id: z.string(),
  studyId: z.string(),
  analysisId: z.string(),
  version: z.int(),
});

/** An estimate changed against one version of it. */
export type OutsideEstimateChangeRequest = z.infer<typeof outsideEstimateChangeRequestSchema>;
