import { success } from '#shared/core';
import type { Result } from '#shared/core';
import { hypergeometricProbability } from '../../distributions';
import type { EstimationIssue, TestOutcome } from '../../estimate';
import type { FourfoldTable } from '../../fourfold-table';
import { urnOf } from '../../urn-of';
import { fisherOfFourfold } from '../fisher';
import type { FourfoldTest } from './fourfold-test';

/**
 * Fisher's test with the mid-p value: the exact two-sided one less half the probability of the
 * observed table. Other tables as likely as the observed one count whole; a second definition in
 * use takes half of these too.
 *
 * Takes events and totals of two groups of any size; gives no statistic.
 *
 * Source: Lancaster (1961) Journal of the American Statistical Association 56:223-234.
 * Example: 0/16 against 15/72 gives p = 0.04466.
 */
export const fisherMidP = {
  id: 'fisherMidP',
  label: "Fisher's mid-p test (half of the observed table's probability)",
  shortLabel: "Fisher's mid-p",
  citation:
    'Lancaster HO. Significance tests in discrete distributions. ' +
    'Journal of the American Statistical Association 1961;56:223-234.',
  effort: 'light',
  groupCap: null,
  test: midP,
} as const satisfies FourfoldTest;

function midP(table: FourfoldTable): Result<TestOutcome, EstimationIssue> {
  const exact = fisherOfFourfold(table);
  if (!exact.ok) {
    return exact;
  }
  const observed = hypergeometricProbability(table.index.events, urnOf(table));
  const pValue = Math.max(0, exact.value.pValue - observed / 2);
  return success({ ...exact.value, method: 'fisherMidP', pValue });
}
