import type { NumberStyle } from '#shared/house-style';
import type { ChartBar, FigureElement, GroupedBarFigure } from '#shared/layout';
import { displayedNumber } from './displayed-number';
import {
  cellsRow,
  emptyCell,
  lookingLike,
  numberCell,
  paragraphRow,
  words,
  type SheetCell,
  type SheetPlan,
  type SheetRow,
} from './sheet-plan';

/** The numbers behind a figure as a sheet, a bar a row. */
export function figureSheet(element: FigureElement, style: NumberStyle): SheetPlan {
  const { caption, figure, altText, notes } = element;
  const name = `${caption.label} ${String(caption.number)}`;
  return {
    name,
    rows: [
      paragraphRow([{ text: `${name}. ` }, ...caption.runs], true),
      headRow(figure),
      ...figure.bars.map((bar, index) =>
        barRow(bar, figure, style, index === figure.bars.length - 1),
      ),
      ...notes.map((note) => paragraphRow(note)),
      paragraphRow([{ text: altText }]),
    ],
    widestColumn: 190,
    headRows: { first: 2, last: 2 },
    frozenColumns: 0,
    filtered: false,
  };
}

function headRow({ categoriesLabel, groupsLabel, valueLabel }: GroupedBarFigure): SheetRow {
  const heads = [categoriesLabel, groupsLabel ?? 'Group'].map((text) => words(text));
  const numbers = ['n', 'N', valueLabel, 'Lower limit', 'Upper limit'];
  return cellsRow(
    lookingLike([...heads, ...numbers.map((text) => words(text, { align: 'end' }))], {
      bold: true,
      wraps: true,
      top: 'medium',
      bottom: 'thin',
    }),
  );
}

function barRow(
  bar: ChartBar,
  figure: GroupedBarFigure,
  style: NumberStyle,
  isLast: boolean,
): SheetRow {
  const category = figure.categories.find(({ id }) => id === bar.categoryId);
  const group = figure.groups.find(({ id }) => id === bar.groupId);
  const cells = [
    words(category?.label ?? ''),
    words(group?.label ?? ''),
    countCell(bar.events, style),
    countCell(bar.total, style),
    bar.value === null
      ? words(bar.valueText, { align: 'end' })
      : printedCell(bar.value, bar, figure, style),
    limitCell(bar.lower, bar, figure, style),
    limitCell(bar.upper, bar, figure, style),
  ];
  return cellsRow(isLast ? lookingLike(cells, { bottom: 'medium' }) : cells);
}

function countCell(count: number, style: NumberStyle): SheetCell {
  const form = { value: count, scale: 1, decimals: 0, signed: false, text: String(count) };
  const { value, format } = displayedNumber(form, style);
  return numberCell(value, format);
}

/** The value shows the digits that stand over its bar. */
function printedCell(
  value: number,
  bar: ChartBar,
  figure: GroupedBarFigure,
  style: NumberStyle,
): SheetCell {
  const form = {
    value,
    scale: figure.valueScale,
    decimals: decimalsOf(bar, figure),
    signed: false,
    text: bar.valueText,
  };
  const shown = displayedNumber(form, style);
  return numberCell(shown.value, shown.format);
}

function limitCell(
  limit: number | null,
  bar: ChartBar,
  figure: GroupedBarFigure,
  style: NumberStyle,
): SheetCell {
  if (limit === null) return emptyCell();
  const decimals = decimalsOf(bar, figure);
  const text = (limit * figure.valueScale).toFixed(decimals);
  const form = { value: limit, scale: figure.valueScale, decimals, signed: false, text };
  const shown = displayedNumber(form, style);
  return numberCell(shown.value, shown.format);
}

function decimalsOf({ valueText }: ChartBar, { decimalMark }: GroupedBarFigure): number {
  return valueText.split(decimalMark)[1]?.length ?? 0;
}
