import type { LayoutElement, ListItem, Run, TableBodyCell, TableElement } from '#shared/layout';

/** Maps every run of an element, keeping what has none; the order is that of reading. */
export function mapRuns<E extends LayoutElement>(element: E, map: (run: Run) => Run): E;
export function mapRuns(element: LayoutElement, map: (run: Run) => Run): LayoutElement {
  const runs = (list: readonly Run[]): readonly Run[] => list.map(map);
  switch (element.kind) {
    case 'heading':
    case 'paragraph':
      return { ...element, runs: runs(element.runs) };
    case 'list':
      return { ...element, items: element.items.map((item) => withItemRuns(item, runs)) };
    case 'table':
      return mapTable(element, runs);
    case 'figure':
      return {
        ...element,
        caption: { ...element.caption, runs: runs(element.caption.runs) },
        notes: element.notes.map(runs),
      };
    case 'problem':
      return element;
  }
}

/** Every run of an element, in the order of reading. */
export function runsOf(element: LayoutElement): readonly Run[] {
  switch (element.kind) {
    case 'heading':
    case 'paragraph':
      return element.runs;
    case 'list':
      return element.items.flatMap(({ runs }) => runs);
    case 'table':
      return [
        ...element.caption.runs,
        ...element.head.flatMap((row) => row.flatMap(({ runs }) => runs)),
        ...element.rows.flatMap(({ cells }) => cells.flatMap(({ runs }) => runs)),
        ...element.notes.flat(),
      ];
    case 'figure':
      return [...element.caption.runs, ...element.notes.flat()];
    case 'problem':
      return [];
  }
}

type MapRuns = (list: readonly Run[]) => readonly Run[];

function withItemRuns(item: ListItem, runs: MapRuns): ListItem {
  return { ...item, runs: runs(item.runs) };
}

function mapTable(table: TableElement, runs: MapRuns): TableElement {
  return {
    ...table,
    caption: { ...table.caption, runs: runs(table.caption.runs) },
    head: table.head.map((row) => row.map((cell) => ({ ...cell, runs: runs(cell.runs) }))),
    rows: table.rows.map((row) => ({
      ...row,
      cells: row.cells.map((cell) => mapCell(cell, runs)),
    })),
    notes: table.notes.map(runs),
  };
}

function mapCell(cell: TableBodyCell, runs: MapRuns): TableBodyCell {
  return { ...cell, runs: runs(cell.runs) };
}
