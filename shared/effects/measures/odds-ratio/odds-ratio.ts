import {
  ODDS_RATIO_INTERVALS,
  issueOfOddsRatioStratum,
  oddsRatioHomogeneity,
  oddsRatioOf,
  pooledOddsRatio,
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
  issueOfStratum: issueOfOddsRatioStratum,
  pooled: pooledOddsRatio,
  homogeneity: oddsRatioHomogeneity,
});
