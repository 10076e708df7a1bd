import type { LayerResult } from '#shared/analysis';
import { formatCount, formatShare } from '#shared/format';
import type { GroupCount } from '#shared/stats';
import { layerName } from '../bench/result-scopes';
import type { BenchPrint } from './bench-print';
import { isSparse } from './sparse-places';

/** A layer's counts of one level: with and without the event, and the risk where there is one. */
export interface CountCell {
  readonly with: string;
  readonly without: string;
  /** Null where the design gives no risk; a mark where nobody is in the group. */
  readonly risk: string | null;
  readonly isSparse: boolean;
}

/** One exposure level across the layers. */
export interface CountRow {
  readonly levelId: string;
  readonly label: string;
  readonly isReference: boolean;
  readonly cells: readonly CountCell[];
}

/** A table of counts over some layers. */
export interface CountsTable {
  readonly layers: readonly string[];
  readonly rows: readonly CountRow[];
  readonly totals: readonly CountCell[];
}

/** The counts of layers beside each other. */
export function countsTable(print: BenchPrint, layers: readonly LayerResult[]): CountsTable {
  const { exposure } = print.result.frame;
  return {
    layers: layers.map((layer) => layerName(print.result, layer.stratumId)),
    rows: exposure.levels.map(({ id, label }) => ({
      levelId: id,
      label,
      isReference: id === exposure.referenceLevelId,
      cells: layers.map((layer) => cellOf(print, layer, id)),
    })),
    totals: layers.map(({ total }) => countCell(print, total, false)),
  };
}

function cellOf(print: BenchPrint, layer: LayerResult, levelId: string): CountCell {
  const level = layer.levels.find((candidate) => candidate.levelId === levelId);
  const count = level?.count ?? { events: 0, total: 0 };
  return countCell(print, count, isSparse(print.result, layer, levelId));
}

function countCell(print: BenchPrint, count: GroupCount, isSparse: boolean): CountCell {
  const { style, decimals, result } = print;
  const givesRisk = result.frame.design !== 'caseControl';
  return {
    with: formatCount(count.events, style).text,
    without: formatCount(count.total - count.events, style).text,
    risk: givesRisk
      ? (formatShare(count, decimals.percent, style)?.text ?? style.table.missingCell.mark)
      : null,
    isSparse,
  };
}
