import * as vega from 'vega';
import { compile, type TopLevelSpec } from 'vega-lite';
import { groupedBarSpec, vegaTextWidth } from '#shared/figures';
import type { FigureAppearance } from '#shared/figures';
import type { FigureModel } from '#shared/layout';
import { printableFigure } from './printable-figure';

/** Draws a figure as an SVG with live text. */
export async function figureSvg(
  figure: FigureModel,
  appearance: FigureAppearance,
): Promise<string> {
  measureText();
  const spec = SPECS[figure.kind](printableFigure(figure), appearance);
  const view = new vega.View(vega.parse(compile(spec).spec), { renderer: 'none' });
  try {
    return await view.toSVG();
  } finally {
    view.finalize();
  }
}

const SPECS: Readonly<
  Record<FigureModel['kind'], (figure: FigureModel, look: FigureAppearance) => TopLevelSpec>
> = { groupedBars: groupedBarSpec };

/** Vega keeps its measure in one place for the whole process; nothing else here draws with it. */
function measureText(): void {
  const { textMetrics } = vega as unknown as { textMetrics: { width: typeof vegaTextWidth } };
  textMetrics.width = vegaTextWidth;
}
