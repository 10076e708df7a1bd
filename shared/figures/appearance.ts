import type { FigureTheme } from './figure-colours';

/** How a figure is drawn; all that is not the figure's own. Lengths are CSS pixels. */
export interface FigureAppearance {
  readonly theme: FigureTheme;
  /** Width of the whole picture. */
  readonly width: number;
  /** Height of the plot without labels; null follows the width. */
  readonly plotHeight: number | null;
  readonly font: string;
  readonly fontSize: number;
  /** Edge of bars and weight of axes; whiskers are a third heavier. */
  readonly lineWidth: number;
  /** `inside` draws the key over the plot; `none` leaves it to the caption line. */
  readonly legend: 'inside' | 'none';
  /** `whenNeeded` adds hatching from four groups on; `always` suits a single ink. */
  readonly hatching: 'whenNeeded' | 'always';
}

/** The look of figures on the screen at a width. */
export function screenAppearance(theme: 'light' | 'dark', width: number): FigureAppearance {
  return {
    theme,
    width,
    plotHeight: null,
    font: 'IBM Plex Sans',
    fontSize: 12,
    lineWidth: 1,
    legend: 'inside',
    hatching: 'whenNeeded',
  };
}
