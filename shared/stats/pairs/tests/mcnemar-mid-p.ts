import { binomialProbability } from '../../distributions';
import { exactPValue } from './mcnemar-exact';
import { pairedTest } from './paired-test';

/**
 * McNemar's mid-p test: the exact p less the probability of the observed discordant pairs; less
 * half of it where they are equally many on both sides.
 *
 * Source: Fagerland, Lydersen and Laake (2013) BMC Medical Research Methodology 13:91.
 * Example: 59 both, 6 only first, 16 only second, 80 neither give p = 0.0347.
 */
export const mcnemarMidP = pairedTest({
  id: 'mcnemarMidP',
  label: "McNemar's mid-p test",
  shortLabel: 'mid-p McNemar',
  citation:
    'Fagerland MW, Lydersen S, Laake P. The McNemar test for binary matched-pairs data: mid-p and ' +
    'asymptotic are better than exact conditional. BMC Medical Research Methodology 2013;13:91.',
  outcome(table) {
    const { onlyFirst, onlySecond } = table;
    const observed = binomialProbability(onlyFirst, onlyFirst + onlySecond, 0.5);
    const taken = onlyFirst === onlySecond ? observed / 2 : observed;
    return { statistic: null, degreesOfFreedom: null, pValue: exactPValue(table) - taken };
  },
});
