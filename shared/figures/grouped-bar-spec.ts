import type { TopLevelSpec } from 'vega-lite';
import type { GroupedBarFigure } from '#shared/layout';
import type { FigureAppearance } from './appearance';
import { barLayers } from './bar-layers';
import { FIGURE_COLOURS } from './figure-colours';
import { figureFrame } from './figure-frame';
import { labelLayers } from './label-layers';
import { barHatching } from './hatch-layers';
import { keyLayers } from './key-layers';
import type { SpecParts } from './spec-parts';
import { whiskerLayers } from './whisker-layers';

/**
 * The Vega-Lite specification of a grouped bar chart, as plain data.
 *
 * Field names are fixed and labels are data only, so that no label can become an expression or a
 * path. Bars start at zero; whiskers are asymmetric and never clipped; the picture is exactly
 * `appearance.width` wide. Set `vega.textMetrics.width` to `vegaTextWidth` before drawing.
 */
export function groupedBarSpec(
  figure: GroupedBarFigure,
  appearance: FigureAppearance,
): TopLevelSpec {
  const frame = figureFrame(figure, appearance);
  const colours = FIGURE_COLOURS[appearance.theme];
  const parts: SpecParts = { figure, appearance, frame, colours };
  return {
    $schema: 'https://vega.github.io/schema/vega-lite/v6.json',
    width: frame.geometry.plotWidth,
    height: frame.plotHeight,
    padding: frame.padding,
    autosize: 'none',
    background: 'transparent',
    layer: [
      ...barLayers(parts),
      ...barHatching(parts),
      ...whiskerLayers(parts),
      ...labelLayers(parts),
      ...keyLayers(parts),
    ],
    config: {
      font: appearance.font,
      view: { stroke: null },
      axis: {
        labelColor: colours.secondInk,
        labelFontSize: appearance.fontSize,
        labelFontWeight: 400,
      },
      text: { fontSize: appearance.fontSize, fontWeight: 400, color: colours.ink },
    },
  };
}
