import { ADJUSTMENTS } from '#shared/stats';
import * as z from 'zod/mini';
import type { BlockField } from '../block-field';
import type { BlockKind, EmptyContentContext } from '../block-kind';
import { contentParser, idSchema, lineSchema } from '../content-schema';
import { analysisIdsIn } from '../inline-context';
import { composeStratifiedTable } from './compose-table';
import { P_VALUE_CHOICES, type PValueChoice } from './p-values';
import type { StratifiedTableContent } from './content';

/** A stratified table. */
export const STRATIFIED_TABLE: BlockKind<StratifiedTableContent> = {
  id: 'stratifiedTable',
  label: 'Stratified table',
  description: 'Counts, risks and effects of one analysis, by level and stratum.',
  rights: 'numbers',
  needsAnalysis: true,
  fields: fields(),
  editableText: null,
  parseContent: contentParser<StratifiedTableContent>(
    z.object({
      schemaVersion: z.literal(1),
      analysisId: z.nullable(idSchema),
      title: z.nullable(lineSchema),
      show: z.object({
        risk: z.boolean(),
        riskDifference: z.boolean(),
        riskRatio: z.boolean(),
        oddsRatio: z.boolean(),
        crude: z.boolean(),
        pooled: z.boolean(),
        trend: z.boolean(),
        outside: z.optional(z.boolean()),
      }),
      pValues: z.optional(z.enum(P_VALUE_CHOICES)),
      layout: z.enum(['auto', 'sideBySide', 'stacked']),
    }),
  ),
  emptyContent,
  analysisIdsOf: (content) => analysisIdsIn(content.title, content.analysisId),
  compose: composeStratifiedTable,
};

function emptyContent({ analysis }: EmptyContentContext): StratifiedTableContent {
  return {
    schemaVersion: 1,
    analysisId: analysis?.analysisId ?? null,
    title: null,
    show: {
      risk: true,
      riskDifference: true,
      riskRatio: true,
      oddsRatio: analysis?.result.frame.design === 'caseControl',
      crude: false,
      pooled: analysis?.result.specification.adjustment === 'mantelHaenszel',
      outside: (analysis?.outside?.length ?? 0) > 0,
      trend: analysis?.result.frame.exposure.ordered ?? false,
    },
    pValues: 'none',
    layout: 'auto',
  };
}

function fields(): readonly BlockField[] {
  return [
    { kind: 'analysis', path: 'analysisId', label: 'Analysis' },
    {
      kind: 'text',
      path: 'title',
      label: 'Title',
      paragraphs: 'one',
      optional: true,
      hint: 'Made from the analysis',
    },
    { kind: 'toggle', path: 'show.risk', label: 'Risks' },
    { kind: 'toggle', path: 'show.riskDifference', label: 'Differences' },
    { kind: 'toggle', path: 'show.riskRatio', label: 'Ratios' },
    { kind: 'toggle', path: 'show.oddsRatio', label: 'Odds ratios' },
    { kind: 'toggle', path: 'show.crude', label: 'All strata together, crude' },
    { kind: 'toggle', path: 'show.pooled', label: 'Adjusted for the strata' },
    { kind: 'toggle', path: 'show.outside', label: 'Adjusted, computed elsewhere' },
    { kind: 'toggle', path: 'show.trend', label: 'Trend in the notes' },
    {
      kind: 'choice',
      path: 'pValues',
      label: 'P-values',
      options: P_VALUE_CHOICES.map((value) => ({ value, label: pValueLabel(value) })),
    },
    {
      kind: 'choice',
      path: 'layout',
      label: 'Strata',
      options: [
        { value: 'auto', label: 'As they fit' },
        { value: 'sideBySide', label: 'Side by side' },
        { value: 'stacked', label: 'One below the other' },
      ],
    },
  ];
}

function pValueLabel(choice: PValueChoice): string {
  switch (choice) {
    case 'none':
      return 'Not shown';
    case 'unadjusted':
      return 'As they are';
    default:
      return ADJUSTMENTS[choice].label;
  }
}
