import type { HouseStyle } from '#shared/house-style';
import type { TableElement } from '#shared/layout';
import { columnNeeds, type ColumnNeed } from '../../table-measure';
import { textWidthInPoints, type Orientation } from './page-setup';

/** How the panels of a table are set: which way up their page is, and the size of their type. */
export interface TableSetting {
  readonly orientation: Orientation;
  readonly sizeInPoints: number;
}

/** The free room at either side of a cell, in points. */
export const CELL_MARGIN = 3;

/**
 * Sets the panels of a table alike, so that no number and no word breaks: upright where that fits,
 * else on a page that lies on its side, else in smaller type. Null where nothing fits.
 */
export function settingOf(panels: readonly TableElement[], style: HouseStyle): TableSetting | null {
  const fitting = settingsOf(style).find((setting) =>
    panels.every((panel) => {
      const needs = columnNeeds(panel, setting.sizeInPoints);
      return spareOf(needs, setting, style) >= 0;
    }),
  );
  return fitting ?? null;
}

/** The setting that takes most: what does not fit under it either has to wrap. */
export function tightestSetting(style: HouseStyle): TableSetting {
  return settingsOf(style).at(-1) as TableSetting;
}

/** The widths of a table's columns under a setting, in points, margins of cells included. */
export function columnWidths(
  table: TableElement,
  setting: TableSetting,
  style: HouseStyle,
): readonly number[] {
  const needs = columnNeeds(table, setting.sizeInPoints);
  const spare = spareOf(needs, setting, style);
  const widths = spare < 0 ? squeezed(needs, spare) : widened(needs, spare);
  return widths.map((width) => width + 2 * CELL_MARGIN);
}

/** Type is made smaller by so many points before a table is split. */
const SMALLER = [0, 0.5, 1, 1.5] as const;

const SMALLEST = 7;

function settingsOf({ page }: HouseStyle): readonly TableSetting[] {
  const sizes = SMALLER.map((step) => page.tableSizeInPoints - step);
  return [
    { orientation: 'portrait', sizeInPoints: page.tableSizeInPoints },
    ...sizes
      .filter((size) => size >= SMALLEST)
      .map((sizeInPoints) => ({ orientation: 'landscape', sizeInPoints }) as const),
  ];
}

/** What is left of the page's width when every column has what it needs; negative if too little. */
function spareOf(needs: readonly ColumnNeed[], setting: TableSetting, style: HouseStyle): number {
  const margins = 2 * CELL_MARGIN * needs.length;
  return textWidthInPoints(style, setting.orientation) - margins - leastOf(needs);
}

/**
 * First the labels get what keeps them on one line, up to a share; the rest goes to all alike, but
 * not so much that the eye loses the row.
 */
function widened(needs: readonly ColumnNeed[], spare: number): readonly number[] {
  const [labels] = needs;
  const wanted = labels === undefined ? 0 : labels.most - labels.least;
  const forLabels = Math.min(wanted, spare * LABELS_FIRST);
  const each = Math.min(WIDEST_GAP, (spare - forLabels) / Math.max(1, needs.length));
  return needs.map(({ least }, index) => least + each + (index === 0 ? forLabels : 0));
}

const LABELS_FIRST = 0.8;
const WIDEST_GAP = 48;

function squeezed(needs: readonly ColumnNeed[], spare: number): readonly number[] {
  const least = leastOf(needs);
  return needs.map((need) => (need.least * (least + spare)) / least);
}

function leastOf(needs: readonly ColumnNeed[]): number {
  return needs.reduce((total, { least }) => total + least, 0);
}
