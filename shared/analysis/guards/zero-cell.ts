import { EFFECT_MEASURES, EFFECT_MEASURE_IDS } from '#shared/effects';
import type { AnalysisResult, ContrastResult, LayerResult } from '../analysis-result';
import { contrastTable } from '../result-places';
import type { Guard, GuardPoint } from './guard';
import { layersOf, scopeOf } from './places';

/**
 * A contrast with a group of which nobody or everybody has the event, so that some measure cannot
 * be estimated. Facts: measureIds (not estimable), indexEvents, indexTotal, referenceEvents,
 * referenceTotal.
 */
export const zeroCell = {
  id: 'zeroCell',
  severity: 'caution',
  source:
    'Agresti A. Categorical Data Analysis. 3rd edition. Wiley 2013, section 3.1: log ratios are ' +
    'undefined with a zero cell; nothing is added to the cells here.',
  find: (result) =>
    layersOf(result).flatMap((layer) =>
      layer.contrasts.flatMap((contrast) => pointsOf(result, layer, contrast)),
    ),
} as const satisfies Guard<'zeroCell'>;

function pointsOf(
  { frame }: AnalysisResult,
  layer: LayerResult,
  contrast: ContrastResult,
): readonly GuardPoint[] {
  const table = contrastTable(layer, contrast.indexLevelId);
  const measureIds = EFFECT_MEASURE_IDS.filter((id) => {
    const estimate = contrast.measures[id];
    const given = EFFECT_MEASURES[id].givenBy(frame.design);
    return given && !estimate.ok && estimate.issue.code === 'zeroCell';
  });
  if (!table || measureIds.length === 0) {
    return [];
  }
  const facts = {
    measureIds,
    indexEvents: table.index.events,
    indexTotal: table.index.total,
    referenceEvents: table.reference.events,
    referenceTotal: table.reference.total,
  };
  return [{ place: { scope: scopeOf(layer), levelId: contrast.indexLevelId }, facts }];
}
