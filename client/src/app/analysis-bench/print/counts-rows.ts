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
  /** Which of the two counts makes the level's expected counts small; null where neither does. */
  readonly sparse: 'with' | 'without' | null;
}

/** One exposure level across the layers. */
export interface CountRow {
  readonly levelId: string;
  readonly label: string;
  readonly isReference: boolean;
  readonly cells: readonly CountCell[];
}

/** Levels under one head: all of a table, or those of one stratum. */
export interface CountGroup {
  readonly name: string | null;
  readonly rows: readonly CountRow[];
}

/**
 * The counts of an analysis: up to two strata beside each other, more below each other, each a
 * group of rows. `layers` names what stands across.
 */
export interface CountsTable {
  readonly layers: readonly string[];
  readonly groups: readonly CountGroup[];
  readonly totals: readonly CountCell[];
}

const MOST_BESIDE = 2;

/** Lays the counts of a result out. */
export function countsTable(print: BenchPrint): CountsTable {
  const { crude, strata } = print.result;
  if (strata.length > MOST_BESIDE) {
    const groups = strata.map((layer) => ({
      name: layerName(print.result, layer.stratumId),
      rows: rowsOf(print, [layer]),
    }));
    return { layers: [layerName(print.result, null)], groups, totals: totalsOf(print, [crude]) };
  }
  const layers = strata.length === 0 ? [crude] : strata;
  return {
    layers: layers.map(({ stratumId }) => layerName(print.result, stratumId)),
    groups: [{ name: null, rows: rowsOf(print, layers) }],
    totals: totalsOf(print, layers),
  };
}

function rowsOf(print: BenchPrint, layers: readonly LayerResult[]): readonly CountRow[] {
  const { exposure } = print.result.frame;
  return exposure.levels.map(({ id, label }) => ({
    levelId: id,
    label,
    isReference: id === exposure.referenceLevelId,
    cells: layers.map((layer) => cellOf(print, layer, id)),
  }));
}

function totalsOf(print: BenchPrint, layers: readonly LayerResult[]): readonly CountCell[] {
  return layers.map(({ total }) => countCell(print, total));
}

function cellOf(print: BenchPrint, layer: LayerResult, levelId: string): CountCell {
  const level = layer.levels.find((candidate) => candidate.levelId === levelId);
  const count = level?.count ?? { events: 0, total: 0 };
  const cell = countCell(print, count);
  if (!isSparse(print.result, layer, levelId)) return cell;
  return { ...cell, sparse: count.events * 2 <= count.total ? 'with' : 'without' };
}

function countCell(print: BenchPrint, count: GroupCount): CountCell {
  const { style, decimals, result } = print;
  const givesRisk = result.frame.design !== 'caseControl';
  return {
    with: formatCount(count.events, style).text,
    without: formatCount(count.total - count.events, style).text,
    risk: givesRisk
      ? (formatShare(count, decimals.percent, style)?.text ?? style.table.missingCell.mark)
      : null,
    sparse: null,
  };
}
