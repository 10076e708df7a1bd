import type { Cell, CellRichTextValue, CellValue, Font } from 'exceljs';
import type { HouseStyle } from '#shared/house-style';
import type { Run, RunMark } from '#shared/layout';
import { printableText } from '../../printable-text';
import { textOf } from '../../table-measure';
import { fontOf, type CellStyles } from './cell-styles';
import type { CellContent, CellLook, SheetCell } from './sheet-plan';

/** What cells are written with. */
export interface CellSetting {
  readonly houseStyle: HouseStyle;
  readonly styles: CellStyles;
}

/**
 * The format of words that look like a formula. A cell with it never turns into one when it is
 * edited, because `steadyWorkbook` marks it so.
 */
const TEXT_FORMAT = '@';

/** Writes one cell. */
export function writeCell(
  cell: Cell,
  { content, look }: SheetCell,
  { houseStyle, styles }: CellSetting,
): void {
  const { value, format } = writtenAs(content, look, houseStyle);
  cell.style = styles(look, format);
  if (value !== null) cell.value = value;
}

interface Written {
  readonly value: CellValue;
  readonly format: string | null;
}

function writtenAs(content: CellContent, look: CellLook, houseStyle: HouseStyle): Written {
  switch (content.kind) {
    case 'number':
      return { value: content.value, format: content.format };
    case 'words':
      return wordsAs(content.runs, look, houseStyle);
    case 'empty':
      return { value: null, format: null };
  }
}

function wordsAs(runs: readonly Run[], look: CellLook, houseStyle: HouseStyle): Written {
  const text = cellText(textOf(runs));
  const format = looksLikeFormula(text) ? TEXT_FORMAT : null;
  if (text === '') return { value: null, format };
  const isPlain = runs.every(({ marks = [] }) => marks.every((mark) => MARKS[mark] === null));
  return { value: isPlain ? text : richText(runs, fontOf(houseStyle, look)), format };
}

function richText(runs: readonly Run[], font: Partial<Font>): CellRichTextValue {
  return {
    richText: runs
      .filter((run) => run.text !== '')
      .map(({ text, marks = [] }) => ({
        text: cellText(printableText(text)),
        font: marks.reduce((marked, mark) => ({ ...marked, ...MARKS[mark] }), font),
      })),
  };
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
