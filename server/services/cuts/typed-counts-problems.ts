import type { TypedCountsRequest } from '#shared/api';
import type { FieldProblem } from '../../errors/server-issue';

/** What is wrong in typed counts, beside the cell that it is about. */
export function typedCountsProblems(request: TypedCountsRequest): readonly FieldProblem[] {
  return [
    ...request.rows.flatMap((row, index) => [
      ...stratumProblems(request, row, index),
      ...countProblems(request, row, index),
      ...repeatProblems(request, row, index),
    ]),
    ...levelProblems(request),
  ];
}

type TypedRow = TypedCountsRequest['rows'][number];

function problem(index: number, field: keyof TypedRow, message: string): FieldProblem {
  return { path: `rows.${String(index)}.${field}`, message };
}

function stratumProblems(
  { stratumLabel }: TypedCountsRequest,
  { stratum }: TypedRow,
  index: number,
): readonly FieldProblem[] {
  const given = stratum !== null && stratum !== '';
  if (stratumLabel === null && given) {
    return [problem(index, 'stratum', 'Say what the strata are, or leave them out.')];
  }
  if (stratumLabel === null || given) return [];
  return [problem(index, 'stratum', 'Name the stratum of this row.')];
}

function countProblems(
  { layout }: TypedCountsRequest,
  { events, other }: TypedRow,
  index: number,
): readonly FieldProblem[] {
  if (layout !== 'eventsAndTotal' || events <= other) return [];
  const [counted, total] = [String(events), String(other)];
  const message = `There are more events (${counted}) than people in total (${total}).`;
  return [problem(index, 'events', message)];
}

function repeatProblems(
  { rows }: TypedCountsRequest,
  { level, stratum }: TypedRow,
  index: number,
): readonly FieldProblem[] {
  const earlier = rows
    .slice(0, index)
    .findIndex((row) => row.level === level && (row.stratum ?? '') === (stratum ?? ''));
  if (earlier < 0) return [];
  const message = `Row ${String(earlier + 1)} has the same group already.`;
  return [problem(index, 'level', message)];
}

function levelProblems({ rows }: TypedCountsRequest): readonly FieldProblem[] {
  if (new Set(rows.map(({ level }) => level)).size > 1) return [];
  return [{ path: 'rows', message: 'Type at least two groups, so that they can be compared.' }];
}
