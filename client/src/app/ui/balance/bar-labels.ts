import type { Balance } from '#shared/wording';
import type { GaugeDrawing } from './gauge-drawing';

/** Words inside a part of the bar. */
export interface BarLabel {
  readonly text: string;
  readonly x: number;
  readonly on: 'on-common' | 'on-rise' | 'on-fall';
}

const PADDING = 7;
/** Wide letters of the label's size; a label that may not fit is left out. */
const PIXELS_PER_LETTER = 6.6;

/**
 * Names the parts of the bar where they have room. The first part is the group with fewer events,
 * the second reaches to the other one.
 */
export function barLabels(
  balance: Balance,
  drawing: GaugeDrawing,
  x: (at: number) => number,
): readonly BarLabel[] {
  const edge = drawing.absolute ?? drawing.relative;
  if (edge === null) return fitting(balance.referenceLabel, [0, x(drawing.common)], 'on-common');
  const { change, span } = edge;
  const [fewer, more] =
    change === 'rise'
      ? [balance.referenceLabel, balance.indexLabel]
      : [balance.indexLabel, balance.referenceLabel];
  return [
    ...fitting(fewer, [0, x(drawing.common)], 'on-common'),
    ...fitting(more, [x(span.from), x(span.to)], change === 'rise' ? 'on-rise' : 'on-fall'),
  ];
}

function fitting(
  text: string,
  [from, to]: readonly [number, number],
  on: BarLabel['on'],
): readonly BarLabel[] {
  const needed = text.length * PIXELS_PER_LETTER + 2 * PADDING;
  return needed > to - from ? [] : [{ text, x: from + PADDING, on }];
}
