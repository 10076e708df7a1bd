import type { HouseStyle, PageStyle } from '#shared/house-style';

/** Which way up a page is. */
export type Orientation = 'portrait' | 'landscape';

/** Twentieths of a point, the unit of lengths in WordprocessingML. */
export function twips(points: number): number {
  return Math.round(points * 20);
}

/** The size of a portrait page in twips; Word turns it by itself. */
export function paperSize({ paper }: PageStyle): {
  readonly width: number;
  readonly height: number;
} {
  return PAPERS[paper];
}

/** The margin on all four sides in twips. */
export function marginInTwips({ marginInMillimetres }: PageStyle): number {
  return Math.round((marginInMillimetres * 1440) / 25.4);
}

/** The width between the margins in points. */
export function textWidthInPoints({ page }: HouseStyle, orientation: Orientation): number {
  const { width, height } = paperSize(page);
  const across = orientation === 'portrait' ? width : height;
  return (across - 2 * marginInTwips(page)) / 20;
}

const PAPERS = {
  A4: { width: 11_906, height: 16_838 },
  letter: { width: 12_240, height: 15_840 },
} as const satisfies Readonly<Record<PageStyle['paper'], unknown>>;
