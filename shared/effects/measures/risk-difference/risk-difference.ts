import {
  POOLED_RISK_DIFFERENCES,
  RISK_DIFFERENCE_HOMOGENEITIES,
  RISK_DIFFERENCE_INTERVALS,
  riskDifferenceOf,
} from '#shared/stats';
import type { FourfoldTable } from '#shared/stats';
import type { ExactFraction } from '../../effect-measure';
import { makeMeasure } from '../../make-measure';
import { designGivesRisk } from '../../study-design';

/** Risk of the index group minus risk of the reference group, from -1 to 1. */
export const riskDifference = makeMeasure({
  id: 'riskDifference',
  scale: 'difference',
  label: 'Risk difference',
  abbreviation: 'RD',
  intervals: RISK_DIFFERENCE_INTERVALS,
  defaultIntervalId: 'newcombe',
  givenBy: designGivesRisk,
  valueOf: riskDifferenceOf,
  fractionOf,
  poolings: POOLED_RISK_DIFFERENCES,
  defaultPoolingId: 'sato',
  homogeneities: RISK_DIFFERENCE_HOMOGENEITIES,
  defaultHomogeneityId: 'inverseVariance',
});

function fractionOf({ index, reference }: FourfoldTable): ExactFraction {
  const plus = index.events * reference.total;
  const minus = reference.events * index.total;
  const safe = Number.isSafeInteger(plus) && Number.isSafeInteger(minus);
  return { numerator: safe ? plus - minus : NaN, denominator: index.total * reference.total };
}
