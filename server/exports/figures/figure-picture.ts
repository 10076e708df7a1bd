import { Resvg, type ResvgRenderOptions } from '@resvg/resvg-js';
import { FIGURE_COLOURS } from '#shared/figures';
import type { FigureFonts } from './figure-fonts';
import { FIGURE_FONT } from './figure-fonts';

/** A figure for print: the vector, the raster that stands in for it, its size in CSS pixels. */
export interface FigurePicture {
  readonly svg: string;
  readonly png: Uint8Array;
  readonly width: number;
  readonly height: number;
}

/**
 * Makes the picture of a drawn figure. Its text becomes outlines, so that it looks the same with
 * whatever fonts a reader has. A text that the fonts of figures can't show stays text instead, for
 * the reader's fonts, and this machine's fonts fill in for the raster.
 */
export function figurePicture(svg: string, fonts: FigureFonts, dotsPerInch: number): FigurePicture {
  const covered = fonts.cover(textsOf(svg));
  const drawn = new Resvg(svg, {
    background: FIGURE_COLOURS.print.page,
    fitTo: { mode: 'zoom', value: dotsPerInch / 96 },
    font: fontOptions(fonts, covered),
  });
  return {
    svg: covered ? drawn.toString() : svg,
    png: drawn.render().asPng(),
    width: drawn.width,
    height: drawn.height,
  };
}

function fontOptions(fonts: FigureFonts, covered: boolean): ResvgRenderOptions['font'] {
  return {
    fontFiles: [...fonts.files],
    loadSystemFonts: !covered,
    defaultFontFamily: FIGURE_FONT,
  };
}

/** The texts between tags; entities stand for characters that every font has. */
function textsOf(svg: string): string {
  return svg.replace(/<[^>]*>/g, '').replace(/\s/g, '');
}
