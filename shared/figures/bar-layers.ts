import { scaled } from './figure-frame';
import { groupLooks } from './group-looks';
import type { FigureLayer, SpecParts } from './spec-parts';

/** The bars on their axes; a bar without a value leaves its place empty. */
export function barLayers(parts: SpecParts): readonly FigureLayer[] {
  const { figure, appearance, colours } = parts;
  const looks = groupLooks(figure, appearance);
  const values = figure.bars.flatMap((bar) => {
    const value = scaled(bar.value, figure);
    const fill = looks.find((look) => look.groupId === bar.groupId)?.fill ?? colours.page;
    const { categoryId, groupId } = bar;
    return value === null ? [] : [{ categoryId, groupId, value, fill }];
  });
  return [
    {
      data: { values },
      mark: { type: 'bar', stroke: colours.ink, strokeWidth: appearance.lineWidth },
      encoding: {
        ...columnChannels(parts),
        y: { field: 'value', type: 'quantitative', ...valueAxis(parts) },
        fill: { field: 'fill', type: 'nominal', scale: null },
      },
    },
  ];
}

interface BandChannel<Field extends string> {
  readonly field: Field;
  readonly type: 'nominal';
  readonly scale: { domain: string[]; paddingInner: number; paddingOuter: number };
}

interface ColumnChannels {
  readonly x: BandChannel<'categoryId'> & { readonly axis: null };
  readonly xOffset: BandChannel<'groupId'>;
}

/** The channels that put a mark on the middle of its bar. */
export function columnChannels({ figure, frame }: SpecParts): ColumnChannels {
  const { categoryPadding, barPadding } = frame.geometry;
  const outer = categoryPadding / 2;
  return {
    x: {
      field: 'categoryId',
      type: 'nominal',
      axis: null,
      scale: {
        domain: figure.categories.map(({ id }) => id),
        paddingInner: categoryPadding,
        paddingOuter: outer,
      },
    },
    xOffset: {
      field: 'groupId',
      type: 'nominal',
      scale: {
        domain: figure.groups.map(({ id }) => id),
        paddingInner: barPadding,
        paddingOuter: 0,
      },
    },
  };
}

interface ValueAxis {
  readonly scale: { domain: number[]; nice: false; zero: true };
  readonly axis: {
    title: null;
    values: number[];
    format: string;
    labelExpr: string;
    labelPadding: number;
    labelOverlap: false;
    domain: false;
    ticks: false;
    grid: true;
    gridColor: string;
    gridWidth: number;
  };
}

function valueAxis({ frame, colours, figure }: SpecParts): ValueAxis {
  const { values, decimals } = frame.ticks;
  return {
    scale: { domain: [0, values.at(-1) ?? 1], nice: false, zero: true },
    axis: {
      title: null,
      values: [...values],
      format: `.${String(decimals)}f`,
      labelExpr: DECIMAL_MARKS[figure.decimalMark],
      labelPadding: 6,
      labelOverlap: false,
      domain: false,
      ticks: false,
      grid: true,
      gridColor: colours.line,
      gridWidth: 1,
    },
  };
}

/** Fixed expressions; nothing of a figure's words goes into them. */
const DECIMAL_MARKS = {
  '.': 'datum.label',
  ',': "replace(datum.label, '.', ',')",
  '·': "replace(datum.label, '.', '·')",
} as const;
