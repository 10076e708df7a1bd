import type { DecimalMark } from '#shared/code-book';
import type { IntakeWarning } from '#shared/api';
import type { ColumnNames } from '../encode/column-names';
import type { SkippedRows } from '../encode/table-encoder';
import type { MarkVotes } from './number-totals';

/** What the warnings about a file as a whole go by. */
export interface FileFacts {
  readonly columnNames: ColumnNames;
  /** The names as they stand in the file. */
  readonly givenNames: readonly string[];
  readonly columnIds: readonly string[];
  readonly skipped: SkippedRows;
  readonly decimalMark: DecimalMark;
  readonly votes: MarkVotes;
  readonly delimited: boolean;
}

/** What is odd in a file as a whole, in plain words. */
export function fileWarnings(facts: FileFacts): readonly IntakeWarning[] {
  return [
    ...repeatedNames(facts),
    ...unnamedColumns(facts),
    ...headerLooksLikeData(facts),
    ...oneColumn(facts),
    ...repeatedHeader(facts.skipped),
    ...blankRows(facts.skipped),
    ...decimalMarksDiffer(facts),
  ];
}

function warning(code: string, message: string, columnId: string | null = null): IntakeWarning {
  return { code, columnId, message };
}

function repeatedNames({ columnNames, columnIds }: FileFacts): readonly IntakeWarning[] {
  return columnNames.repeated.map((name) => {
    const first = columnIds[columnNames.names.indexOf(name)] ?? null;
    const message = `Several columns are named "${name}". The later ones got a number.`;
    return warning('repeatedColumnName', message, first);
  });
}

function unnamedColumns({ columnNames, columnIds }: FileFacts): readonly IntakeWarning[] {
  return columnNames.unnamed.map((place) =>
    warning(
      'unnamedColumn',
      `Column ${String(place)} has no name in the file.`,
      columnIds[place - 1] ?? null,
    ),
  );
}

function headerLooksLikeData({ givenNames }: FileFacts): readonly IntakeWarning[] {
  const numbers = givenNames.filter((name) => /^\s*-?\d+([.,]\d+)?\s*$/.test(name));
  if (numbers.length * 2 < givenNames.length) return [];
  const message = 'The first row holds numbers, but it is taken for the column names.';
  return [warning('headerLooksLikeData', message)];
}

function oneColumn({ givenNames, delimited }: FileFacts): readonly IntakeWarning[] {
  if (!delimited || givenNames.length !== 1) return [];
  const message = 'Only one column was found. If there are more, choose what separates them.';
  return [warning('oneColumn', message)];
}

const SHOWN_LINES = 5;

function repeatedHeader({ repeatedHeaderLines }: SkippedRows): readonly IntakeWarning[] {
  if (repeatedHeaderLines.length === 0) return [];
  const shown = repeatedHeaderLines.slice(0, SHOWN_LINES).join(', ');
  const more = repeatedHeaderLines.length > SHOWN_LINES ? ' and later ones' : '';
  const message = `The column names come again in line ${shown}${more}; left out.`;
  return [warning('repeatedHeader', message)];
}

function blankRows({ blank }: SkippedRows): readonly IntakeWarning[] {
  if (blank === 0) return [];
  const rows = blank === 1 ? '1 blank row was' : `${String(blank)} blank rows were`;
  return [warning('blankRows', `${rows} left out.`)];
}

function decimalMarksDiffer({ decimalMark, votes }: FileFacts): readonly IntakeWarning[] {
  const other = decimalMark === ',' ? votes.point : votes.comma;
  const mine = decimalMark === ',' ? votes.comma : votes.point;
  if (other === 0 || mine === 0) return [];
  const [read, unread] = decimalMark === ',' ? ['comma', 'point'] : ['point', 'comma'];
  const message =
    `Decimals are written with a ${read} in some values and with a ${unread} in others. ` +
    `Those with a ${unread} are read as text.`;
  return [warning('decimalMarksDiffer', message)];
}
