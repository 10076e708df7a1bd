import type { FigureAppearance } from '#shared/figures';
import type { FigureStyle } from '#shared/house-style';
import type { FigureModel } from '#shared/layout';
import { FIGURE_FONT } from './figure-fonts';

/**
 * How a figure looks in print under a house style. Few bars take a single column, more of them a
 * double one, but never more than `roomInMillimetres`; type keeps its size at every width.
 */
export function printAppearance(
  figure: FigureModel,
  style: FigureStyle,
  roomInMillimetres: number,
): FigureAppearance {
  const wanted =
    figure.bars.length <= MOST_BARS_IN_A_COLUMN
      ? style.singleWidthInMillimetres
      : style.doubleWidthInMillimetres;
  return {
    theme: 'print',
    width: Math.floor(Math.min(wanted, roomInMillimetres) * PIXELS_PER_MILLIMETRE),
    plotHeight: null,
    font: FIGURE_FONT,
    fontSize: style.sizeInPoints * PIXELS_PER_POINT,
    lineWidth: style.lineInPoints * PIXELS_PER_POINT,
    legend: 'inside',
    hatching: 'whenNeeded',
  };
}

const MOST_BARS_IN_A_COLUMN = 4;
const PIXELS_PER_MILLIMETRE = 96 / 25.4;
const PIXELS_PER_POINT = 96 / 72;
