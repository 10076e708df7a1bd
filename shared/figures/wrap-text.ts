import { textWidth } from './text-width';
import type { FigureType } from './text-width';

/** A blank, unless it stands between a number and its unit. */
const BREAK = /(?<!\d) | (?!\p{L}{1,2}(?:[\s,.;)]|$))/u;

/**
 * Breaks text at its blanks into lines no wider than `width` pixels. A single word that is wider
 * keeps its own line; nothing is cut off.
 */
export function wrapText(text: string, width: number, type: FigureType): readonly string[] {
  const lines: string[] = [];
  for (const word of text.split(BREAK)) {
    const last = lines.at(-1);
    const joined = last === undefined ? word : `${last} ${word}`;
    if (last !== undefined && textWidth(joined, type) <= width) lines[lines.length - 1] = joined;
    else lines.push(word);
  }
  return lines;
}
