import type { ValueAddress } from '#shared/analysis';
import type { ChartBar, FigureModel } from '#shared/layout';

/** A bar of a figure as a row of words. */
export interface FigureRow {
  readonly key: string;
  readonly category: string;
  readonly group: string;
  readonly counts: string;
  readonly value: string;
  readonly limits: string;
}

/** The numbers of a figure, a row for each bar in the order of the chart. */
export function figureRows(
  figure: FigureModel,
  textOf: (address: ValueAddress) => string,
): readonly FigureRow[] {
  const categories = new Map(figure.categories.map(({ id, label }) => [id, label]));
  const groups = new Map(figure.groups.map(({ id, label }) => [id, label]));
  return figure.bars.map((bar) => ({
    key: `${bar.categoryId} ${bar.groupId}`,
    category: categories.get(bar.categoryId) ?? '',
    group: groups.get(bar.groupId) ?? '',
    counts: `${String(bar.events)}/${bar.totalText}`,
    value: bar.valueText,
    limits: limitsOf(bar, textOf),
  }));
}

/** The limits stand beside the value that the bar draws, under the same analysis and style. */
function limitsOf(
  { addresses, lower, upper }: ChartBar,
  textOf: (address: ValueAddress) => string,
): string {
  const value = addresses.find(({ quantity }) => quantity !== 'events' && quantity !== 'total');
  if (value === undefined || lower === null || upper === null) return '';
  return `(${textOf({ ...value, facet: 'lower' })} to ${textOf({ ...value, facet: 'upper' })})`;
}
