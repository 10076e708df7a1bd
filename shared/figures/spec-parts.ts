import type { TopLevelSpec } from 'vega-lite';
import type { GroupedBarFigure } from '#shared/layout';
import type { FigureAppearance } from './appearance';
import type { FigureColours } from './figure-colours';
import type { FigureFrame } from './figure-frame';

/** What every layer of a figure is made from. */
export interface SpecParts {
  readonly figure: GroupedBarFigure;
  readonly appearance: FigureAppearance;
  readonly frame: FigureFrame;
  readonly colours: FigureColours;
}

/** One layer of the specification. */
export type FigureLayer = Extract<TopLevelSpec, { layer: unknown }>['layer'][number];

/** Pixels from the plot's top at which a value stands. */
export function heightOf({ frame }: SpecParts): (value: number) => number {
  const end = frame.ticks.values.at(-1) ?? 1;
  return (value) => frame.plotHeight * (1 - value / end);
}

/** A channel whose field holds pixels of the plot. */
export function pixels<Field extends string>(
  field: Field,
): { readonly field: Field; readonly type: 'quantitative'; readonly scale: null } {
  return { field, type: 'quantitative', scale: null };
}
