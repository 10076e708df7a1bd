import type { CodeBookBand, CodeBookColumn } from './code-book';
import { caution, refusal, type CodeBookFinding } from './finding';

/** What is wrong or odd in the bands of a column: empty ones, overlaps, gaps. */
export function validateBands(column: CodeBookColumn, path: string): readonly CodeBookFinding[] {
  const place = `${path}.bands`;
  const empty = column.bands.filter((band) => lowerOf(band) >= upperOf(band));
  if (empty.length > 0) return empty.map((band) => emptyBand(column, band, place));
  const ascending = [...column.bands].sort((one, other) => lowerOf(one) - lowerOf(other));
  return ascending.slice(1).flatMap((band, index) => {
    const below = ascending[index];
    return below === undefined ? [] : validateNeighbours(column, below, band, place);
  });
}

function lowerOf({ lower }: CodeBookBand): number {
  return lower ?? -Infinity;
}

function upperOf({ upper }: CodeBookBand): number {
  return upper ?? Infinity;
}

function emptyBand(column: CodeBookColumn, band: CodeBookBand, path: string): CodeBookFinding {
  const message =
    `The band "${band.label}" of "${column.label}" holds no number: ` +
    'its upper limit has to be above its lower one.';
  return refusal('bandEmpty', message, { path, columnId: column.id, levelId: band.id });
}

function validateNeighbours(
  column: CodeBookColumn,
  below: CodeBookBand,
  above: CodeBookBand,
  path: string,
): readonly CodeBookFinding[] {
  const place = { path, columnId: column.id, levelId: above.id };
  const pair = `The bands "${below.label}" and "${above.label}" of "${column.label}"`;
  if (upperOf(below) > lowerOf(above)) {
    return [refusal('bandsOverlap', `${pair} overlap, so some numbers would be in both.`, place)];
  }
  if (upperOf(below) === lowerOf(above)) return [];
  const gap = `from ${String(below.upper)} to below ${String(above.lower)}`;
  return [caution('bandsLeaveGap', `${pair} leave numbers ${gap} in neither.`, place)];
}
