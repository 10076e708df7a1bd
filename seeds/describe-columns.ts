import type { CodeBook, CodeBookColumn, CodeBookLevel, MissingCode } from '#shared/code-book';

/** Words of one level, by its code in the file, in the order of print. */
export type LevelWording = readonly [code: string, label: string, sentenceLabel: string];

/** What a demonstration says of a column beyond intake's proposal. */
export interface ColumnDescription extends Partial<Omit<CodeBookColumn, 'id' | 'name' | 'levels'>> {
  readonly levels?: readonly LevelWording[];
}

/** A code book with some of its columns described, by column id. */
export function describeColumns(
  codeBook: CodeBook,
  descriptions: Readonly<Record<string, ColumnDescription>>,
): CodeBook {
  const columns = codeBook.columns.map((column) => {
    const description = descriptions[column.id];
    return description === undefined ? column : described(column, description);
  });
  return { ...codeBook, columns };
}

/** The missing codes that intake proposes, and more. */
export function alsoMissing(...codes: readonly MissingCode[]): readonly MissingCode[] {
  return [{ code: '', reason: 'Not answered' }, ...codes];
}

function described(column: CodeBookColumn, { levels, ...rest }: ColumnDescription): CodeBookColumn {
  const worded = levels === undefined ? column.levels : wordedLevels(column.levels, levels);
  return { ...column, ...rest, levels: worded };
}

/** Levels that are not worded leave the list: their codes are missing codes. */
function wordedLevels(
  present: readonly CodeBookLevel[],
  words: readonly LevelWording[],
): readonly CodeBookLevel[] {
  return words.map(([code, label, sentenceLabel]) => {
    const level = present.find(({ codes, id }) => codes.includes(code) || id === code);
    if (level === undefined) throw new Error(`The demonstration file has no code ${code}.`);
    return { ...level, label, sentenceLabel };
  });
}
