import { success } from '#shared/core';
import type { Result } from '#shared/core';
import type { ContingencyTable } from '../contingency-table';
import type { EstimationIssue } from '../estimate';
import { pearsonOfTable } from '../tests-of-association/pearson';
import { occupiedCounts } from './occupied-counts';

/**
 * Cramér's V: how strongly rows and columns of a table go together, from 0 to 1.
 *
 * Takes counts by row and column; empty ones are removed first. The square root of Pearson's
 * chi-square over its largest possible value, without bias correction. Issues as
 * `likelihoodRatioOfTable`.
 *
 * Source: Cramér (1946) Mathematical Methods of Statistics, chapter 21.
 * Example: [[100, 150], [203, 322], [420, 700], [320, 210]] gives 0.1862.
 */
export function cramersV(table: ContingencyTable): Result<number, EstimationIssue> {
  const counts = occupiedCounts(table);
  if (!counts.ok) {
    return counts;
  }
  const { rowTotals, columnTotals, total } = counts.value;
  const pearson = pearsonOfTable({ counts: counts.value.rows });
  const largest = total * (Math.min(rowTotals.length, columnTotals.length) - 1);
  return pearson.ok ? success(Math.sqrt(Number(pearson.value.statistic) / largest)) : pearson;
}
