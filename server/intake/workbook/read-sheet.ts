import type { TableEncoder } from '../encode/table-encoder';
import { LIMITS } from '../limits';
import type { ReadingContext } from '../reading';
import { columnOfReference } from './cell-reference';
import { cellText, type RawCell } from './cell-text';
import { entryBytes } from './entry-bytes';
import { parseXml } from './parse-xml';
import { ReadingStopped } from './reading-stopped';
import { RowBuilder, type ColumnSpan } from './row-builder';
import { SheetNotes } from './sheet-notes';
import { TextGatherer } from './text-gatherer';
import { isTrue, type OpenedWorkbook, type SheetPart } from './workbook-parts';

/** What was noticed in a sheet, and in which row its column names stand. */
export interface SheetReading {
  readonly notes: SheetNotes;
  readonly headerRow: number;
}

/** Reads the table of a sheet, row by row, into an encoder. */
export async function readSheet(
  workbook: OpenedWorkbook,
  sheet: SheetPart,
  table: TableEncoder,
  context: ReadingContext,
): Promise<SheetReading> {
  const reader = new SheetReader(workbook, table);
  const chunks = entryBytes(workbook.archive, sheet.entry, workbook.budget);
  await parseXml(sheet.entry.name, chunks, {
    open: (name, attributes) => {
      reader.open(name, attributes);
    },
    text: (text) => {
      reader.text(text);
    },
    close: (name) => {
      reader.close(name);
    },
    pause: async () => {
      reader.checkSize();
      await context.pause({ share: workbook.budget.shareRead, rows: table.rows });
    },
  });
  table.flush();
  return { notes: reader.notes, headerRow: reader.headerRow };
}

class SheetReader {
  readonly notes = new SheetNotes();
  headerRow = 0;
  private readonly builder = new RowBuilder();
  private readonly gatherer = new TextGatherer();
  private span: ColumnSpan | null = null;
  private row = 0;
  private lastFilledRow = 0;
  private column = -1;
  private cell: RawCell | null = null;
  private inValue = false;

  constructor(
    private readonly workbook: OpenedWorkbook,
    private readonly table: TableEncoder,
  ) {}

  open(name: string, attributes: Readonly<Record<string, string>>): void {
    if (name === 'c') this.openCell(attributes);
    else if (name === 'row') this.openRow(attributes);
    else if (name === 'mergeCell') this.notes.mergedCells(attributes.ref ?? '');
    else if (this.cell !== null) this.openInCell(name, this.cell);
  }

  text(text: string): void {
    if (this.cell === null) return;
    if (this.inValue) this.cell.value += text;
    else this.gatherer.text(text);
  }

  close(name: string): void {
    if (name === 'v') this.inValue = false;
    else if (name === 'c') this.closeCell();
    else if (name === 'row') this.closeRow();
    else this.gatherer.close(name);
  }

  checkSize(): void {
    const issue = this.table.checkSize();
    if (issue !== null) throw new ReadingStopped(issue);
  }

  private openRow(attributes: Readonly<Record<string, string>>): void {
    const row = Number(attributes.r ?? this.row + 1);
    if (!Number.isInteger(row) || row <= this.row) {
      throw new ReadingStopped({ code: 'rowsOutOfOrder', facts: { line: this.row } });
    }
    this.row = row;
    this.column = -1;
    this.builder.clear();
    if (isTrue(attributes.hidden)) this.notes.hiddenRow();
  }

  private openCell(attributes: Readonly<Record<string, string>>): void {
    const reference = attributes.r ?? '';
    const column = columnOfReference(reference);
    this.column = column < 0 ? this.column + 1 : column;
    this.cell = {
      reference,
      type: attributes.t ?? 'n',
      style: Number(attributes.s ?? 0),
      hasFormula: false,
      value: '',
    };
  }

  private openInCell(name: string, cell: RawCell): void {
    if (name === 'v') this.inValue = true;
    else if (name === 'f') cell.hasFormula = true;
    else this.gatherer.open(name);
  }

  private closeCell(): void {
    const { cell } = this;
    this.cell = null;
    if (cell === null) return;
    const inline = this.gatherer.take();
    const text = cellText(cell, inline, this.workbook, this.notes);
    this.builder.set(this.column, text);
  }

  private closeRow(): void {
    const filled = this.builder.span;
    if (filled === null) return;
    if (this.span !== null && this.row > this.lastFilledRow + 1) {
      this.notes.goesOnAfterGap(this.row);
    }
    const span = this.span ?? this.beginTable(filled);
    this.lastFilledRow = this.row;
    const outside = this.builder.firstOutside(span);
    if (outside !== null) this.notes.cellOutside(outside, this.row);
    const issue = this.table.add(this.builder.row(span, this.row)) ?? this.table.settle();
    if (issue !== null) throw new ReadingStopped(issue);
  }

  /** The first row that holds anything has the column names, and says how wide the table is. */
  private beginTable(span: ColumnSpan): ColumnSpan {
    if (span.to - span.from >= LIMITS.columns) throw new ReadingStopped({ code: 'tooManyColumns' });
    this.span = span;
    this.headerRow = this.row;
    return span;
  }
}
