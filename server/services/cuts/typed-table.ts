import { createHash } from 'node:crypto';
import type { CutProfile, TypedCountsRequest } from '#shared/api';
import {
  BLANK_REASON,
  columnIdsFor,
  countedOutcomeColumn,
  COUNTED_OUTCOME_COLUMN_ID,
  levelsOfCodes,
  orderCodes,
  sentenceLabelOfName,
  type CodeBook,
  type CodeBookColumn,
  type ColumnKind,
  type CountLayout,
} from '#shared/code-book';

/** Counts that were typed, as a table that is stored like one from a file. */
export interface TypedTable {
  /** Cells column by column, in the order of the profile's columns. */
  readonly cells: readonly (readonly string[])[];
  readonly profile: CutProfile;
  readonly codeBook: CodeBook;
  readonly sha256: string;
}

/** Lays typed counts out as a table, with the code book that belongs to them. */
export function typedTable(request: TypedCountsRequest): TypedTable {
  const columns = typedColumns(request);
  const names = columns.map(({ name }) => name);
  const ids = columnIdsFor(names, new Map(), [COUNTED_OUTCOME_COLUMN_ID]);
  const profile = profileOf(columns, ids, request.rows.length);
  const sha256 = createHash('sha256').update(JSON.stringify(request.rows)).digest('hex');
  return {
    cells: columns.map(({ cells }) => cells),
    profile,
    codeBook: codeBookOf(request, profile),
    sha256,
  };
}

interface TypedColumn {
  readonly name: string;
  readonly kind: ColumnKind;
  readonly cells: readonly string[];
}

const COUNT_NAMES = {
  eventsAndTotal: ['Events', 'Total'],
  casesAndControls: ['Cases', 'Controls'],
} as const;

function typedColumns({
  exposureLabel,
  stratumLabel,
  layout,
  rows,
}: TypedCountsRequest): readonly TypedColumn[] {
  const [events, other] = COUNT_NAMES[layout];
  const strata = rows.map(({ stratum }) => stratum ?? '');
  return distinctNames([
    grouping(
      exposureLabel,
      rows.map(({ level }) => level),
    ),
    ...(stratumLabel === null ? [] : [grouping(stratumLabel, strata)]),
    { name: events, kind: 'count', cells: rows.map((row) => String(row.events)) },
    { name: other, kind: 'count', cells: rows.map((row) => String(row.other)) },
  ]);
}

function grouping(name: string, cells: readonly string[]): TypedColumn {
  const { ground } = orderCodes([...new Set(cells)]);
  const ordered = ground === 'bounds' || ground === 'words';
  return { name, kind: ordered ? 'orderedCategory' : 'category', cells };
}

/** A person may call an exposure "Total"; columns are known by their names. */
function distinctNames(columns: readonly TypedColumn[]): readonly TypedColumn[] {
  const names = columns.map(({ name }) => name);
  return columns.map((column, at) =>
    names.indexOf(column.name) === at ? column : { ...column, name: `${column.name} (2)` },
  );
}

function profileOf(
  columns: readonly TypedColumn[],
  ids: readonly string[],
  rows: number,
): CutProfile {
  return {
    fileName: 'Typed counts',
    rows,
    columns: columns.map((column, at) => profileColumn(column, ids[at] ?? '')),
    warnings: [],
    usedOptions: { delimiter: null, encoding: null, decimalMark: '.', sheet: null },
    sheets: [],
  };
}

function profileColumn(
  { name, kind, cells }: TypedColumn,
  columnId: string,
): CutProfile['columns'][number] {
  const counts = new Map<string, number>();
  for (const cell of cells) counts.set(cell, (counts.get(cell) ?? 0) + 1);
  const numbers = kind === 'count' ? cells.map(Number) : [];
  const some = numbers.length > 0;
  return {
    columnId,
    name,
    guessedKind: kind,
    distinct: counts.size,
    blank: 0,
    numeric: numbers.length,
    minimum: some ? Math.min(...numbers) : null,
    maximum: some ? Math.max(...numbers) : null,
    sum: some ? numbers.reduce((sum, number) => sum + number, 0) : null,
    values: [...counts].map(([value, count]) => ({ value, count })),
    truncated: false,
  };
}

/** Levels stand in the order in which they were typed. */
function codeBookOf({ layout, outcomeLabel }: TypedCountsRequest, profile: CutProfile): CodeBook {
  const counted = layoutOf(
    layout,
    profile.columns.slice(-2).map(({ columnId }) => columnId),
  );
  const outcome = countedOutcomeColumn(counted);
  const named = outcome === null ? [] : [withLabel(outcome, outcomeLabel)];
  return {
    schemaVersion: 1,
    layout: counted,
    columns: [...profile.columns.map(columnOf), ...named],
  };
}

function layoutOf(
  kind: TypedCountsRequest['layout'],
  [first = '', second = '']: readonly string[],
): CountLayout {
  return kind === 'eventsAndTotal'
    ? { kind, eventsColumnId: first, totalColumnId: second }
    : { kind, casesColumnId: first, controlsColumnId: second };
}

function columnOf({
  columnId,
  name,
  guessedKind,
  values,
}: CutProfile['columns'][number]): CodeBookColumn {
  const codes = guessedKind === 'count' ? [] : values.map(({ value }) => value);
  const levels = levelsOfCodes(codes);
  return {
    id: columnId,
    name,
    kind: guessedKind,
    label: name,
    sentenceLabel: sentenceLabelOfName(name),
    unit: null,
    levels,
    bands: [],
    missingCodes: [{ code: '', reason: BLANK_REASON }],
    referenceLevelId: guessedKind === 'orderedCategory' ? (levels[0]?.id ?? null) : null,
  };
}

function withLabel(column: CodeBookColumn, label: string): CodeBookColumn {
  return { ...column, label, sentenceLabel: sentenceLabelOfName(label) };
}
