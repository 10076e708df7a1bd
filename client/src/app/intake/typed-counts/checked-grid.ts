import type { TypedCountsRequest } from '#shared/api';
import { failure, type Result, success } from '#shared/core';
import type { CountsGrid, CountsLayout, GridPlace, GridRow } from './counts-grid';
import { parsedCount } from './typed-count';

type TypedRow = TypedCountsRequest['rows'][number];

/** What is wrong at one place of the grid; a stratum's name has row -1 and its first column. */
export interface GridProblem {
  readonly place: GridPlace;
  readonly message: string;
}

/** The rows that a grid stands for, or everything that is wrong with it. */
export function checkedRows(
  grid: CountsGrid,
  layout: CountsLayout,
): Result<readonly TypedRow[], readonly GridProblem[]> {
  const problems = [...nameProblems(grid), ...cellProblems(grid, layout)];
  return problems.length === 0 ? success(typedRows(grid)) : failure(problems);
}

/** Place of the text that a refused path of the request, such as `rows.3.events`, speaks of. */
export function placeOfPath(grid: CountsGrid, path: string): GridPlace | null {
  const [, index, field] = /^rows\.(\d+)(?:\.(\w+))?$/.exec(path) ?? [];
  if (index === undefined) return null;
  const strata = grid.strata.length;
  const row = Math.floor(Number(index) / strata);
  const first = 1 + 2 * (Number(index) % strata);
  if (row >= grid.rows.length) return null;
  if (field === 'level') return { row, column: 0 };
  if (field === 'stratum') return { row: -1, column: first };
  return { row, column: field === 'other' ? first + 1 : first };
}

function nameProblems(grid: CountsGrid): GridProblem[] {
  const levels = grid.rows.map((row, at) => ({ name: row.level, place: { row: at, column: 0 } }));
  const strata = grid.stratified
    ? grid.strata.map((name, at) => ({ name, place: { row: -1, column: 1 + 2 * at } }))
    : [];
  return [...namesWithProblem(levels, 'level'), ...namesWithProblem(strata, 'stratum')];
}

interface PlacedName {
  readonly name: string;
  readonly place: GridPlace;
}

function namesWithProblem(names: readonly PlacedName[], what: string): GridProblem[] {
  return names.flatMap(({ name, place }, at) => {
    const bare = name.trim();
    if (bare === '') return [{ place, message: `Give this ${what} a name.` }];
    const twice = names.slice(0, at).some((other) => other.name.trim() === bare);
    return twice ? [{ place, message: `"${bare}" is here already.` }] : [];
  });
}

function cellProblems(grid: CountsGrid, layout: CountsLayout): GridProblem[] {
  return grid.rows.flatMap((row, at) =>
    grid.strata.flatMap((_, stratum) =>
      pairProblems(row, stratum, layout).map(({ column, message }) => ({
        place: { row: at, column },
        message,
      })),
    ),
  );
}

function pairProblems(
  row: GridRow,
  stratum: number,
  layout: CountsLayout,
): { column: number; message: string }[] {
  const column = 1 + 2 * stratum;
  const first = parsedCount(row.cells[column - 1] ?? '');
  const second = parsedCount(row.cells[column] ?? '');
  const problems = [first, second].flatMap((parsed, at) =>
    parsed.ok ? [] : [{ column: column + at, message: parsed.issue }],
  );
  if (layout === 'eventsAndTotal' && first.ok && second.ok && first.value > second.value) {
    const message = `${first.value} with the event cannot be among ${second.value} in all.`;
    return [{ column, message }];
  }
  return problems;
}

function typedRows(grid: CountsGrid): TypedRow[] {
  return grid.rows.flatMap((row) =>
    grid.strata.map((stratum, at) => ({
      level: row.level.trim(),
      stratum: grid.stratified ? stratum.trim() : null,
      events: countAt(row, 2 * at),
      other: countAt(row, 2 * at + 1),
    })),
  );
}

function countAt(row: GridRow, cell: number): number {
  const parsed = parsedCount(row.cells[cell] ?? '');
  return parsed.ok ? parsed.value : 0;
}
