import { factorLevels } from '#shared/code-book';
import type { CodeBookColumn, FactorLevel } from '#shared/code-book';
import type { Restriction } from '#shared/tally';

/**
 * The levels (of a number: the bands) that a column offers as a factor, in code-book order, without
 * those that a restriction of the same column takes away.
 */
export function keptLevels(
  column: CodeBookColumn,
  restrictions: readonly Restriction[],
): readonly FactorLevel[] {
  const own = restrictions.filter((restriction) => restriction.columnId === column.id);
  const kept = (id: string): boolean => own.every(({ levelIds }) => levelIds.includes(id));
  return factorLevels(column).filter((level) => kept(level.id));
}

/** Every combination of the levels of several factors; ids joined by "|", words by ", ". */
export function combinations(factors: readonly (readonly FactorLevel[])[]): readonly FactorLevel[] {
  const [first, ...rest] = factors;
  return first ? rest.reduce(combine, first) : [];
}

function combine(
  left: readonly FactorLevel[],
  right: readonly FactorLevel[],
): readonly FactorLevel[] {
  return left.flatMap((outer) =>
    right.map((inner) => ({
      id: `${outer.id}|${inner.id}`,
      label: `${outer.label}, ${inner.label}`,
      sentenceLabel: `${outer.sentenceLabel}, ${inner.sentenceLabel}`,
      within: [...(outer.within ?? []), ...(inner.within ?? [])],
    })),
  );
}
