import type { Alignment, Borders, Font, Style } from 'exceljs';
import type { HouseStyle } from '#shared/house-style';
import type { TableColumn } from '#shared/layout';
import type { CellLook } from './sheet-plan';

/** Size of type in sheets. */
export const POINTS = 10;

/** The styles of a workbook's cells: the same look and format give the same object. */
export type CellStyles = (look: CellLook, format: string | null) => Partial<Style>;

/** Cells share style objects, which the library knows again without looking into them. */
export function createCellStyles(houseStyle: HouseStyle): CellStyles {
  const known = new Map<string, Partial<Style>>();
  return (look, format) => {
    const { align, bold, indent, wraps, top, bottom } = look;
    const key = JSON.stringify([align, bold, indent, wraps, top, bottom, format]);
    const style = known.get(key) ?? styleOf(look, format, houseStyle);
    known.set(key, style);
    return style;
  };
}

/** The font of a house style's tables. Without a name, readers fall back to one of their own. */
export function fontOf({ page }: HouseStyle, look: CellLook = {}): Partial<Font> {
  return { name: page.tableFont, size: POINTS, ...(look.bold === true ? { bold: true } : {}) };
}

function styleOf(look: CellLook, format: string | null, houseStyle: HouseStyle): Partial<Style> {
  return {
    font: fontOf(houseStyle, look),
    border: bordersOf(look),
    alignment: alignmentOf(look),
    ...(format === null ? {} : { numFmt: format }),
  };
}

const ALIGNMENTS = {
  start: 'left',
  end: 'right',
  center: 'center',
} as const satisfies Readonly<Record<TableColumn['align'], Alignment['horizontal']>>;

function alignmentOf({ align = 'start', bold, indent = 0, wraps }: CellLook): Partial<Alignment> {
  return {
    horizontal: ALIGNMENTS[align],
    vertical: bold === true ? 'bottom' : 'top',
    ...(indent > 0 ? { indent } : {}),
    ...(wraps === true ? { wrapText: true } : {}),
  };
}

function bordersOf({ top, bottom }: CellLook): Partial<Borders> {
  return {
    ...(top === undefined ? {} : { top: { style: top } }),
    ...(bottom === undefined ? {} : { bottom: { style: bottom } }),
  };
}
