import { betaQuantile } from '../../distributions';
import { rateRatioMethod } from './rate-ratio-method';
import { limitsOfSplit } from './split-limits';

/**
 * Exact conditional interval for a rate ratio, index over reference.
 *
 * Takes events and person-time of two independent groups; gives ratios. Lower limit 0 without
 * events in the index group; none in the reference group gives `zeroCell`, in either `noEvents`.
 *
 * Source: Przyborowski and Wilenski (1940) Biometrika 31:313-323, by Clopper and Pearson's limits
 * of the binomial split.
 */
export const exactConditional = rateRatioMethod({
  id: 'exactConditional',
  label: 'Exact conditional',
  shortLabel: 'exact',
  citation:
    'Przyborowski J, Wilenski H. Homogeneity of results in testing samples from Poisson series. ' +
    'Biometrika 1940;31:313-323.',
  limits: (table, _z, level) => limitsOfSplit(table, exactLowerOdds((1 - level) / 2)),
});

function exactLowerOdds(tail: number): (events: number, others: number) => number {
  return (events, others) =>
    betaQuantile(tail, events, others + 1) / betaQuantile(1 - tail, others + 1, events);
}
