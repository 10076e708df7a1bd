import {
  COUNTED_OUTCOME_COLUMN_ID,
  factorLevels,
  parseNumber,
  type CodeBook,
  type CodeBookColumn,
} from '#shared/code-book';
import type { EncodedCut } from '../encoded-cut';
import type { Tally, TallyRequest } from '../tally';

type Cells = Readonly<Record<string, string>>;

interface WeightedRecord {
  readonly record: Cells;
  readonly weight: number;
}

interface Meaning {
  readonly levelId: string | null;
  readonly reason: string;
}

interface Sums {
  readonly cells: Map<string, number>;
  readonly leftOut: Map<string, number>;
  restricted: number;
}

/** Counts record by record, as the definition of a tally reads; slow, for comparison in tests. */
export function naiveTally(cut: EncodedCut, codeBook: CodeBook, request: TallyRequest): Tally {
  const sums: Sums = { cells: new Map(), leftOut: new Map(), restricted: 0 };
  for (let row = 0; row < cut.rows; row += 1) {
    for (const { record, weight } of recordsOf(cut, codeBook, row)) {
      addRecord(sums, codeBook, request, record, weight);
    }
  }
  return {
    axes: request.columnIds.map((columnId) => ({
      columnId,
      levelIds: levelsOf(codeBook, columnId),
    })),
    cells: entriesOf(sums.cells).map(([at, count]) => ({ at: at as number[], count })),
    counted: entriesOf(sums.cells).reduce((sum, [, count]) => sum + count, 0),
    restricted: sums.restricted,
    leftOut: entriesOf(sums.leftOut).map(([place, count]) => {
      const [columnId = '', reason = ''] = place as string[];
      return { columnId, reason, count };
    }),
  };
}

function addRecord(
  sums: Sums,
  codeBook: CodeBook,
  { columnIds, restrictions }: TallyRequest,
  record: Cells,
  weight: number,
): void {
  const meaning = (columnId: string): Meaning =>
    meaningOf(columnOf(codeBook, columnId), record[columnId] ?? '');
  const met = restrictions.every(({ columnId, levelIds }) => {
    const { levelId } = meaning(columnId);
    return levelId !== null && levelIds.includes(levelId);
  });
  if (!met) {
    sums.restricted += weight;
    return;
  }
  const lacking = columnIds.find((columnId) => meaning(columnId).levelId === null);
  if (lacking !== undefined) {
    increase(sums.leftOut, [lacking, meaning(lacking).reason], weight);
    return;
  }
  const at = columnIds.map((id) => levelsOf(codeBook, id).indexOf(meaning(id).levelId ?? ''));
  increase(sums.cells, at, weight);
}

function levelsOf(codeBook: CodeBook, columnId: string): readonly string[] {
  return factorLevels(columnOf(codeBook, columnId)).map(({ id }) => id);
}

function increase(counts: Map<string, number>, place: unknown, by: number): void {
  const key = JSON.stringify(place);
  counts.set(key, (counts.get(key) ?? 0) + by);
}

function entriesOf(counts: ReadonlyMap<string, number>): readonly (readonly [unknown, number])[] {
  return [...counts]
    .filter(([, count]) => count > 0)
    .map(([key, count]) => [JSON.parse(key) as unknown, count]);
}

function recordsOf(cut: EncodedCut, { layout }: CodeBook, row: number): readonly WeightedRecord[] {
  const record = Object.fromEntries(
    [...cut.columns].map(([id, { dictionary, codes }]) => [id, dictionary[codes[row] ?? 0] ?? '']),
  );
  const number = (columnId: string): number =>
    parseNumber(record[columnId] ?? '', cut.decimalMark) ?? 0;
  const both = (event: number, nonEvent: number): readonly WeightedRecord[] => [
    { record: { ...record, [COUNTED_OUTCOME_COLUMN_ID]: 'event' }, weight: event },
    { record: { ...record, [COUNTED_OUTCOME_COLUMN_ID]: 'non-event' }, weight: nonEvent },
  ];
  switch (layout.kind) {
    case 'records':
      return [{ record, weight: 1 }];
    case 'count':
      return [{ record, weight: number(layout.columnId) }];
    case 'eventsAndTotal': {
      const events = number(layout.eventsColumnId);
      return both(events, number(layout.totalColumnId) - events);
    }
    case 'casesAndControls':
      return both(number(layout.casesColumnId), number(layout.controlsColumnId));
  }
}

function meaningOf(column: CodeBookColumn, value: string): Meaning {
  if (column.id === COUNTED_OUTCOME_COLUMN_ID) return { levelId: value, reason: '' };
  const missing = column.missingCodes.find(({ code }) => code === value);
  if (missing !== undefined) return { levelId: null, reason: missing.reason };
  if (value.trim() === '') return { levelId: null, reason: 'Blank' };
  if (column.kind !== 'number') {
    const level = column.levels.find(({ codes }) => codes.includes(value));
    return { levelId: level?.id ?? null, reason: 'Value not in the code book' };
  }
  const number = Number(value);
  if (Number.isNaN(number)) return { levelId: null, reason: 'Not a number' };
  const band = column.bands.find(
    ({ lower, upper }) => (lower === null || lower <= number) && (upper === null || number < upper),
  );
  return { levelId: band?.id ?? null, reason: 'Outside the bands' };
}

function columnOf(codeBook: CodeBook, columnId: string): CodeBookColumn {
  const column = codeBook.columns.find(({ id }) => id === columnId);
  if (column === undefined) throw new Error(`no column ${columnId}`);
  return column;
}
