import type { ColumnProfile } from '#shared/api';
import type { CountLayout } from '#shared/code-book';

/** A column of a layout, and the layout with another one in its place. */
export interface LayoutSlot {
  readonly name: string;
  readonly columnId: string;
  readonly with: (columnId: string) => CountLayout;
}

/** Columns that may be counts: nothing but numbers from zero on. */
export function countChoices(columns: readonly ColumnProfile[]): readonly ColumnProfile[] {
  return columns.filter(
    ({ numeric, blank, minimum, values }) =>
      numeric > 0 &&
      blank === 0 &&
      (minimum ?? 0) >= 0 &&
      values.every(({ value }) => isWhole(value)),
  );
}

/** A layout of a kind with the likeliest of the columns; null when there are too few. */
export function layoutOf(
  kind: CountLayout['kind'],
  choices: readonly ColumnProfile[],
): CountLayout | null {
  const guessed = choices.toSorted((one, other) => likelihood(other) - likelihood(one));
  const [first, second] = guessed.map(({ columnId }) => columnId);
  switch (kind) {
    case 'records':
      return { kind };
    case 'count':
      return first === undefined ? null : { kind, columnId: first };
    case 'eventsAndTotal':
      return pairOf(guessed, (eventsColumnId, totalColumnId) => ({
        kind,
        eventsColumnId,
        totalColumnId,
      }));
    case 'casesAndControls':
      if (first === undefined || second === undefined) return null;
      return { kind, casesColumnId: first, controlsColumnId: second };
  }
}

/** The columns that a layout counts by, to pick others. */
export function layoutSlots(layout: CountLayout): readonly LayoutSlot[] {
  switch (layout.kind) {
    case 'records':
      return [];
    case 'count':
      return [
        {
          name: 'Counts',
          columnId: layout.columnId,
          with: (columnId) => ({ ...layout, columnId }),
        },
      ];
    case 'eventsAndTotal':
      return [
        slot('Events', layout.eventsColumnId, (id) => ({ ...layout, eventsColumnId: id })),
        slot('Total', layout.totalColumnId, (id) => ({ ...layout, totalColumnId: id })),
      ];
    case 'casesAndControls':
      return [
        slot('Cases', layout.casesColumnId, (id) => ({ ...layout, casesColumnId: id })),
        slot('Controls', layout.controlsColumnId, (id) => ({ ...layout, controlsColumnId: id })),
      ];
  }
}

function slot(name: string, columnId: string, by: LayoutSlot['with']): LayoutSlot {
  return { name, columnId, with: by };
}

function isWhole(value: string): boolean {
  return /^\s*\d+(?:[.,]0+)?\s*$/.test(value);
}

function likelihood({ guessedKind }: ColumnProfile): number {
  return guessedKind === 'count' ? 1 : 0;
}

/** Events are never more than the total, so the smaller sum comes first. */
function pairOf(
  guessed: readonly ColumnProfile[],
  layout: (smaller: string, larger: string) => CountLayout,
): CountLayout | null {
  const [first, second] = guessed;
  if (first === undefined || second === undefined) return null;
  const inOrder = (first.sum ?? 0) <= (second.sum ?? 0);
  return inOrder
    ? layout(first.columnId, second.columnId)
    : layout(second.columnId, first.columnId);
}
