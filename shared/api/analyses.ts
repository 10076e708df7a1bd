import * as z from 'zod';
import { EFFECT_MEASURE_IDS } from '#shared/effects/measure-ids';
import type { AnalysisResult, AnalysisSpecification } from '#shared/analysis';

import { outsideEstimateSchema } from './outside-estimates';

const idSchema = z.string().min(1).max(100);

const methodsByMeasureSchema = z.partialRecord(z.enum(EFFECT_MEASURE_IDS), idSchema);

/** Shape of a specification; whether it fits its code book is `frameOf`'s to say. */
export const analysisSpecificationSchema: z.ZodType<AnalysisSpecification> = z.object({
  schemaVersion: z.literal(1),
  outcome: z.object({
    outcomeId: idSchema,
    columnId: idSchema,
    eventLevelIds: z.array(idSchema).min(1, 'Pick at least one level that counts as the event.'),
  }),
  exposure: z.object({ columnId: idSchema, referenceLevelId: idSchema }),
  stratumColumnIds: z.array(idSchema).max(3),
  restrictions: z
    .array(z.object({ columnId: idSchema, levelIds: z.array(idSchema).min(1) }))
    .max(20),
  level: z.number().gt(0.5).lt(1),
  methods: z.object({
    risk: idSchema,
    riskDifference: idSchema,
    riskRatio: idSchema,
    oddsRatio: idSchema,
  }),
  otherMethods: z
    .object({
      contrastTest: idSchema.optional(),
      trendTest: idSchema.optional(),
      poolings: methodsByMeasureSchema.optional(),
      standardShares: z.record(z.string(), z.number().nonnegative()).optional(),
      homogeneities: methodsByMeasureSchema.optional(),
    })
    .optional(),
  adjustment: z.enum(['crude', 'mantelHaenszel']),
  trendScores: z.record(z.string(), z.number()).nullable(),
  standing: z.object({
    planned: z.enum(['prespecified', 'postHoc']),
    importance: z.enum(['primary', 'secondary']),
    analysisSet: z.string().trim().max(200),
  }),
});

/** An analysis to save over a cut. */
export const newAnalysisRequestSchema = z.object({
  name: z.string().trim().min(1, 'Give the analysis a name.').max(200),
  cutId: idSchema,
  specification: analysisSpecificationSchema,
});

/** An analysis changed against one version of it. */
export const analysisChangeRequestSchema = newAnalysisRequestSchema.extend({
  baseVersion: z.int(),
  /** Required once a report uses the analysis and a method, level or contrast changes. */
  reason: z.string().trim().max(1000).nullable(),
});

/** An analysis in a list, with the reports that use it. */
export const analysisSummarySchema = z.object({
  id: z.string(),
  number: z.string(),
  name: z.string(),
  cutId: z.string(),
  cutNumber: z.int(),
  dataSetId: z.string(),
  dataSetName: z.string(),
  version: z.int(),
  updatedAt: z.string(),
  usedIn: z.array(z.object({ reportId: z.string(), title: z.string(), blocks: z.int() })),
});

/** An analysis with its specification, newest result and changes. */
export const analysisViewSchema = analysisSummarySchema.extend({
  specification: analysisSpecificationSchema,
  codeBookNumber: z.int(),
  cutDataDate: z.string(),
  resultId: z.string(),
  result: z.custom<AnalysisResult>((value) => typeof value === 'object' && value !== null),
  /** Adjusted estimates that models outside computed, in the order of entry. */
  outside: z.array(outsideEstimateSchema).optional(),
  /** Why it can't be computed under the present code book, in words; null when it can. */
  problem: z.string().nullable().optional(),
  changes: z.array(
    z.object({
      version: z.int(),
      at: z.string(),
      person: z.string(),
      reason: z.string().nullable(),
    }),
  ),
});

/** An analysis to save over a cut. */
export type NewAnalysisRequest = z.infer<typeof newAnalysisRequestSchema>;
/** An analysis changed against one version of it. */
export type AnalysisChangeRequest = z.infer<typeof analysisChangeRequestSchema>;
/** An analysis in a list, with the reports that use it. */
export type AnalysisSummary = z.infer<typeof analysisSummarySchema>;
/** An analysis with its specification, newest result and changes. */
export type AnalysisView = z.infer<typeof analysisViewSchema>;
