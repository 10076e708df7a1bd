import { failure, success } from '#shared/core';
import type { CodeBookBand, CodeBookColumn } from './code-book';
import type { EditedColumn } from './edit-levels';

/** How the numbers of a column come, which decides how its bands are labelled. */
export type NumberGrain = 'wholeNumbers' | 'anyNumbers';

/**
 * The column banded at cut points: below the first, between each two, from the last on.
 *
 * Bands are half-open, so a cut point belongs to the band above it. Whole numbers give "40–79",
 * other numbers "40 to < 80". A band with the same limits as before keeps its id and its words.
 */
export function bandColumn(
  column: CodeBookColumn,
  cutPoints: readonly number[],
  grain: NumberGrain,
): EditedColumn {
  if (cutPoints.length === 0) return failure({ code: 'cutPointsNeeded' });
  const ascending = cutPoints.every(
    (point, index) => Number.isFinite(point) && point > (cutPoints[index - 1] ?? -Infinity),
  );
  if (!ascending) return failure({ code: 'cutPointsNotAscending' });
  const bands = limitsOf(cutPoints).map((limits) => bandBetween(column, limits, grain));
  const stillThere = bands.some(({ id }) => id === column.referenceLevelId);
  return success({
    ...column,
    bands,
    referenceLevelId: stillThere ? column.referenceLevelId : (bands[0]?.id ?? null),
  });
}

/** The column without bands; a reference among them goes with them. */
export function removeBands(column: CodeBookColumn): CodeBookColumn {
  const lost = column.bands.some(({ id }) => id === column.referenceLevelId);
  return { ...column, bands: [], referenceLevelId: lost ? null : column.referenceLevelId };
}

/** The cut points that a column's bands were made from, ascending. */
export function cutPointsOf(column: CodeBookColumn): readonly number[] {
  const limits = column.bands.flatMap(({ lower, upper }) => [lower, upper]);
  const points = limits.filter((limit) => limit !== null);
  return [...new Set(points)].sort((one, other) => one - other);
}

interface Limits {
  readonly lower: number | null;
  readonly upper: number | null;
}

function limitsOf(cutPoints: readonly number[]): readonly Limits[] {
  const edges = [null, ...cutPoints, null];
  return edges
    .slice(0, -1)
    .map((lower, index) => ({ lower: lower ?? null, upper: edges[index + 1] ?? null }));
}

function bandBetween(column: CodeBookColumn, limits: Limits, grain: NumberGrain): CodeBookBand {
  const before = column.bands.find(
    ({ lower, upper }) => lower === limits.lower && upper === limits.upper,
  );
  if (before !== undefined) return before;
  return { id: bandId(limits), ...limits, ...wordsOf(limits, grain, column.unit) };
}

function bandId({ lower, upper }: Limits): string {
  if (lower === null) return `below-${String(upper)}`;
  return upper === null ? `from-${String(lower)}` : `from-${String(lower)}-to-${String(upper)}`;
}

function wordsOf(
  { lower, upper }: Limits,
  grain: NumberGrain,
  unit: string | null,
): Pick<CodeBookBand, 'label' | 'sentenceLabel'> {
  const measured = (words: string): string => (unit === null ? words : `${words} ${unit}`);
  if (lower === null) {
    return { label: `<${shown(upper)}`, sentenceLabel: measured(`under ${shown(upper)}`) };
  }
  if (upper === null) {
    return { label: `≥${shown(lower)}`, sentenceLabel: `${measured(shown(lower))} or more` };
  }
  return between(lower, upper, grain, measured);
}

function between(
  lower: number,
  upper: number,
  grain: NumberGrain,
  measured: (words: string) => string,
): Pick<CodeBookBand, 'label' | 'sentenceLabel'> {
  if (grain === 'anyNumbers' || !Number.isInteger(lower) || !Number.isInteger(upper)) {
    const label = `${shown(lower)} to <${shown(upper)}`;
    return { label, sentenceLabel: measured(`${shown(lower)} to under ${shown(upper)}`) };
  }
  const last = upper - 1;
  if (last === lower) return { label: shown(lower), sentenceLabel: measured(shown(lower)) };
  const label = `${shown(lower)}\u2013${shown(last)}`;
  return { label, sentenceLabel: measured(`${shown(lower)} to ${shown(last)}`) };
}

/** With the typographic minus, since a label is print. */
function shown(value: number | null): string {
  return value === null ? '' : String(value).replace('-', '\u2212');
}
