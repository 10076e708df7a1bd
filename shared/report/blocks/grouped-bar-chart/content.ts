import type { TextDocument } from '../../text/text-document';

/**
 * Content of a grouped bar chart. A null `caption` is made from the analysis. Values are printed
 * over the bars when `showValues` is set and there are at most twelve bars.
 */
export interface GroupedBarChartContent {
  readonly schemaVersion: 1;
  readonly analysisId: string | null;
  readonly caption: TextDocument | null;
  readonly showValues: boolean;
}
