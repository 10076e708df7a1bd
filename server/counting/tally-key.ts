import { createHash } from 'node:crypto';
import { FACTOR_SOURCE, type CodeBook, type CodeBookColumn } from '#shared/code-book';
import type { Tally, TallyAxis, TallyRequest } from '#shared/tally';

/** Changes when counting itself changes, so that counts of an older way are not used again. */
const COUNTING_VERSION = 1;

/**
 * The name under which counts are kept: a hash of the cut, of what the codes of the columns mean,
 * and of the restrictions.
 *
 * Labels and the order of levels are not in it, so that relabelling and reordering count nothing
 * anew.
 */
export function tallyKey(cutId: string, codeBook: CodeBook, request: TallyRequest): string {
  const meaningOf = (columnId: string): unknown => {
    const column = codeBook.columns.find(({ id }) => id === columnId);
    return column === undefined ? null : columnMeaning(column);
  };
  const restrictions = request.restrictions
    .map(({ columnId, levelIds }) => [meaningOf(columnId), [...levelIds].sort()])
    .map((restriction) => JSON.stringify(restriction));
  const counted = {
    version: COUNTING_VERSION,
    cutId,
    layout: codeBook.layout,
    axes: request.columnIds.map(meaningOf),
    restrictions: restrictions.sort(),
  };
  return createHash('sha256').update(JSON.stringify(counted)).digest('hex');
}

function columnMeaning({ id, kind, levels, bands, missingCodes }: CodeBookColumn): unknown {
  const source = FACTOR_SOURCE[kind];
  return {
    id,
    levels:
      source === 'levels' ? inOrder(levels.map((level) => [level.id, inOrder(level.codes)])) : [],
    bands:
      source === 'bands' ? inOrder(bands.map((band) => [band.id, band.lower, band.upper])) : [],
    missing: inOrder(missingCodes.map(({ code, reason }) => [code, reason])),
  };
}

function inOrder(members: readonly unknown[]): readonly string[] {
  return members.map((member) => JSON.stringify(member)).sort();
}

/** The tally with its levels in the order of the code book, whatever order they were kept in. */
export function inCodeBookOrder(tally: Tally, ordered: readonly TallyAxis[]): Tally {
  const places = tally.axes.map(({ levelIds }, axis) =>
    levelIds.map((id) => ordered[axis]?.levelIds.indexOf(id) ?? -1),
  );
  const cells = tally.cells
    .map(({ at, count }) => ({ at: at.map((place, axis) => places[axis]?.[place] ?? -1), count }))
    .sort((one, other) => compare(one.at, other.at));
  return { ...tally, axes: ordered, cells };
}

function compare(one: readonly number[], other: readonly number[]): number {
  const axis = one.findIndex((place, at) => place !== other[at]);
  return axis < 0 ? 0 : (one[axis] ?? 0) - (other[axis] ?? 0);
}
