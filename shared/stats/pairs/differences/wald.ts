import { clampLimits } from '../../intervals/clamp';
import type { Limits } from '../../intervals/interval-method';
import { intervalMethod } from '../../intervals/interval-method';
import type { PairedTable } from '../paired-table';
import { issueOfPairs, pairedDifferenceOf, pairsOf } from '../paired-table';

/**
 * Wald's interval for a difference of paired proportions, first minus second, cut to [-1, 1].
 *
 * Takes the pairs' counts. Its width is zero where all members agree; no pairs give `emptyGroup`.
 *
 * Source: as method 1 in Newcombe (1998) Statistics in Medicine 17:2635-2650.
 * Example: 59 both, 6 only first, 16 only second, 80 neither at level 0.95 give -0.1184 to -0.0058.
 */
export const wald = intervalMethod(issueOfPairs, {
  id: 'waldPaired',
  label: 'Wald for pairs',
  shortLabel: 'Wald (pairs)',
  citation:
    'Newcombe RG. Improved confidence intervals for the difference between binomial proportions ' +
    'based on paired data. Statistics in Medicine 1998;17:2635-2650, method 1.',
  limits(table: PairedTable, z): Limits {
    const difference = pairedDifferenceOf(table);
    const discordant = (table.onlyFirst + table.onlySecond) / pairsOf(table);
    const variance = Math.max(0, discordant - difference * difference) / pairsOf(table);
    const spread = z * Math.sqrt(variance);
    return clampLimits([difference - spread, difference + spread], -1, 1);
  },
});
