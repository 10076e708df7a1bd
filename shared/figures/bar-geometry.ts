import type { ChartBar, GroupedBarFigure } from '#shared/layout';

/** Where the columns of bars stand on the x axis, in pixels of the plot. */
export interface ColumnGeometry {
  readonly plotWidth: number;
  /** Share of a category's width that stays free between categories, 0..1. */
  readonly categoryPadding: number;
  /** Share of a bar's place that stays free between bars of one category, 0..1. */
  readonly barPadding: number;
  readonly categoryWidth: number;
  readonly barWidth: number;
}

/** The rectangle of a bar in the plot, `top` above `bottom`. */
export interface BarBox {
  readonly left: number;
  readonly right: number;
  readonly top: number;
  readonly bottom: number;
}

const WIDEST_BAR = 56;
const BAR_PADDING = 0.08;

/** Lays the columns out: gaps between categories are never narrower than half a bar. */
export function columnGeometry(figure: GroupedBarFigure, plotWidth: number): ColumnGeometry {
  const groups = Math.max(1, figure.groups.length);
  const categoryWidth = plotWidth / Math.max(1, figure.categories.length);
  const forGap = Math.max(0.3, 1 / (2 * groups + 1));
  const forWidth = 1 - (WIDEST_BAR * groups) / categoryWidth;
  const categoryPadding = Math.max(forGap, forWidth);
  const barPadding = groups === 1 ? 0 : BAR_PADDING;
  const barStep = (categoryWidth * (1 - categoryPadding)) / (groups - barPadding);
  const barWidth = barStep * (1 - barPadding);
  return { plotWidth, categoryPadding, barPadding, categoryWidth, barWidth };
}

/** The rectangle that a bar fills, for hatching; empty where it has no value. */
export function barBox(
  bar: ChartBar,
  figure: GroupedBarFigure,
  geometry: ColumnGeometry,
  height: (value: number) => number,
): BarBox {
  const category = figure.categories.findIndex(({ id }) => id === bar.categoryId);
  const group = figure.groups.findIndex(({ id }) => id === bar.groupId);
  const inset = (geometry.categoryWidth * geometry.categoryPadding) / 2;
  const step = geometry.barWidth / (1 - geometry.barPadding);
  const left = category * geometry.categoryWidth + inset + group * step;
  return {
    left,
    right: left + geometry.barWidth,
    top: height(bar.value ?? 0),
    bottom: height(0),
  };
}
