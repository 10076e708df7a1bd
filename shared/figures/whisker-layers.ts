import { columnChannels } from './bar-layers';
import { scaled } from './figure-frame';
import type { FigureLayer, SpecParts } from './spec-parts';

/** Length of the bars that close a whisker. */
const CAP = 8;

/** The base line and the whiskers, each cased in the page's colour so that it shows on any fill. */
export function whiskerLayers(parts: SpecParts): readonly FigureLayer[] {
  const { colours, appearance } = parts;
  const weight = appearance.lineWidth * 1.3;
  const data = { values: whiskers(parts) };
  return [
    baseLine(parts),
    ...whiskerMarks(parts, data, colours.page, weight + 2.2),
    ...whiskerMarks(parts, data, colours.ink, weight),
  ];
}

interface Whisker {
  readonly categoryId: string;
  readonly groupId: string;
  readonly lower: number;
  readonly upper: number;
}

function whiskers({ figure }: SpecParts): Whisker[] {
  return figure.bars.flatMap(({ categoryId, groupId, ...bar }) => {
    const lower = scaled(bar.lower, figure);
    const upper = scaled(bar.upper, figure);
    return lower === null || upper === null ? [] : [{ categoryId, groupId, lower, upper }];
  });
}

function whiskerMarks(
  parts: SpecParts,
  data: { values: Whisker[] },
  color: string,
  width: number,
): readonly FigureLayer[] {
  const channels = columnChannels(parts);
  const cap = (field: 'lower' | 'upper'): FigureLayer => ({
    data,
    mark: {
      type: 'tick',
      orient: 'horizontal',
      color,
      opacity: 1,
      thickness: width,
      size: CAP + (width > 2.5 ? 2.2 : 0),
    },
    encoding: { ...channels, y: { field, type: 'quantitative' } },
  });
  const stem: FigureLayer = {
    data,
    mark: { type: 'rule', color, opacity: 1, strokeWidth: width },
    encoding: {
      ...channels,
      y: { field: 'lower', type: 'quantitative' },
      y2: { field: 'upper' },
    },
  };
  return [stem, cap('lower'), cap('upper')];
}

function baseLine({ frame, colours, appearance }: SpecParts): FigureLayer {
  return {
    data: { values: [{ fromX: 0, toX: frame.geometry.plotWidth, atY: frame.plotHeight }] },
    mark: { type: 'rule', color: colours.ink, strokeWidth: appearance.lineWidth },
    encoding: {
      x: { field: 'fromX', type: 'quantitative', scale: null },
      x2: { field: 'toX' },
      y: { field: 'atY', type: 'quantitative', scale: null },
    },
  };
}
