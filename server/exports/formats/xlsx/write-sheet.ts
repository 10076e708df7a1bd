import type { Row, Workbook, Worksheet } from 'exceljs';
import { textWidth } from '#shared/figures';
import type { Run } from '#shared/layout';
import { textOf } from '../../table-measure';
import { fontOf, POINTS } from './cell-styles';
import type { SheetCell, SheetPlan, SheetRow } from './sheet-plan';
import { writeCell, type CellSetting } from './write-cell';

/** Writes a planned sheet: cells, widths, what stays in sight, how it prints. */
export function writeSheet(workbook: Workbook, plan: SheetPlan, setting: CellSetting): void {
  const widths = columnWidths(plan);
  const sheet = workbook.addWorksheet(plan.name, { views: [viewOf(plan)] });
  setUpPrint(sheet, plan, setting, sum(widths));
  sheet.columns = widths.map((width) => ({
    width: characters(width),
    style: { font: fontOf(setting.houseStyle) },
  }));
  for (const [index, row] of plan.rows.entries()) {
    writeRow(sheet.getRow(index + 1), row, { ...setting, sheet, widths });
  }
  if (plan.filtered) {
    const { last } = plan.headRows;
    sheet.autoFilter = {
      from: { row: last, column: 1 },
      to: { row: plan.rows.length, column: widths.length },
    };
  }
}

interface SheetContext extends CellSetting {
  readonly sheet: Worksheet;
  /** In points. */
  readonly widths: readonly number[];
}

function viewOf({ headRows, frozenColumns }: SheetPlan): Worksheet['views'][number] {
  return { state: 'frozen', ySplit: headRows.last, xSplit: frozenColumns, showGridLines: false };
}

/** Excel's number of the paper; without one it prints on letter. */
const A4 = 9;

/** A sheet that is wider than so many points is printed on its side. */
const PORTRAIT_WIDTH = 480;

/** Printed on one page, a wider sheet would be too small to read. */
const READABLE_WIDTH = 1400;

function setUpPrint(
  sheet: Worksheet,
  plan: SheetPlan,
  { houseStyle }: CellSetting,
  width: number,
): void {
  const { first, last } = plan.headRows;
  sheet.pageSetup = {
    orientation: width > PORTRAIT_WIDTH ? 'landscape' : 'portrait',
    ...(width > READABLE_WIDTH
      ? { printTitlesColumn: 'A:A' }
      : { fitToPage: true, fitToWidth: 1, fitToHeight: 0 }),
    printTitlesRow: `${String(first)}:${String(last)}`,
  };
  // The library's type for papers is an enumeration that is not there when programs run.
  if (houseStyle.page.paper === 'A4') Object.assign(sheet.pageSetup, { paperSize: A4 });
  sheet.headerFooter.oddFooter = '&C&A · &P / &N';
}

/** Room beside the words of a cell, in points. */
const CELL_ROOM = 14;

const NARROWEST = 30;

function columnWidths({ rows, widestColumn }: SheetPlan): readonly number[] {
  const widths: number[] = [];
  for (const row of rows) {
    if (row.kind === 'paragraph') continue;
    for (const [index, cell] of row.cells.entries()) {
      const width = Math.min(widestColumn, neededWidth(cell) + CELL_ROOM);
      widths[index] = Math.max(widths[index] ?? NARROWEST, width);
    }
  }
  return widths;
}

function neededWidth({ content, look, across }: SheetCell): number {
  if (content.kind === 'number') return textWidth(shownLength(content), type(look.bold));
  if (content.kind === 'empty' || across > 1) return 0;
  const text = textOf(content.runs);
  const indent = (look.indent ?? 0) * 9;
  // A head may break its line once; a wrapped note takes what its column gives.
  const share = look.wraps === true && look.bold === true ? 0.55 : 1;
  return Math.max(longestWord(text, look.bold), textWidth(text, type(look.bold)) * share) + indent;
}

/** A text about as long as what the format shows. */
function shownLength({
  value,
  format,
}: {
  readonly value: number;
  readonly format: string;
}): string {
  if (format === 'General') return '0.000000000';
  const decimals = /\.(0+)/.exec(format)?.[1]?.length ?? 0;
  return `+${value.toFixed(decimals)}`;
}

function longestWord(text: string, bold: boolean | undefined): number {
  return Math.max(0, ...text.split(/\s/).map((word) => textWidth(word, type(bold))));
}

function type(bold: boolean | undefined): { sizeInPixels: number; weight: 'regular' | 'semibold' } {
  return { sizeInPixels: POINTS, weight: bold === true ? 'semibold' : 'regular' };
}

/** Widths count the digits of the workbook's own font, 7 pixels wide at 96 to the inch. */
function characters(points: number): number {
  return Math.round((((points * 96) / 72 + 5) / 7) * 100) / 100;
}

function writeRow(row: Row, planned: SheetRow, context: SheetContext): void {
  if (planned.kind === 'paragraph') {
    writeParagraph(row, planned.runs, planned.bold, context);
    return;
  }
  for (const [index, cell] of planned.cells.entries()) {
    writeCell(row.getCell(index + 1), cell, context);
  }
  // Merged cells share one look, so that merging comes last.
  for (const [index, { across }] of planned.cells.entries()) {
    if (across > 1) context.sheet.mergeCells(row.number, index + 1, row.number, index + across);
  }
  const lines = planned.cells.map((cell, index) =>
    linesOf(cell, sum(context.widths.slice(index, index + cell.across))),
  );
  row.height = heightOf(Math.max(1, ...lines));
}

function writeParagraph(
  row: Row,
  runs: readonly Run[],
  bold: boolean,
  context: SheetContext,
): void {
  const cell: SheetCell = {
    content: { kind: 'words', runs },
    look: { wraps: true, bold },
    across: 1,
  };
  const { sheet, widths } = context;
  if (widths.length > 1) sheet.mergeCells(row.number, 1, row.number, widths.length);
  writeCell(row.getCell(1), cell, context);
  row.height = heightOf(linesOf(cell, Math.max(sum(widths), 1)));
}

/** A cautious count of lines, because nothing but a spreadsheet knows its own line breaks. */
function linesOf({ content, look }: SheetCell, width: number): number {
  if (content.kind !== 'words' || look.wraps !== true || width === 0) return 1;
  const lines = textOf(content.runs).split('\n');
  const wide = lines.map((line) => textWidth(line, type(look.bold)));
  return sum(wide.map((points) => Math.max(1, Math.ceil(points / (width - 4)))));
}

function heightOf(lines: number): number {
  return Math.min(TALLEST_ROW, lines * POINTS * 1.3 + 3);
}

/** Excel refuses taller rows. */
const TALLEST_ROW = 409;

function sum(numbers: readonly number[]): number {
  return numbers.reduce((total, number) => total + number, 0);
}
