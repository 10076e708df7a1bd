import type { GroupedBarFigure } from '#shared/layout';
import type { FigureAppearance } from './appearance';
import { groupLooks } from './group-looks';
import type { GroupLook } from './group-looks';
import { textWidth } from './text-width';
import type { FigureType } from './text-width';

/** An entry of the key, `left` pixels from the picture's left edge; no look for the heading. */
export interface KeyEntry {
  readonly left: number;
  readonly label: string;
  readonly look: GroupLook | null;
}

/** A row of the key. */
export type KeyRow = readonly KeyEntry[];

/** Side of a swatch, and the room behind it and behind an entry. */
export const SWATCH = 11;
const AFTER_SWATCH = 6;
const AFTER_ENTRY = 18;

/** The rows of the key over the plot, bars' order, broken where they don't fit; often none. */
export function keyRows(figure: GroupedBarFigure, appearance: FigureAppearance): readonly KeyRow[] {
  if (appearance.legend === 'none' || figure.groups.length < 2) return [];
  const type: FigureType = { sizeInPixels: appearance.fontSize, weight: 'regular' };
  const heading = figure.groupsLabel === null ? [] : [{ label: figure.groupsLabel, look: null }];
  const looks = groupLooks(figure, appearance).map((look) => ({ label: look.label, look }));
  return breakIntoRows([...heading, ...looks], appearance.width, type);
}

/** The height of the key with the room below it. */
export function keyHeight(rows: readonly KeyRow[], lineHeight: number): number {
  return rows.length === 0 ? 0 : rows.length * lineHeight + AFTER_SWATCH;
}

/** Where the words of an entry begin. */
export function labelLeft(entry: KeyEntry): number {
  return entry.left + (entry.look === null ? 0 : SWATCH + AFTER_SWATCH);
}

function breakIntoRows(
  entries: readonly Omit<KeyEntry, 'left'>[],
  width: number,
  type: FigureType,
): readonly KeyRow[] {
  const rows: KeyEntry[][] = [];
  let left = 0;
  for (const entry of entries) {
    const room = labelLeft({ ...entry, left: 0 }) + textWidth(entry.label, type);
    const last = rows.at(-1);
    if (last === undefined || left + room > width) {
      rows.push([{ ...entry, left: 0 }]);
      left = room + AFTER_ENTRY;
    } else {
      last.push({ ...entry, left });
      left += room + AFTER_ENTRY;
    }
  }
  return rows;
}
