import type { ChartBar, GroupedBarFigure } from '#shared/layout';
import type { FigureAppearance } from './appearance';
import { axisTicks } from './axis-ticks';
import type { AxisTicks } from './axis-ticks';
import { columnGeometry } from './bar-geometry';
import type { ColumnGeometry } from './bar-geometry';
import { keyRows, keyHeight } from './figure-key';
import type { KeyRow } from './figure-key';
import { textWidth } from './text-width';
import type { FigureType } from './text-width';
import { wrapText } from './wrap-text';

/**
 * Where everything of a figure stands. It is worked out here, from the advance table, rather than
 * left to Vega, so that server and browser draw the same picture and no label is cut off.
 */
export interface FigureFrame {
  readonly geometry: ColumnGeometry;
  readonly plotHeight: number;
  readonly padding: Readonly<Record<'left' | 'right' | 'top' | 'bottom', number>>;
  readonly ticks: AxisTicks;
  readonly valueTitle: readonly string[];
  readonly categoryTitle: readonly string[];
  readonly categoryLines: readonly (readonly string[])[];
  readonly printsValues: boolean;
  /** Whether each bar's n stands below it; otherwise the category labels carry the notes. */
  readonly countsUnderBars: boolean;
  readonly keyRows: readonly KeyRow[];
  readonly lineHeight: number;
}

/** More bars than this go without printed values. */
export const MOST_BARS_WITH_VALUES = 12;

/** Room between the plot and what stands beside it. */
export const GAP = 6;

/** Works out the frame of a figure. */
export function figureFrame(figure: GroupedBarFigure, appearance: FigureAppearance): FigureFrame {
  const type = regular(appearance);
  const lineHeight = Math.round(appearance.fontSize * 1.3);
  const plotHeight = appearance.plotHeight ?? heightFor(appearance.width);
  const ticks = ticksOf(figure, plotHeight, lineHeight);
  const valueTitle = wrapText(figure.valueLabel, appearance.width, type);
  const left = tickWidth(figure, ticks, type) + GAP;
  const geometry = columnGeometry(figure, appearance.width - left - GAP);
  const below = labelsBelow(figure, geometry, type);
  const rows = keyRows(figure, appearance);
  return {
    geometry,
    plotHeight,
    padding: {
      left,
      right: GAP,
      top: keyHeight(rows, lineHeight) + (valueTitle.length + 0.5) * lineHeight,
      bottom: heightBelow(below, lineHeight),
    },
    ticks,
    valueTitle,
    ...below,
    printsValues: printsValues(figure, geometry, type),
    keyRows: rows,
    lineHeight,
  };
}

/** The type of labels. */
export function regular({ fontSize }: Pick<FigureAppearance, 'fontSize'>): FigureType {
  return { sizeInPixels: fontSize, weight: 'regular' };
}

/** The figures of a bar as the axis counts them. */
export function scaled(value: number | null, { valueScale }: GroupedBarFigure): number | null {
  return value === null ? null : value * valueScale;
}

function heightFor(width: number): number {
  return Math.round(Math.min(320, Math.max(150, width * 0.36)));
}

function ticksOf(figure: GroupedBarFigure, plotHeight: number, lineHeight: number): AxisTicks {
  const highest = Math.max(
    0,
    ...figure.bars.map((bar) => (bar.upper ?? bar.value ?? 0) * figure.valueScale),
  );
  const room = figure.showValues ? plotHeight / Math.max(1, plotHeight - lineHeight) : 1;
  return axisTicks(highest * room, figure.valueScale);
}

/** A tick as it prints, with the figure's decimal mark. */
export function tickText(tick: number, ticks: AxisTicks, figure: GroupedBarFigure): string {
  return tick.toFixed(ticks.decimals).replace('.', figure.decimalMark);
}

function tickWidth(figure: GroupedBarFigure, ticks: AxisTicks, type: FigureType): number {
  const widths = ticks.values.map((tick) => textWidth(tickText(tick, ticks, figure), type));
  return Math.ceil(Math.max(...widths));
}

type LabelsBelow = Pick<FigureFrame, 'categoryLines' | 'categoryTitle' | 'countsUnderBars'>;

function labelsBelow(
  figure: GroupedBarFigure,
  geometry: ColumnGeometry,
  type: FigureType,
): LabelsBelow {
  const countsUnderBars = figure.bars.every(
    (bar) => textWidth(bar.totalText, type) <= countRoom(geometry),
  );
  const width = geometry.categoryWidth - GAP;
  return {
    countsUnderBars,
    categoryLines: figure.categories.map(({ label, note }) => [
      ...wrapText(label, width, type),
      ...(countsUnderBars ? [] : wrapText(note, width, type)),
    ]),
    categoryTitle: wrapText(figure.categoriesLabel, geometry.plotWidth, type),
  };
}

function countRoom({ barWidth, barPadding }: ColumnGeometry): number {
  return barWidth / (1 - barPadding) - 2;
}

function heightBelow(below: LabelsBelow, lineHeight: number): number {
  const counts = below.countsUnderBars ? 1 : 0;
  const labels = Math.max(1, ...below.categoryLines.map((lines) => lines.length));
  return (counts + labels + below.categoryTitle.length) * lineHeight + 2 * GAP;
}

/** Values that would run into each other are left out; the table behind the figure has them. */
function printsValues(
  figure: GroupedBarFigure,
  geometry: ColumnGeometry,
  type: FigureType,
): boolean {
  const room = geometry.barWidth / (1 - geometry.barPadding);
  const fits = (bar: ChartBar): boolean => textWidth(bar.valueText, type) <= room;
  return (
    figure.showValues &&
    figure.bars.length <= MOST_BARS_WITH_VALUES &&
    figure.bars.every((bar) => bar.value === null || fits(bar))
  );
}
