import {
  RISK_RATIO_INTERVALS,
  issueOfRiskRatioStratum,
  pooledRiskRatio,
  riskRatioHomogeneity,
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
  issueOfStratum: issueOfRiskRatioStratum,
  pooled: pooledRiskRatio,
  homogeneity: riskRatioHomogeneity,
});
