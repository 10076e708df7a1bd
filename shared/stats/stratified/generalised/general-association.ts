import type { Result } from '#shared/core';
import type { EstimationIssue, TestOutcome } from '../../estimate';
import type { Contrast, StratifiedContingency } from './generalised-test';
import { testContrasts } from './generalised-test';

/**
 * Generalised Cochran–Mantel–Haenszel test of general association, rows and columns being names.
 *
 * Takes two-way tables by stratum, all with the same rows and columns; gives a chi-square statistic
 * on (rows - 1)(columns - 1) degrees of freedom, fewer where rows or columns are empty throughout.
 * Counts that do not fit give `invalidCounts`; strata that all fix their counts
 * `noInformativeStratum`.
 *
 * Source: Landis, Heyman and Koch (1978) International Statistical Review 46:237-254.
 * Example: one 2 × 2 table gives Pearson's chi-square times (N - 1) / N.
 */
export function generalAssociation(
  strata: StratifiedContingency,
): Result<TestOutcome, EstimationIssue> {
  const { rows, columns } = shapeOf(strata);
  const contrasts = units(rows).flatMap((row) =>
    units(columns).map((column): Contrast => ({ rows: row, columns: column })),
  );
  return testContrasts(strata, contrasts, 'generalAssociation');
}

/** As many rows and columns as the first stratum has. */
export function shapeOf([first]: StratifiedContingency): { rows: number; columns: number } {
  const counts = first?.table.counts ?? [];
  return { rows: counts.length, columns: counts[0]?.length ?? 0 };
}

/** One for each place in turn, 0 elsewhere; the dependent last one changes no test. */
export function units(length: number): readonly (readonly number[])[] {
  const places = Array.from({ length }, (_, place) => place);
  return places.map((place) => places.map((other) => (other === place ? 1 : 0)));
}
