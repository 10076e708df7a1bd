import { COUNTED_OUTCOME_COLUMN_ID, type CodeBook, type CodeBookColumn } from './code-book';
import { carryColumn, type CodeBookDifference } from './carry-column';
import type { FileProfile } from './profile';
import { proposeColumn } from './propose-column';
import { countColumnIds } from './propose-layout';

/** A code book carried over to new data, and what a person should look at. */
export interface CarriedCodeBook {
  readonly codeBook: CodeBook;
  readonly differences: readonly CodeBookDifference[];
}

/**
 * Carries a code book over to new data of the same data set.
 *
 * Columns are found by name and keep their ids, words, levels and order. Values that the code book
 * does not know become levels (in a column of numbers, missing codes), new columns are proposed,
 * and nothing is dropped: a column or level that the new data lack stays, since older cuts use it.
 */
export function carryOver(previous: CodeBook, profile: FileProfile): CarriedCodeBook {
  const carried = previous.columns.map((column) => carriedColumn(previous, column, profile));
  const known = new Set(previous.columns.map(({ name }) => name));
  const fresh = profile.columns.filter(({ name }) => !known.has(name));
  const outcome = carried.filter(({ column }) => column.id === COUNTED_OUTCOME_COLUMN_ID);
  const others = carried.filter(({ column }) => column.id !== COUNTED_OUTCOME_COLUMN_ID);
  return {
    codeBook: {
      ...previous,
      columns: [
        ...others.map(({ column }) => column),
        ...fresh.map(proposeColumn),
        ...outcome.map(({ column }) => column),
      ],
    },
    differences: [...carried.flatMap(({ differences }) => differences), ...fresh.map(newColumn)],
  };
}

function carriedColumn(
  previous: CodeBook,
  column: CodeBookColumn,
  profile: FileProfile,
): ReturnType<typeof carryColumn> {
  if (column.id === COUNTED_OUTCOME_COLUMN_ID) return { column, differences: [] };
  const contents = profile.columns.find(({ name }) => name === column.name);
  if (contents !== undefined) return carryColumn(column, contents);
  return { column, differences: [goneColumn(previous, column)] };
}

function goneColumn(previous: CodeBook, column: CodeBookColumn): CodeBookDifference {
  const counts = countColumnIds(previous.layout).includes(column.id);
  return {
    code: counts ? 'countColumnGone' : 'columnGone',
    columnId: column.id,
    levelId: null,
    message: counts
      ? `The new data have no column "${column.name}", which the rows are counted by.`
      : `The new data have no column "${column.name}".`,
  };
}

function newColumn(contents: FileProfile['columns'][number]): CodeBookDifference {
  return {
    code: 'columnNew',
    columnId: contents.columnId,
    levelId: null,
    message: `The column "${contents.name}" is new.`,
  };
}
