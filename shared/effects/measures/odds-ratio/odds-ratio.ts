import {
  ODDS_RATIO_HOMOGENEITIES,
  ODDS_RATIO_INTERVALS,
  POOLED_ODDS_RATIOS,
  oddsRatioOf,
} from '#shared/stats';
import { makeMeasure } from '../../make-measure';

/** Odds of the index group over odds of the reference group, from 0 up; every design gives it. */
export const oddsRatio = makeMeasure({
  id: 'oddsRatio',
  scale: 'ratio',
  label: 'Odds ratio',
  abbreviation: 'OR',
  intervals: ODDS_RATIO_INTERVALS,
  defaultIntervalId: 'woolf',
  givenBy: () => true,
  valueOf: oddsRatioOf,
  fractionOf: ({ index, reference }) => ({
    numerator: index.events * (reference.total - reference.events),
    denominator: reference.events * (index.total - index.events),
  }),
  poolings: POOLED_ODDS_RATIOS,
  defaultPoolingId: 'robinsBreslowGreenland',
  homogeneities: ODDS_RATIO_HOMOGENEITIES,
  defaultHomogeneityId: 'breslowDayTarone',
});
