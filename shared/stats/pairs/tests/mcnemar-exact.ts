import { binomialCumulative } from '../../distributions';
import type { PairedTable } from '../paired-table';
import { pairedTest } from './paired-test';

/**
 * McNemar's exact test: twice the smaller binomial tail of the discordant pairs, at most 1.
 *
 * Source: as the exact conditional test in Fagerland, Lydersen and Laake (2013) BMC Medical
 * Research Methodology 13:91.
 * Example: 59 both, 6 only first, 16 only second, 80 neither give p = 0.0525.
 */
export const mcnemarExact = pairedTest({
  id: 'mcnemarExact',
  label: "McNemar's exact test, twice the smaller tail",
  shortLabel: 'exact McNemar',
  citation:
    'Fagerland MW, Lydersen S, Laake P. The McNemar test for binary matched-pairs data: mid-p and ' +
    'asymptotic are better than exact conditional. BMC Medical Research Methodology 2013;13:91.',
  outcome: (table) => ({ statistic: null, degreesOfFreedom: null, pValue: exactPValue(table) }),
});

/** Twice the smaller tail, at most 1. */
export function exactPValue({ onlyFirst, onlySecond }: PairedTable): number {
  const smaller = Math.min(onlyFirst, onlySecond);
  return Math.min(1, 2 * binomialCumulative(smaller, onlyFirst + onlySecond, 0.5));
}
