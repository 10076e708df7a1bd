import {
  carryOver,
  columnIdsFor,
  COUNTED_OUTCOME_COLUMN_ID,
  guessKind,
  proposeCodeBook,
  type CodeBook,
  type CodeBookDifference,
  type DecimalMark,
  type ProfiledColumn,
} from '#shared/code-book';
import type { CutProfile, IntakeWarning, ReadingOptions } from '#shared/api';
import { nameColumns, type ColumnNames } from '../encode/column-names';
import { decodeText, type TextEncoding } from '../encode/encoding-watch';
import type { TableEncoder } from '../encode/table-encoder';
import type { ColumnSummary } from './column-summary';
import { columnWarnings } from './column-warnings';
import { decimalMarkOf, sumOfVotes } from './decimal-mark';
import { fileWarnings } from './file-warnings';

/** How a file turned out to be written, and what its reader noticed. */
export interface ReadingFacts {
  readonly fileName: string;
  readonly encoding: TextEncoding;
  readonly delimiter: string | null;
  readonly sheet: string | null;
  readonly sheets: readonly string[];
  readonly warnings: readonly IntakeWarning[];
}

/** What an upload shows: the profile, and a code book to start from. */
export interface ProfiledTable {
  readonly profile: CutProfile;
  readonly proposal: {
    readonly codeBook: CodeBook;
    readonly differences: readonly CodeBookDifference[];
  };
}

/**
 * Profiles an encoded table from the summaries of its columns, and proposes its code book.
 *
 * With the code book of the data set that it belongs to, columns keep their ids and the proposal
 * is that code book carried over.
 */
export function profileTable(
  table: TableEncoder,
  summaries: readonly ColumnSummary[],
  reading: ReadingFacts,
  given: ReadingOptions,
  previous: CodeBook | null,
): ProfiledTable {
  const described = describeColumns(table, summaries, reading, given, previous);
  const profile: CutProfile = {
    fileName: reading.fileName,
    rows: table.rows,
    columns: described.columns.map((column) => ({ ...column, values: [...column.values] })),
    warnings: [
      ...reading.warnings,
      ...warningsAboutFile(table, reading, described),
      ...warningsAboutColumns(table, described),
    ],
    usedOptions: {
      delimiter: reading.delimiter,
      encoding: reading.encoding,
      decimalMark: described.decimalMark,
      sheet: reading.sheet,
    },
    sheets: [...reading.sheets],
  };
  return { profile, proposal: proposalFor(profile, previous) };
}

interface DescribedColumns {
  readonly columns: readonly ProfiledColumn[];
  readonly summaries: readonly ColumnSummary[];
  readonly decimalMark: DecimalMark;
  readonly givenNames: readonly string[];
  readonly columnNames: ColumnNames;
}

function describeColumns(
  table: TableEncoder,
  summaries: readonly ColumnSummary[],
  { encoding, delimiter }: ReadingFacts,
  given: ReadingOptions,
  previous: CodeBook | null,
): DescribedColumns {
  const givenNames = table.columns.map(({ name }) => decodeText(name, encoding));
  const columnNames = nameColumns(givenNames);
  const ids = idsOf(columnNames.names, previous);
  const votes = summaries.map(({ numbers }) => numbers.votes);
  const decimalMark = given.decimalMark ?? decimalMarkOf(votes, delimiter);
  const columns = summaries.map((summary, position) => ({
    columnId: ids[position] ?? '',
    ...profileColumn(summary, columnNames.names[position] ?? '', decimalMark, table.rows),
  }));
  return { columns, summaries, decimalMark, givenNames, columnNames };
}

function idsOf(names: readonly string[], previous: CodeBook | null): readonly string[] {
  const known = new Map(previous?.columns.map(({ name, id }) => [name, id]) ?? []);
  return columnIdsFor(names, known, [COUNTED_OUTCOME_COLUMN_ID]);
}

function profileColumn(
  { distinct, blank, numbers, values, truncated }: ColumnSummary,
  name: string,
  decimalMark: DecimalMark,
  rows: number,
): Omit<ProfiledColumn, 'columnId'> {
  const { rows: numeric, minimum, maximum, sum } = numbers.under(decimalMark);
  const contents = { name, distinct, blank, numeric, minimum, maximum, sum, values, truncated };
  return { ...contents, guessedKind: guessKind(contents, rows) };
}

function warningsAboutFile(
  table: TableEncoder,
  reading: ReadingFacts,
  { columns, summaries, decimalMark, givenNames, columnNames }: DescribedColumns,
): readonly IntakeWarning[] {
  return fileWarnings({
    columnNames,
    givenNames,
    columnIds: columns.map(({ columnId }) => columnId),
    skipped: table.skipped,
    decimalMark,
    votes: sumOfVotes(summaries.map(({ numbers }) => numbers.votes)),
    delimited: reading.delimiter !== null,
  });
}

function warningsAboutColumns(
  table: TableEncoder,
  { columns, summaries, decimalMark }: DescribedColumns,
): readonly IntakeWarning[] {
  return columns.flatMap((column, position) => {
    const numbers = summaries[position]?.numbers;
    if (numbers === undefined) return [];
    const { groupedComma, groupedPoint } = numbers.votes;
    const unreadGrouped = decimalMark === ',' ? groupedPoint : groupedComma;
    const totals = numbers.under(decimalMark);
    return columnWarnings({ column, numbers: totals, unreadGrouped, rows: table.rows });
  });
}

function proposalFor(profile: CutProfile, previous: CodeBook | null): ProfiledTable['proposal'] {
  return previous === null
    ? { codeBook: proposeCodeBook(profile), differences: [] }
    : carryOver(previous, profile);
}
