import type { Result } from '#shared/core';
import type { EstimationIssue, FourfoldTable, TestOutcome } from '#shared/stats';
import type { AnalysisResult, ContrastResult, LayerResult } from './analysis-result';
import { contrastTable } from './result-places';

/** The test that a contrast is printed with, by the name of its numbers. */
export interface PrintedTest {
  readonly quantity: 'test' | 'pearson' | 'fisher';
  readonly outcome: Result<TestOutcome, EstimationIssue>;
}

/**
 * The test that tables and sentences print for a contrast of a layer: the one that the analysis
 * chose; otherwise Pearson's chi-square test, or Fisher's exact test where an expected count is
 * below 5.
 */
export function printedTest(
  { specification }: AnalysisResult,
  layer: LayerResult,
  contrast: ContrastResult,
): PrintedTest {
  if (specification.otherMethods?.contrastTest !== undefined && contrast.test) {
    return { quantity: 'test', outcome: contrast.test };
  }
  const table = contrastTable(layer, contrast.indexLevelId);
  const quantity = table && isSparse(table) ? 'fisher' : 'pearson';
  return { quantity, outcome: contrast[quantity] };
}

/** The chi-square approximation asks for expected counts of 5 and more. */
function isSparse({ index, reference }: FourfoldTable): boolean {
  const total = index.total + reference.total;
  const events = index.events + reference.events;
  const smallestGroup = Math.min(index.total, reference.total);
  return smallestGroup * Math.min(events, total - events) < 5 * total;
}
