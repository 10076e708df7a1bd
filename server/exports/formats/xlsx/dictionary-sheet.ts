import type { CodeBookBand, CodeBookColumn, ColumnKind } from '#shared/code-book';
import type { ExportedCodeBook } from '../../export-request';
import {
  cellsRow,
  emptyCell,
  lookingLike,
  numberCell,
  words,
  type SheetCell,
  type SheetPlan,
  type SheetRow,
} from './sheet-plan';

/** The code books behind the report: a row for each level, band and missing code of a column. */
export function dictionarySheet(codeBooks: readonly ExportedCodeBook[]): SheetPlan {
  return {
    name: 'Data dictionary',
    rows: [
      cellsRow(
        lookingLike(
          HEADS.map((text) => words(text)),
          { bold: true, bottom: 'thin' },
        ),
      ),
      ...codeBooks.flatMap((book) =>
        book.codeBook.columns.flatMap((column) => columnRows(column, book)),
      ),
    ],
    widestColumn: 220,
    headRows: { first: 1, last: 1 },
    frozenColumns: 0,
    filtered: true,
  };
}

const HEADS = [
  'Data set',
  'Code book',
  'Variable',
  'Label',
  'Kind',
  'Unit',
  'Entry',
  'Order',
  'Meaning',
  'Codes in the file',
  'Reference',
] as const;

const KINDS: Readonly<Record<ColumnKind, string>> = {
  category: 'category',
  orderedCategory: 'ordered category',
  number: 'number',
  date: 'date',
  personTime: 'person-time',
  count: 'count',
  identifier: 'identifier',
  pairIdentifier: 'identifier of a pair',
  clusterIdentifier: 'identifier of a cluster',
  ignored: 'not used',
};

/** One row of a column's entries; a column without any has a single row. */
interface Entry {
  readonly entry: string;
  readonly order: number | null;
  readonly meaning: string;
  readonly codes: string;
  readonly isReference: boolean;
}

function columnRows(column: CodeBookColumn, book: ExportedCodeBook): readonly SheetRow[] {
  const about = [
    words(book.dataSetName),
    numberCell(book.number, '0', { align: 'center' }),
    words(column.name),
    words(column.label),
    words(KINDS[column.kind]),
    words(column.unit ?? ''),
  ];
  const entries = entriesOf(column);
  const rows = entries.length === 0 ? [[]] : entries.map(entryCells);
  return rows.map((cells) => cellsRow([...about, ...cells]));
}

function entryCells({ entry, order, meaning, codes, isReference }: Entry): readonly SheetCell[] {
  return [
    words(entry),
    order === null ? emptyCell() : numberCell(order, '0', { align: 'center' }),
    words(meaning),
    words(codes),
    words(isReference ? 'reference' : ''),
  ];
}

function entriesOf(column: CodeBookColumn): readonly Entry[] {
  const { referenceLevelId } = column;
  return [
    ...column.levels.map((level, index) => ({
      entry: 'level',
      order: index + 1,
      meaning: level.label,
      codes: level.codes.map(codeWords).join('; '),
      isReference: level.id === referenceLevelId,
    })),
    ...column.bands.map((band, index) => ({
      entry: 'band',
      order: index + 1,
      meaning: band.label,
      codes: bandWords(band),
      isReference: band.id === referenceLevelId,
    })),
    ...column.missingCodes.map(({ code, reason }) => ({
      entry: 'missing',
      order: null,
      meaning: reason,
      codes: codeWords(code),
      isReference: false,
    })),
  ];
}

function codeWords(code: string): string {
  return code === '' ? '(blank)' : code;
}

function bandWords({ lower, upper }: CodeBookBand): string {
  const parts = [
    ...(lower === null ? [] : [`from ${String(lower)}`]),
    ...(upper === null ? [] : [`below ${String(upper)}`]),
  ];
  return parts.length === 0 ? 'every number' : parts.join(', ');
}
