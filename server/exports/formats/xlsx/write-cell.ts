import type { Alignment, Borders, Cell, Font } from 'exceljs';
import type { HouseStyle } from '#shared/house-style';
import type { Run, RunMark, TableColumn } from '#shared/layout';
import { printableText } from '../../printable-text';
import { textOf } from '../../table-measure';
import type { CellLook, SheetCell } from './sheet-plan';

/** Size of type in sheets. */
export const POINTS = 10;

/**
 * The format of words. A cell with it never turns into a formula when it is edited, because
 * `steadyWorkbook` marks it so.
 */
export const TEXT_FORMAT = '@';

/** The font of a house style's tables. Without a name, readers fall back to one of their own. */
export function fontOf({ page }: HouseStyle, look: CellLook = {}): Partial<Font> {
  return { name: page.tableFont, size: POINTS, ...(look.bold === true ? { bold: true } : {}) };
}

/** Writes one cell. */
export function writeCell(cell: Cell, planned: SheetCell, style: HouseStyle): void {
  const { content, look } = planned;
  cell.font = fontOf(style, look);
  cell.border = bordersOf(look);
  cell.alignment = alignmentOf(planned);
  switch (content.kind) {
    case 'number':
      cell.numFmt = content.format;
      cell.value = content.value;
      return;
    case 'words':
      writeWords(cell, content.runs, style, look);
      return;
    case 'empty':
      return;
  }
}

function writeWords(cell: Cell, runs: readonly Run[], style: HouseStyle, look: CellLook): void {
  const text = cellText(textOf(runs));
  if (text === '') return;
  if (looksLikeFormula(text)) cell.numFmt = TEXT_FORMAT;
  if (!runs.some(({ marks = [] }) => marks.some((mark) => MARKS[mark] !== null))) {
    cell.value = text;
    return;
  }
  cell.value = {
    richText: runs
      .filter((run) => run.text !== '')
      .map((run) => ({
        text: cellText(printableText(run.text)),
        font: markedFont(run.marks ?? [], fontOf(style, look)),
      })),
  };
}

function markedFont(marks: readonly RunMark[], font: Partial<Font>): Partial<Font> {
  return marks.reduce((marked, mark) => ({ ...marked, ...MARKS[mark] }), font);
}

/** The secondary mark is for the screen. */
const MARKS: Readonly<Record<RunMark, Partial<Font> | null>> = {
  bold: { bold: true },
  italic: { italic: true },
  superscript: { vertAlign: 'superscript' },
  subscript: { vertAlign: 'subscript' },
  secondary: null,
};

/** More than this, and a workbook counts as damaged. */
const LONGEST_CELL = 32_767;

/**
 * Words as a workbook may hold them. "_x0041_" would be read as a letter, so that its first
 * underscore is written as a code itself.
 *
 * Source: ISO/IEC 29500-1, 22.4.2.4 (bstr).
 */
function cellText(text: string): string {
  const short = text.length > LONGEST_CELL ? `${text.slice(0, LONGEST_CELL - 1)}…` : text;
  return short.replace(/_(?=x[0-9a-f]{4}_)/gi, '_x005F_');
}

function looksLikeFormula(text: string): boolean {
  return /^\s*[=+\-@]/.test(text);
}

const ALIGNMENTS = {
  start: 'left',
  end: 'right',
  center: 'center',
} as const satisfies Readonly<Record<TableColumn['align'], Alignment['horizontal']>>;

function alignmentOf({ look }: SheetCell): Partial<Alignment> {
  const { align = 'start', indent = 0, wraps = false } = look;
  return {
    horizontal: ALIGNMENTS[align],
    vertical: look.bold === true ? 'bottom' : 'top',
    ...(indent > 0 ? { indent } : {}),
    ...(wraps ? { wrapText: true } : {}),
  };
}

function bordersOf({ top, bottom }: CellLook): Partial<Borders> {
  return {
    ...(top === undefined ? {} : { top: { style: top } }),
    ...(bottom === undefined ? {} : { bottom: { style: bottom } }),
  };
}
