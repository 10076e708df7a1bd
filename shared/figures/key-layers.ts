import { labelLeft, SWATCH } from './figure-key';
import type { KeyEntry } from './figure-key';
import { hatchLayers } from './hatch-layers';
import { texts } from './label-layers';
import { pixels } from './spec-parts';
import type { FigureLayer, SpecParts } from './spec-parts';

/** The key over the plot: swatches with their words, in the order of the bars. */
export function keyLayers(parts: SpecParts): readonly FigureLayer[] {
  const entries = placedEntries(parts);
  if (entries.length === 0) return [];
  const { ink, secondInk } = parts.colours;
  const labelsOf = (heads: boolean): readonly PlacedEntry[] =>
    entries.filter(({ entry }) => (entry.look === null) === heads);
  return [
    swatches(parts, entries),
    ...keyHatching(entries),
    texts(parts, { color: ink, align: 'left', baseline: 'middle' }, labelsOf(false).map(wordsOf)),
    texts(
      parts,
      { color: secondInk, align: 'left', baseline: 'middle' },
      labelsOf(true).map(wordsOf),
    ),
  ];
}

interface PlacedEntry {
  readonly entry: KeyEntry;
  readonly middle: number;
}

function placedEntries({ frame }: SpecParts): readonly PlacedEntry[] {
  return frame.keyRows.flatMap((row, index) => {
    const middle = (index + 0.5) * frame.lineHeight - frame.padding.top;
    return row.map(({ left, ...entry }) => ({
      entry: { ...entry, left: left - frame.padding.left },
      middle,
    }));
  });
}

function wordsOf({ entry, middle }: PlacedEntry): { atX: number; atY: number; text: string } {
  return { atX: labelLeft(entry), atY: middle, text: entry.label };
}

function swatches({ colours }: SpecParts, entries: readonly PlacedEntry[]): FigureLayer {
  const values = entries.flatMap(({ entry, middle }) =>
    entry.look === null ? [] : [{ ...swatchBox(entry, middle), fill: entry.look.fill }],
  );
  return {
    data: { values },
    mark: { type: 'rect', stroke: colours.ink, strokeWidth: 1 },
    encoding: {
      x: pixels('left'),
      x2: { field: 'right' },
      y: pixels('top'),
      y2: { field: 'bottom' },
      fill: { field: 'fill', type: 'nominal', scale: null },
    },
  };
}

function swatchBox(
  { left }: KeyEntry,
  middle: number,
): {
  readonly left: number;
  readonly right: number;
  readonly top: number;
  readonly bottom: number;
} {
  const half = SWATCH / 2;
  return { left, right: left + SWATCH, top: middle - half, bottom: middle + half };
}

function keyHatching(entries: readonly PlacedEntry[]): readonly FigureLayer[] {
  return entries.flatMap(({ entry, middle }) => {
    if (entry.look === null) return [];
    return hatchLayers(entry.look, [swatchBox(entry, middle)]);
  });
}
