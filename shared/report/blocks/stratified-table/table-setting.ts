import type { AnalysisResult } from '#shared/analysis';
import type { PrintedDecimals } from '#shared/format';
import type { HouseStyle } from '#shared/house-style';
import type { TablePValues } from './p-values';
import type { ColumnHeads, OutsideColumn, Phrasebook } from '#shared/wording';

/** What every cell of a table is printed under. */
export interface TableSetting {
  readonly blockId: string;
  readonly analysisId: string;
  readonly result: AnalysisResult;
  readonly decimals: PrintedDecimals;
  readonly heads: ColumnHeads;
  /** Estimates from elsewhere, a column for each measure of each model. */
  readonly outside: readonly OutsideColumn[];
  /** Those columns, and what is about all levels together and so stands in the notes only. */
  readonly outsideNoted: readonly OutsideColumn[];
  /** What the column of p-values prints; null without one. */
  readonly pValues: TablePValues | null;
  readonly houseStyle: HouseStyle;
  readonly phrasebook: Phrasebook;
}
