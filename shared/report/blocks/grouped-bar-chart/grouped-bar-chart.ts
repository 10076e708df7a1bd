import * as z from 'zod/mini';
import type { BlockField } from '../block-field';
import type { BlockKind } from '../block-kind';
import { contentParser, idSchema, lineSchema } from '../content-schema';
import { analysisIdsIn } from '../inline-context';
import { composeGroupedBarChart } from './compose-chart';
import type { GroupedBarChartContent } from './content';

/** A grouped bar chart. */
export const GROUPED_BAR_CHART: BlockKind<GroupedBarChartContent> = {
  id: 'groupedBarChart',
  label: 'Grouped bar chart',
  description: 'Risks of one analysis with their intervals, as bars by level and stratum.',
  rights: 'numbers',
  needsAnalysis: true,
  fields: fields(),
  editableText: null,
  parseContent: contentParser<GroupedBarChartContent>(
    z.object({
      schemaVersion: z.literal(1),
      analysisId: z.nullable(idSchema),
      caption: z.nullable(lineSchema),
      showValues: z.boolean(),
    }),
  ),
  emptyContent: ({ analysis }) => ({
    schemaVersion: 1,
    analysisId: analysis?.analysisId ?? null,
    caption: null,
    showValues: true,
  }),
  analysisIdsOf: (content) => analysisIdsIn(content.caption, content.analysisId),
  compose: composeGroupedBarChart,
};

function fields(): readonly BlockField[] {
  return [
    { kind: 'analysis', path: 'analysisId', label: 'Analysis' },
    {
      kind: 'text',
      path: 'caption',
      label: 'Caption',
      paragraphs: 'one',
      optional: true,
      hint: 'Made from the analysis',
    },
    { kind: 'toggle', path: 'showValues', label: 'Values over the bars' },
  ];
}
