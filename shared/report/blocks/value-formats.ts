import type { AddressedQuantity, ValueAddress } from '#shared/analysis';
import type { BoundValueFormat } from '../text/text-document';

/** The formats in which a value can be printed, the usual one first; for a menu. */
export function formatsOf({ quantity, facet }: ValueAddress): readonly BoundValueFormat[] {
  const formats = FORMATS[quantity];
  return facet === 'value' ? formats : formats.filter((format) => format !== 'withLimits');
}

const FIGURE: readonly BoundValueFormat[] = ['auto'];
const SHARE: readonly BoundValueFormat[] = ['auto', 'count', 'per100', 'per1000'];
const RISK: readonly BoundValueFormat[] = [...SHARE, 'withLimits'];
const DIFFERENCE: readonly BoundValueFormat[] = ['auto', 'withLimits', 'per100', 'per1000'];
const RATIO: readonly BoundValueFormat[] = ['auto', 'withLimits'];

const FORMATS: Readonly<Record<AddressedQuantity, readonly BoundValueFormat[]>> = {
  events: FIGURE,
  total: FIGURE,
  risk: RISK,
  riskDifference: DIFFERENCE,
  riskRatio: RATIO,
  oddsRatio: RATIO,
  numberNeeded: FIGURE,
  test: FIGURE,
  pearson: FIGURE,
  fisher: FIGURE,
  association: FIGURE,
  trend: FIGURE,
  conditionalIndependence: FIGURE,
  'homogeneity:riskDifference': FIGURE,
  'homogeneity:riskRatio': FIGURE,
  'homogeneity:oddsRatio': FIGURE,
  'interaction:riskDifference': RATIO,
  'interaction:riskRatio': RATIO,
  'interaction:oddsRatio': RATIO,
  excessRisk: RATIO,
  fractionInExposed: RATIO,
  populationFraction: RATIO,
  eValue: FIGURE,
  counted: FIGURE,
  leftOut: FIGURE,
  controls: FIGURE,
  shareOfCases: RISK,
  shareOfControls: RISK,
  comparedCases: FIGURE,
  comparedControls: FIGURE,
  shareOfComparedCases: SHARE,
  shareOfComparedControls: SHARE,
  outsideEstimate: RATIO,
};
