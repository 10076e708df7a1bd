import type { PValueChoice } from './p-values';
import type { TextDocument } from '../../text/text-document';

/** Which columns and rows a table may show; the framing and the design choose among them. */
export interface TableChoice {
  readonly risk: boolean;
  readonly riskDifference: boolean;
  readonly riskRatio: boolean;
  readonly oddsRatio: boolean;
  readonly crude: boolean;
  readonly pooled: boolean;
  readonly trend: boolean;
  /** Adjusted estimates that models outside computed, in columns of their own. */
  readonly outside?: boolean;
}

/**
 * Content of a stratified table. A null `title` is made from the analysis. `auto` puts up to two
 * strata side by side when the columns fit a portrait page, and stacks them otherwise.
 */
export interface StratifiedTableContent {
  readonly schemaVersion: 1;
  readonly analysisId: string | null;
  readonly title: TextDocument | null;
  readonly show: TableChoice;
  /** P-values of the contrasts, in a column of each layer; left out, there are none. */
  readonly pValues?: PValueChoice | undefined;
  readonly layout: 'auto' | 'sideBySide' | 'stacked';
}
