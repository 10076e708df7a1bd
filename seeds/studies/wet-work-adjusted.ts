import type { OutsideEstimateEntry } from '#shared/outside-estimates';

/**
 * What a logistic model of the second cut's invented records gives, adjusted for workplace and age.
 * By R 4.2.2: `glm(eczema ~ wet_work + workplace + age, binomial)` with Wald limits
 * (`confint.default`), over the 2542 workers who answered and were seen again.
 */
export const WET_WORK_ADJUSTED: readonly OutsideEstimateEntry[] = [
  adjusted('1', ['1.52', '0.82', '2.81'], '0.19'),
  adjusted('2', ['2.64', '1.48', '4.68'], '<0.001'),
  adjusted('3', ['4.20', '2.39', '7.40'], '<0.001'),
  adjusted('4', ['6.11', '3.44', '10.87'], '<0.001'),
];

function adjusted(
  levelId: string,
  [value, lower, upper]: readonly [value: string, lower: string, upper: string],
  pValue: string,
): OutsideEstimateEntry {
  return {
    levelId,
    referenceLevelId: '0',
    measure: 'oddsRatio',
    value,
    lower,
    upper,
    level: 0.95,
    pValue,
    method: 'logistic regression with Wald limits',
    covariates: ['workplace', 'age'],
    numberAnalysed: 2542,
    source: 'R 4.2.2, from the invented records of this study',
    computedOn: null,
    note: 'Invented data, for demonstration.',
  };
}
