import * as vega from 'vega';
import embed, { type Result } from 'vega-embed';
import { groupedBarSpec, screenAppearance, vegaTextWidth } from '#shared/figures';
import type { FigureModel } from '#shared/layout';

/** A drawing that can be taken away again. */
export interface DrawnFigure {
  readonly end: () => void;
}

/** How a figure is drawn on the page. */
export interface FigureDrawing {
  readonly theme: 'light' | 'dark';
  /** Width of the picture, in CSS pixels. */
  readonly width: number;
}

/**
 * Draws a figure as SVG into an element, in the place of what it holds. The interpreter evaluates
 * the specification, as the page may not run text as code.
 */
export async function drawFigure(
  place: HTMLElement,
  figure: FigureModel,
  { theme, width }: FigureDrawing,
): Promise<DrawnFigure> {
  metrics.width = vegaTextWidth;
  const spec = groupedBarSpec(figure, screenAppearance(theme, width));
  const drawn: Result = await embed(place, spec, {
    ast: true,
    renderer: 'svg',
    actions: false,
    tooltip: false,
    defaultStyle: false,
  });
  fitSvg(place.querySelector('svg'));
  return {
    end: () => {
      drawn.finalize();
    },
  };
}

/** On paper, which may be narrower than the page it was drawn for, the picture shrinks. */
function fitSvg(svg: SVGSVGElement | null): void {
  svg?.setAttribute('aria-hidden', 'true');
  svg?.setAttribute('style', 'max-width: 100%; height: auto');
}

/** The library's types leave its text metrics out. */
const metrics = (vega as unknown as { textMetrics: { width: typeof vegaTextWidth } }).textMetrics;
