import { GLYPH_ADVANCES } from './glyph-advances';
import type { AdvanceGroup, FigureWeight } from './glyph-advances';

/** The type of a piece of text in a figure. */
export interface FigureType {
  readonly sizeInPixels: number;
  readonly weight: FigureWeight;
}

/** The width of a line of text in pixels. Characters outside the table count as wide ones. */
export function textWidth(text: string, { sizeInPixels, weight }: FigureType): number {
  const advances = ADVANCES[weight];
  let thousandths = 0;
  for (const character of text) thousandths += advances.get(character) ?? UNKNOWN_ADVANCE;
  return (thousandths * sizeInPixels) / 1000;
}

/** What Vega hands to `textMetrics.width`: the mark's type, the text besides. */
export interface VegaTextItem {
  readonly fontSize?: number;
  readonly fontWeight?: string | number;
}

/**
 * The width of a text mark, to be set as `vega.textMetrics.width` on both sides. Without it Node
 * guesses and the browser measures, and the two lay out the same figure differently.
 */
export function vegaTextWidth(item: VegaTextItem, text: unknown): number {
  const weight = isBold(item.fontWeight) ? 'semibold' : 'regular';
  const line = Array.isArray(text) ? text.map(String) : [String(text)];
  const type: FigureType = { sizeInPixels: item.fontSize ?? VEGA_FONT_SIZE, weight };
  return Math.max(0, ...line.map((part) => textWidth(part, type)));
}

/** The advance of a full-width character, so that an unknown script is given room. */
const UNKNOWN_ADVANCE = 1000;

/** Vega's own size where a mark names none. */
const VEGA_FONT_SIZE = 11;

const ADVANCES: Readonly<Record<FigureWeight, ReadonlyMap<string, number>>> = {
  regular: mapOf(GLYPH_ADVANCES.regular),
  semibold: mapOf(GLYPH_ADVANCES.semibold),
};

function mapOf(groups: readonly AdvanceGroup[]): ReadonlyMap<string, number> {
  return new Map(
    groups.flatMap(([advance, characters]) =>
      Array.from(characters, (character) => [character, advance] as const),
    ),
  );
}

function isBold(weight: string | number | undefined): boolean {
  return typeof weight === 'number' ? weight >= 600 : weight === 'bold';
}
