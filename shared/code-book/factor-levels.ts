import type { CodeBookColumn, ColumnKind, FactorLevel } from './code-book';

/**
 * The levels of a column when it serves as a factor, in print order.
 *
 * Categories give their levels, measured columns their bands; a column that can be no factor (an
 * identifier, a number without bands) gives none.
 */
export function factorLevels(column: CodeBookColumn): readonly FactorLevel[] {
  return partsOf(column).map(({ id, label, sentenceLabel }) => ({ id, label, sentenceLabel }));
}

/** Whether a column of a kind is read by its levels or by bands of its numbers; null: neither. */
export const FACTOR_SOURCE: Readonly<Record<ColumnKind, 'levels' | 'bands' | null>> = {
  category: 'levels',
  orderedCategory: 'levels',
  number: 'bands',
  personTime: 'bands',
  count: 'bands',
  date: null,
  identifier: null,
  pairIdentifier: null,
  clusterIdentifier: null,
  ignored: null,
};

function partsOf(column: CodeBookColumn): readonly FactorLevel[] {
  const source = FACTOR_SOURCE[column.kind];
  return source === null ? [] : column[source];
}
