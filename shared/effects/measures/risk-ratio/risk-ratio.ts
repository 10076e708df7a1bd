import {
  POOLED_RISK_RATIOS,
  RISK_RATIO_HOMOGENEITIES,
  RISK_RATIO_INTERVALS,
  riskRatioOf,
} from '#shared/stats';
import { makeMeasure } from '../../make-measure';
import { designGivesRisk } from '../../study-design';

/** Risk of the index group over risk of the reference group, from 0 up. */
export const riskRatio = makeMeasure({
  id: 'riskRatio',
  scale: 'ratio',
  label: 'Risk ratio',
  abbreviation: 'RR',
  intervals: RISK_RATIO_INTERVALS,
  defaultIntervalId: 'katz',
  givenBy: designGivesRisk,
  valueOf: riskRatioOf,
  fractionOf: ({ index, reference }) => ({
    numerator: index.events * reference.total,
    denominator: reference.events * index.total,
  }),
  poolings: POOLED_RISK_RATIOS,
  defaultPoolingId: 'greenlandRobins',
  homogeneities: RISK_RATIO_HOMOGENEITIES,
  defaultHomogeneityId: 'inverseVariance',
});
