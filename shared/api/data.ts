import * as z from 'zod';
import { COLUMN_KINDS, type CodeBook } from '#shared/code-book';

const labelSchema = z.string().trim().min(1, 'Give a label.').max(200);
const idSchema = z.string().min(1).max(100);

const levelSchema = z.object({
  id: idSchema,
  codes: z.array(z.string().max(1000)),
  label: labelSchema,
  sentenceLabel: labelSchema,
});

const bandSchema = z.object({
  id: idSchema,
  lower: z.number().nullable(),
  upper: z.number().nullable(),
  label: labelSchema,
  sentenceLabel: labelSchema,
});

const columnSchema = z.object({
  id: idSchema,
  name: z.string().max(1000),
  kind: z.enum(COLUMN_KINDS),
  label: labelSchema,
  sentenceLabel: labelSchema,
  unit: z.string().max(60).nullable(),
  levels: z.array(levelSchema).max(5000),
  bands: z.array(bandSchema).max(100),
  missingCodes: z.array(z.object({ code: z.string().max(1000), reason: labelSchema })).max(1000),
  referenceLevelId: idSchema.nullable(),
  groupPattern: z.string().trim().max(200).nullable().optional(),
  withinPattern: z.string().trim().max(200).nullable().optional(),
});

/** Shape of a code book; what it must satisfy beyond shape is `validateCodeBook`'s to say. */
export const codeBookSchema: z.ZodType<CodeBook> = z.object({
  schemaVersion: z.literal(1),
  layout: z.discriminatedUnion('kind', [
    z.object({ kind: z.literal('records') }),
    z.object({ kind: z.literal('count'), columnId: idSchema }),
    z.object({
      kind: z.literal('eventsAndTotal'),
      eventsColumnId: idSchema,
      totalColumnId: idSchema,
    }),
    z.object({
      kind: z.literal('casesAndControls'),
      casesColumnId: idSchema,
      controlsColumnId: idSchema,
    }),
  ]),
  columns: z.array(columnSchema).min(1).max(2000),
});

/** How the file is to be read; null lets the reader find out. */
export const readingOptionsSchema = z.object({
  delimiter: z.string().min(1).max(1).nullable().default(null),
  encoding: z.enum(['utf-8', 'windows-1252']).nullable().default(null),
  decimalMark: z.enum(['.', ',']).nullable().default(null),
  sheet: z.string().max(200).nullable().default(null),
});

/** Something odd in a column or in the file, in plain words. */
export const intakeWarningSchema = z.object({
  code: z.string(),
  columnId: z.string().nullable(),
  message: z.string(),
});

/** What a column holds. `values` lists the commonest values, in order of first appearance. */
export const columnProfileSchema = z.object({
  columnId: z.string(),
  name: z.string(),
  guessedKind: z.enum(COLUMN_KINDS),
  distinct: z.int(),
  blank: z.int(),
  numeric: z.int(),
  minimum: z.number().nullable(),
  maximum: z.number().nullable(),
  sum: z.number().nullable(),
  values: z.array(z.object({ value: z.string(), count: z.int() })),
  truncated: z.boolean(),
});

/** What a file holds, column by column, and how it was read. */
export const cutProfileSchema = z.object({
  fileName: z.string(),
  rows: z.int(),
  columns: z.array(columnProfileSchema),
  warnings: z.array(intakeWarningSchema),
  usedOptions: readingOptionsSchema,
  sheets: z.array(z.string()),
});

/** A file on its way to a data cut. */
export const uploadViewSchema = z.object({
  id: z.string(),
  fileName: z.string(),
  state: z.enum(['reading', 'profiled', 'storing', 'stored', 'failed']),
  /** Share of the file read, 0..1. */
  progress: z.number(),
  rowsRead: z.int(),
  profile: cutProfileSchema.nullable(),
  /** The suggestion to start from: guesses, or the data set's code book carried over. */
  proposedCodeBook: codeBookSchema.nullable(),
  /** Where the data differ from the code book that was carried over; empty for guesses. */
  differences: z
    .array(
      z.object({
        code: z.string(),
        columnId: z.string(),
        levelId: z.string().nullable(),
        message: z.string(),
      }),
    )
    .optional(),
  problem: z.object({ code: z.string(), message: z.string(), wayOut: z.string() }).nullable(),
  cutId: z.string().nullable(),
  dataSetId: z.string().nullable(),
});

/** The cut to make of an upload that was read. */
export const storeCutRequestSchema = z.object({
  /** An existing data set for a new cut, or null with a name for a new one. */
  dataSetId: z.string().nullable(),
  dataSetName: z.string().trim().min(1, 'Give the data set a name.').max(200),
  dataDate: z.iso.date('Give the date of the data, such as 2026-03-31.'),
  codeBook: codeBookSchema,
});

/** Counts typed into a grid: one row a level (and stratum), events and total. */
export const typedCountsRequestSchema = z.object({
  dataSetName: z.string().trim().min(1, 'Give the data set a name.').max(200),
  dataDate: z.iso.date('Give the date of the data, such as 2026-03-31.'),
  exposureLabel: labelSchema,
  outcomeLabel: labelSchema,
  stratumLabel: z.string().trim().max(200).nullable(),
  layout: z.enum(['eventsAndTotal', 'casesAndControls']),
  rows: z
    .array(
      z.object({
        level: labelSchema,
        stratum: z.string().trim().max(200).nullable(),
        events: z.int('Counts are whole numbers.').min(0, 'A count cannot be negative.'),
        other: z.int('Counts are whole numbers.').min(0, 'A count cannot be negative.'),
      }),
    )
    .min(2, 'Type at least two rows: one for each group that is compared.')
    .max(1000),
});

/** A data cut in a list. */
export const cutSummarySchema = z.object({
  id: z.string(),
  number: z.int(),
  dataDate: z.string(),
  fileName: z.string(),
  rows: z.int(),
  sha256: z.string(),
  createdAt: z.string(),
  createdBy: z.string(),
});

/** A data set with its cuts. */
export const dataSetViewSchema = z.object({
  id: z.string(),
  name: z.string(),
  cuts: z.array(cutSummarySchema),
  codeBookNumber: z.int(),
});

/** A data cut with what it holds. */
export const cutViewSchema = cutSummarySchema.extend({
  dataSetId: z.string(),
  dataSetName: z.string(),
  profile: cutProfileSchema,
});

/** The newest code book of a data set, with its number. */
export const codeBookViewSchema = z.object({
  dataSetId: z.string(),
  number: z.int(),
  content: codeBookSchema,
});

/** A code book changed against one number of it. */
export const codeBookChangeRequestSchema = z.object({
  baseNumber: z.int(),
  content: codeBookSchema,
});

/** Which columns to count over, and which records to keep. */
export const tallyRequestSchema = z.object({
  columnIds: z.array(idSchema).min(1).max(8),
  restrictions: z
    .array(z.object({ columnId: idSchema, levelIds: z.array(idSchema).min(1) }))
    .max(20)
    .default([]),
});

/** Counts by level; cells that hold nothing are left out. */
export const tallySchema = z.object({
  axes: z.array(z.object({ columnId: z.string(), levelIds: z.array(z.string()) })),
  cells: z.array(z.object({ at: z.array(z.int()), count: z.int() })),
  counted: z.int(),
  restricted: z.int(),
  leftOut: z.array(z.object({ columnId: z.string(), reason: z.string(), count: z.int() })),
});

/** Some rows of a cut, as they stood in the file. */
export const recordsPageSchema = z.object({
  columns: z.array(z.string()),
  rows: z.array(z.array(z.string())),
  offset: z.int(),
  total: z.int(),
});

/** How a file is to be read; null lets the reader find out. */
export type ReadingOptions = z.infer<typeof readingOptionsSchema>;
/** Something odd in a column or in the file, in plain words. */
export type IntakeWarning = z.infer<typeof intakeWarningSchema>;
/** What a column holds. */
export type ColumnProfile = z.infer<typeof columnProfileSchema>;
/** What a file holds, column by column, and how it was read. */
export type CutProfile = z.infer<typeof cutProfileSchema>;
/** A file on its way to a data cut. */
export type UploadView = z.infer<typeof uploadViewSchema>;
/** The cut to make of an upload that was read. */
export type StoreCutRequest = z.infer<typeof storeCutRequestSchema>;
/** Counts typed into a grid. */
export type TypedCountsRequest = z.infer<typeof typedCountsRequestSchema>;
/** A data cut in a list. */
export type CutSummary = z.infer<typeof cutSummarySchema>;
/** A data set with its cuts. */
export type DataSetView = z.infer<typeof dataSetViewSchema>;
/** A data cut with what it holds. */
export type CutView = z.infer<typeof cutViewSchema>;
/** The newest code book of a data set, with its number. */
export type CodeBookView = z.infer<typeof codeBookViewSchema>;
/** A code book changed against one number of it. */
export type CodeBookChangeRequest = z.infer<typeof codeBookChangeRequestSchema>;
/** Some rows of a cut, as they stood in the file. */
export type RecordsPage = z.infer<typeof recordsPageSchema>;
