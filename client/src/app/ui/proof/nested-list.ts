import type { ListElement, ListItem, Run } from '#shared/layout';

/** An item with the list inside it. */
export interface NestedItem {
  readonly runs: readonly Run[];
  readonly inner: NestedList | null;
}

/** A list as HTML nests it. */
export interface NestedList {
  readonly ordered: boolean;
  readonly items: readonly NestedItem[];
}

/** Nests the items of a list element by their depth. A depth that is skipped counts as one. */
export function nestedList(list: ListElement): NestedList {
  return nest(list.items, list.ordered);
}

function nest(items: readonly ListItem[], ordered: boolean): NestedList {
  const depth = Math.min(...items.map((item) => item.depth));
  const starts = items.flatMap((item, index) =>
    index === 0 || item.depth === depth ? [index] : [],
  );
  return {
    ordered,
    items: starts.map((start, index) => nestedItem(items.slice(start, starts[index + 1]))),
  };
}

function nestedItem([first, ...deeper]: readonly ListItem[]): NestedItem {
  const second = deeper[0];
  return {
    runs: first?.runs ?? [],
    inner: second === undefined ? null : nest(deeper, second.ordered),
  };
}
