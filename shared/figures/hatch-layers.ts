import type { ChartBar } from '#shared/layout';
import { barBox } from './bar-geometry';
import type { BarBox } from './bar-geometry';
import { scaled } from './figure-frame';
import { groupLooks } from './group-looks';
import type { GroupLook } from './group-looks';
import { diagonalLines, dotRows } from './hatching';
import type { Hatching } from './hatching';
import { heightOf, pixels } from './spec-parts';
import type { FigureLayer, SpecParts } from './spec-parts';

/** Hatching over the bars of the groups that have one. */
export function barHatching(parts: SpecParts): readonly FigureLayer[] {
  const looks = groupLooks(parts.figure, parts.appearance);
  return looks.flatMap((look) => hatchLayers(look, boxesOf(look, parts)));
}

/** The hatching of a look over these boxes, in pixels of the plot. */
export function hatchLayers(look: GroupLook, boxes: readonly BarBox[]): readonly FigureLayer[] {
  return HATCHING_LAYERS[look.hatching](look.hatchInk, boxes);
}

const HATCHING_LAYERS: Readonly<
  Record<Hatching, (ink: string, boxes: readonly BarBox[]) => readonly FigureLayer[]>
> = {
  solid: () => [],
  open: () => [],
  diagonal: (ink, boxes) => [
    {
      data: { values: boxes.flatMap(diagonalLines) },
      mark: { type: 'rule', color: ink, strokeWidth: 1 },
      encoding: {
        x: pixels('fromX'),
        y: pixels('fromY'),
        x2: { field: 'toX' },
        y2: { field: 'toY' },
      },
    },
  ],
  dots: (ink, boxes) => [
    {
      data: { values: boxes.flatMap(dotRows) },
      mark: { type: 'circle', color: ink, size: 3.5, opacity: 1 },
      encoding: { x: pixels('atX'), y: pixels('atY') },
    },
  ],
};

function boxesOf(look: GroupLook, parts: SpecParts): readonly BarBox[] {
  const { figure, frame } = parts;
  const height = heightOf(parts);
  const ofGroup = (bar: ChartBar): boolean => bar.groupId === look.groupId && bar.value !== null;
  return figure.bars
    .filter(ofGroup)
    .map((bar) =>
      barBox({ ...bar, value: scaled(bar.value, figure) }, figure, frame.geometry, height),
    );
}
