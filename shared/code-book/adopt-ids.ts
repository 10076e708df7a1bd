import type { CodeBook, CodeBookColumn, CodeBookLevel, CountLayout } from './code-book';

/**
 * The code book with the ids that another one of the same data set gave its columns and levels.
 *
 * Columns are matched by name, levels by a code they share. Where the ids agree already nothing
 * changes; it serves for data that were described before anybody knew whose they are.
 */
export function adoptIds(codeBook: CodeBook, previous: CodeBook): CodeBook {
  const renamed = new Map(
    codeBook.columns.map(({ id, name }) => [id, columnNamed(previous, name)?.id ?? id]),
  );
  return {
    ...codeBook,
    layout: renamedLayout(codeBook.layout, (id) => renamed.get(id) ?? id),
    columns: codeBook.columns.map((column) => adopted(column, columnNamed(previous, column.name))),
  };
}

function columnNamed(codeBook: CodeBook, name: string): CodeBookColumn | undefined {
  return codeBook.columns.find((column) => column.name === name);
}

function adopted(column: CodeBookColumn, previous: CodeBookColumn | undefined): CodeBookColumn {
  if (previous === undefined) return column;
  const ids = adoptedLevelIds(column.levels, previous.levels);
  const levels = column.levels.map((level) => ({ ...level, id: ids.get(level.id) ?? level.id }));
  const reference = column.referenceLevelId;
  return {
    ...column,
    id: previous.id,
    levels,
    referenceLevelId: reference === null ? null : (ids.get(reference) ?? reference),
  };
}

/** New id by present id; a level that keeps its own id never loses it to another. */
function adoptedLevelIds(
  levels: readonly CodeBookLevel[],
  previous: readonly CodeBookLevel[],
): ReadonlyMap<string, string> {
  const known = new Set(previous.map(({ id }) => id));
  const kept = levels.filter(({ id }) => known.has(id)).map(({ id }) => id);
  const taken = new Set(levels.map(({ id }) => id));
  const ids = new Map(kept.map((id) => [id, id]));
  for (const level of levels) {
    const twin = previous.find(
      ({ id, codes }) => !taken.has(id) && codes.some((code) => level.codes.includes(code)),
    );
    if (ids.has(level.id) || twin === undefined) continue;
    ids.set(level.id, twin.id);
    taken.add(twin.id);
  }
  return ids;
}

function renamedLayout(layout: CountLayout, rename: (id: string) => string): CountLayout {
  switch (layout.kind) {
    case 'records':
      return layout;
    case 'count':
      return { kind: 'count', columnId: rename(layout.columnId) };
    case 'eventsAndTotal':
      return {
        kind: 'eventsAndTotal',
        eventsColumnId: rename(layout.eventsColumnId),
        totalColumnId: rename(layout.totalColumnId),
      };
    case 'casesAndControls':
      return {
        kind: 'casesAndControls',
        casesColumnId: rename(layout.casesColumnId),
        controlsColumnId: rename(layout.controlsColumnId),
      };
  }
}
