import type { BarBox } from './bar-geometry';

/** Fillings in the order in which groups get them. */
export const HATCHINGS = ['solid', 'open', 'diagonal', 'dots'] as const;

/** One of the fillings. */
export type Hatching = (typeof HATCHINGS)[number];

/** A line of a hatching, in pixels of the plot. */
export interface HatchLine {
  readonly fromX: number;
  readonly fromY: number;
  readonly toX: number;
  readonly toY: number;
}

/** A dot of a hatching, in pixels of the plot. */
export interface HatchDot {
  readonly atX: number;
  readonly atY: number;
}

const LINE_GAP = 7;
const DOT_GAP = 6;

/** Lines rising to the right, cut at the edges of the box. */
export function diagonalLines({ left, right, top, bottom }: BarBox): readonly HatchLine[] {
  const lines: HatchLine[] = [];
  for (let sum = left + top + LINE_GAP; sum < right + bottom; sum += LINE_GAP) {
    const fromX = Math.max(left, sum - bottom);
    const toX = Math.min(right, sum - top);
    lines.push({ fromX, fromY: sum - fromX, toX, toY: sum - toX });
  }
  return lines;
}

/** Dots in staggered rows that keep clear of the edges of the box. */
export function dotRows({ left, right, top, bottom }: BarBox): readonly HatchDot[] {
  const dots: HatchDot[] = [];
  for (let row = 0, atY = bottom - DOT_GAP / 2; atY > top + 2; row += 1, atY -= DOT_GAP) {
    const start = left + DOT_GAP / 2 + (row % 2 === 0 ? 0 : DOT_GAP / 2);
    for (let atX = start; atX < right - 2; atX += DOT_GAP) dots.push({ atX, atY });
  }
  return dots;
}
