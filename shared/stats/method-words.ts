import type { MethodWords } from './intervals';
import { DIFFERENCES_OF_DIFFERENCES, EXCESS_RISK, RATIO_OF_RATIOS } from './interaction';
import { PAIRED_TESTS } from './pairs';
import {
  GENERALISED_TESTS,
  ODDS_RATIO_HOMOGENEITIES,
  POOLED_ODDS_RATIOS,
  POOLED_RISK_DIFFERENCES,
  POOLED_RISK_RATIOS,
  RISK_DIFFERENCE_HOMOGENEITIES,
} from './stratified';
import { TREND_TESTS } from './trend';
import { FOURFOLD_TESTS } from './tests-of-association';

/** Names and sources of the tests, by the method that a `TestOutcome` names. */
export const TEST_METHODS = {
  ...FOURFOLD_TESTS,
  fisherFreemanHalton: {
    id: 'fisherFreemanHalton',
    label: "Fisher's exact test of a table of any size (Freeman and Halton)",
    shortLabel: "Fisher's exact (Freeman–Halton)",
    citation:
      'Freeman GH, Halton JH. Note on an exact treatment of contingency, goodness of fit and ' +
      'other problems of significance. Biometrika 1951;38:141-149.',
  },
  ...TREND_TESTS,
  cochranMantelHaenszel: {
    id: 'cochranMantelHaenszel',
    label: 'Cochran–Mantel–Haenszel test without continuity correction',
    shortLabel: 'Cochran–Mantel–Haenszel',
    citation:
      'Mantel N, Haenszel W. Statistical aspects of the analysis of data from retrospective ' +
      'studies of disease. Journal of the National Cancer Institute 1959;22:719-748.',
  },
  ...GENERALISED_TESTS,
  ...ODDS_RATIO_HOMOGENEITIES,
  ...RISK_DIFFERENCE_HOMOGENEITIES,
  ...PAIRED_TESTS,
  ...DIFFERENCES_OF_DIFFERENCES,
  ratioOfRatios: RATIO_OF_RATIOS,
  excessRisk: EXCESS_RISK,
} as const satisfies Readonly<Record<string, MethodWords>>;

/** Id of a test. */
export type TestMethodId = keyof typeof TEST_METHODS;

/** Names and sources of the pooled estimates' variances, by the method that an interval names. */
export const POOLING_METHODS = {
  ...POOLED_RISK_DIFFERENCES,
  ...POOLED_RISK_RATIOS,
  ...POOLED_ODDS_RATIOS,
} as const satisfies Readonly<Record<string, MethodWords>>;

/** Id of a pooled estimate's variance. */
export type PoolingMethodId = keyof typeof POOLING_METHODS;
