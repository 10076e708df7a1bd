import type { CodeBook, CodeBookColumn, CountLayout } from './code-book';
import type { FileProfile } from './profile';
import { proposeColumn } from './propose-column';
import { countColumnIds, countedOutcomeColumn, proposeLayout } from './propose-layout';

/**
 * A code book to start from, as a file's contents suggest it.
 *
 * Levels come in their natural order, blanks and usual words for no answer are marked missing, and
 * two count columns bring the outcome column that they stand for.
 */
export function proposeCodeBook(profile: FileProfile): CodeBook {
  const layout = proposeLayout(profile.columns);
  const columns = profile.columns
    .map(proposeColumn)
    .map((column) => withoutIdleCount(column, layout));
  const outcome = countedOutcomeColumn(layout);
  return {
    schemaVersion: 1,
    layout,
    columns: outcome === null ? columns : [...columns, outcome],
  };
}

/** A count that the layout does not use is an ordinary number. */
function withoutIdleCount(column: CodeBookColumn, layout: CountLayout): CodeBookColumn {
  const idle = column.kind === 'count' && !countColumnIds(layout).includes(column.id);
  return idle ? { ...column, kind: 'number' } : column;
}
