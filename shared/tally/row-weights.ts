import { failure, success, type Result } from '#shared/core';
import {
  countFault,
  COUNTED_OUTCOME_LEVEL_IDS,
  parseNumber,
  type CodeBook,
  type CountLayout,
} from '#shared/code-book';
import type { Codes, EncodedCut } from './encoded-cut';
import type { TallyIssue } from './tally-issue';

/** How many records a row stands for: the number that a code of a count column means. */
export interface CountColumn {
  readonly codes: Codes;
  readonly numbers: Float64Array;
}

/**
 * One way in which every row counts. Layouts with two counts have two: the events and the rest.
 * `outcomeLevel` is the place of the counted outcome's level; `minus` is taken off `counts`;
 * without `counts` a row is one record.
 */
export interface RowWeights {
  readonly outcomeLevel: number | null;
  readonly counts: CountColumn | null;
  readonly minus: CountColumn | null;
}

const [EVENT, NON_EVENT] = [0, 1];

/** The ways in which the rows of a cut count under its layout. */
export function rowWeights(
  cut: EncodedCut,
  codeBook: CodeBook,
): Result<readonly RowWeights[], TallyIssue> {
  const { layout } = codeBook;
  switch (layout.kind) {
    case 'records':
      return success([{ outcomeLevel: null, counts: null, minus: null }]);
    case 'count':
      return oneCount(cut, codeBook, layout.columnId);
    case 'eventsAndTotal':
      return eventsAndTotal(cut, codeBook, layout);
    case 'casesAndControls':
      return casesAndControls(cut, codeBook, layout);
  }
}

/** Why the rows of a cut can't be counted by the columns of its layout; null when they can. */
export function checkCounts(cut: EncodedCut, codeBook: CodeBook): TallyIssue | null {
  const weights = rowWeights(cut, codeBook);
  return weights.ok ? null : weights.issue;
}

/** Places of the counted outcome's levels, by id. */
export function outcomeLevelPlace(levelId: string): number {
  return levelId === COUNTED_OUTCOME_LEVEL_IDS[0] ? EVENT : NON_EVENT;
}

type Weights = Result<readonly RowWeights[], TallyIssue>;

function oneCount(cut: EncodedCut, codeBook: CodeBook, columnId: string): Weights {
  const counts = countColumn(cut, codeBook, columnId);
  if (!counts.ok) return counts;
  return success([{ outcomeLevel: null, counts: counts.value, minus: null }]);
}

function casesAndControls(
  cut: EncodedCut,
  codeBook: CodeBook,
  layout: Extract<CountLayout, { readonly kind: 'casesAndControls' }>,
): Weights {
  const cases = countColumn(cut, codeBook, layout.casesColumnId);
  const controls = countColumn(cut, codeBook, layout.controlsColumnId);
  if (!cases.ok) return cases;
  if (!controls.ok) return controls;
  return success([
    { outcomeLevel: EVENT, counts: cases.value, minus: null },
    { outcomeLevel: NON_EVENT, counts: controls.value, minus: null },
  ]);
}

function eventsAndTotal(
  cut: EncodedCut,
  codeBook: CodeBook,
  layout: Extract<CountLayout, { readonly kind: 'eventsAndTotal' }>,
): Weights {
  const events = countColumn(cut, codeBook, layout.eventsColumnId);
  const total = countColumn(cut, codeBook, layout.totalColumnId);
  if (!events.ok) return events;
  if (!total.ok) return total;
  const excess = excessRow(events.value, total.value, cut.rows);
  if (excess !== null) return failure(excess);
  return success([
    { outcomeLevel: EVENT, counts: events.value, minus: null },
    { outcomeLevel: NON_EVENT, counts: total.value, minus: events.value },
  ]);
}

function excessRow(events: CountColumn, total: CountColumn, rows: number): TallyIssue | null {
  for (let row = 0; row < rows; row += 1) {
    const [happened, all] = [numberAt(events, row), numberAt(total, row)];
    if (happened > all) {
      return { code: 'eventsExceedTotal', facts: { row: row + 1, events: happened, total: all } };
    }
  }
  return null;
}

function numberAt({ codes, numbers }: CountColumn, row: number): number {
  return numbers[codes[row] ?? 0] ?? 0;
}

function countColumn(
  cut: EncodedCut,
  codeBook: CodeBook,
  columnId: string,
): Result<CountColumn, TallyIssue> {
  const column = codeBook.columns.find(({ id }) => id === columnId);
  const encoded = cut.columns.get(columnId);
  const name = column?.label ?? columnId;
  if (encoded === undefined) return failure({ code: 'columnNotInData', facts: { column: name } });
  const { dictionary, codes } = encoded;
  const fault = dictionary.findIndex((value) => countFault(value, cut.decimalMark) !== null);
  if (fault >= 0) return failure(unusable(name, dictionary[fault] ?? '', codes.indexOf(fault)));
  const numbers = Float64Array.from(
    dictionary,
    (value) => parseNumber(value, cut.decimalMark) ?? 0,
  );
  return success({ codes, numbers });
}

function unusable(column: string, value: string, row: number): TallyIssue {
  return { code: 'countNotUsable', facts: { column, value, row: row + 1 } };
}
