import type { MethodWords } from './intervals';

/** Names and sources of the tests, by the method that a `TestOutcome` names. */
export const TEST_METHODS = {
  pearsonChiSquare: {
    id: 'pearsonChiSquare',
    label: 'Pearson chi-square test',
    shortLabel: 'chi-square',
    citation:
      'Pearson K. On the criterion that a given system of deviations from the probable in the ' +
      'case of a correlated system of variables is such that it can be reasonably supposed to ' +
      'have arisen from random sampling. Philosophical Magazine 1900;50:157-175.',
  },
  fisherExact: {
    id: 'fisherExact',
    label: "Fisher's exact test, two-sided by the probability of tables",
    shortLabel: "Fisher's exact",
    citation:
      'Fisher RA. The logic of inductive inference. ' +
      'Journal of the Royal Statistical Society 1935;98:39-82.',
  },
  cochranArmitage: {
    id: 'cochranArmitage',
    label: 'Cochran–Armitage test for trend',
    shortLabel: 'Cochran–Armitage',
    citation:
      'Armitage P. Tests for linear trends in proportions and frequencies. ' +
      'Biometrics 1955;11:375-386.',
  },
  cochranMantelHaenszel: {
    id: 'cochranMantelHaenszel',
    label: 'Cochran–Mantel–Haenszel test without continuity correction',
    shortLabel: 'Cochran–Mantel–Haenszel',
    citation:
      'Mantel N, Haenszel W. Statistical aspects of the analysis of data from retrospective ' +
      'studies of disease. Journal of the National Cancer Institute 1959;22:719-748.',
  },
  breslowDayTarone: {
    id: 'breslowDayTarone',
    label: "Breslow–Day test of homogeneity with Tarone's correction",
    shortLabel: 'Breslow–Day–Tarone',
    citation:
      'Tarone RE. On heterogeneity tests based on efficient scores. Biometrika 1985;72:91-95.',
  },
  inverseVariance: {
    id: 'inverseVariance',
    label: 'Inverse-variance test of homogeneity',
    shortLabel: 'inverse-variance Q',
    citation:
      'Cochran WG. The combination of estimates from different experiments. ' +
      'Biometrics 1954;10:101-129.',
  },
} as const satisfies Readonly<Record<string, MethodWords>>;

/** Id of a test. */
export type TestMethodId = keyof typeof TEST_METHODS;

/** Names and sources of the pooled estimates' variances, by the method that an interval names. */
export const POOLING_METHODS = {
  sato: {
    id: 'sato',
    label: "Mantel–Haenszel risk difference with Sato's variance",
    shortLabel: 'Mantel–Haenszel (Sato)',
    citation:
      'Sato T. On the variance estimator for the Mantel–Haenszel risk difference. ' +
      'Biometrics 1989;45:1323-1324.',
  },
  greenlandRobins: {
    id: 'greenlandRobins',
    label: 'Mantel–Haenszel with the variance of Greenland and Robins',
    shortLabel: 'Mantel–Haenszel (Greenland–Robins)',
    citation:
      'Greenland S, Robins JM. Estimation of a common effect parameter from sparse follow-up ' +
      'data. Biometrics 1985;41:55-68.',
  },
  robinsBreslowGreenland: {
    id: 'robinsBreslowGreenland',
    label: 'Mantel–Haenszel odds ratio with the variance of Robins, Breslow and Greenland',
    shortLabel: 'Mantel–Haenszel (Robins–Breslow–Greenland)',
    citation:
      'Robins J, Breslow N, Greenland S. Estimators of the Mantel–Haenszel variance consistent ' +
      'in both sparse data and large-strata limiting models. Biometrics 1986;42:311-323.',
  },
} as const satisfies Readonly<Record<string, MethodWords>>;

/** Id of a pooled estimate's variance. */
export type PoolingMethodId = keyof typeof POOLING_METHODS;
