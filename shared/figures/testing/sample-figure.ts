import type { ChartBar, GroupedBarFigure } from '#shared/layout';

/** Counts of one invented bar. */
export interface SampleBar {
  readonly events: number;
  readonly total: number;
  readonly lower: number;
  readonly upper: number;
}

/** An invented figure: one bar for each category and group, from the counts given. */
export function sampleFigure(
  categories: readonly string[],
  groups: readonly string[],
  counts: readonly (readonly SampleBar[])[],
): GroupedBarFigure {
  return {
    kind: 'groupedBars',
    categories: categories.map((label, index) => ({
      id: `c${String(index)}`,
      label,
      note: `n\u00a0=\u00a0${(counts[index] ?? []).map(({ total }) => total).join('; ')}`,
    })),
    groups: groups.map((label, index) => ({ id: `g${String(index)}`, label })),
    groupsLabel: groups.length > 1 ? 'Workplace' : null,
    categoriesLabel: 'Wet work per shift',
    valueLabel: 'Risk of new hand eczema within 12 months, %',
    valueScale: 100,
    decimalMark: '.',
    bars: counts.flatMap((row, category) =>
      row.map((bar, group) => chartBar(bar, `c${String(category)}`, `g${String(group)}`)),
    ),
    showValues: true,
    ordered: false,
  };
}

function chartBar(bar: SampleBar, categoryId: string, groupId: string): ChartBar {
  const value = bar.total === 0 ? null : bar.events / bar.total;
  return {
    ...bar,
    categoryId,
    groupId,
    totalText: String(bar.total),
    value,
    lower: value === null ? null : bar.lower,
    upper: value === null ? null : bar.upper,
    valueText: value === null ? '…' : (value * 100).toFixed(1),
    addresses: [],
  };
}
