import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { Document, Packer, Paragraph, Table, TableCell, TableRow } from 'docx';
import exceljs from 'exceljs';
import { it } from 'vitest';
import type { ComposedReport, FigureElement, Run, TableElement } from '#shared/layout';
import { composeReport, runsOf } from '#shared/report';
import type { ExportFormatId } from '../../server/exports/export-format';
import type { ExportRequest } from '../../server/exports/export-request';
import { figureSvg } from '../../server/exports/figures/draw-figure';
import { openFigureFonts } from '../../server/exports/figures/figure-fonts';
import { figurePicture } from '../../server/exports/figures/figure-picture';
import { printAppearance } from '../../server/exports/figures/print-appearance';
import { houseStyle, phrasebook } from '../builders/house-styles';
import { exported } from '../exports/file-parts';
import { analyses, largeReport } from './large-report';
import { report as tell, timedWait } from './measure';

const FONTS = join(tmpdir(), 'evenhand-bench-fonts');
const REQUEST = largeRequest();

it('draws a report of 200 blocks with 60 tables as a document', async () => {
  const wordsOnly = { ...REQUEST, report: withoutFigures(REQUEST.report) };
  tell({
    what: 'draw a DOCX of 200 blocks with 60 tables, without its 20 figures',
    budgetInMilliseconds: 3000,
    timing: await timedWait(() => exported('docx', wordsOnly)),
    floor: {
      what: 'the library writing the same words bare',
      timing: await timedWait(() => bareDocument(wordsOnly.report)),
    },
  });
});

it('draws the same with its figures', async () => {
  tell({
    what: 'draw a DOCX of 200 blocks with 60 tables and 20 figures',
    budgetInMilliseconds: 3000,
    timing: await timedWait(() => exported('docx', REQUEST)),
    floor: null,
  });
});

it('draws the same report as a workbook', async () => {
  const workbook = await exported('xlsx', REQUEST);
  tell({
    what: 'draw an XLSX of 200 blocks with 60 tables and every value',
    budgetInMilliseconds: 2000,
    timing: await timedWait(() => exported('xlsx', REQUEST)),
    floor: {
      what: 'the library writing the same cells bare',
      timing: await timedWait(() => bareWorkbook(workbook)),
    },
  });
});

it('draws a figure', async () => {
  const fonts = openFigureFonts(FONTS);
  const figure = REQUEST.report.elements.find((element) => element.kind === 'figure')!;
  tell({
    what: 'draw a figure as PNG at 600 dpi',
    budgetInMilliseconds: 600,
    timing: await timedWait(async () => {
      const appearance = printAppearance(figure.figure, REQUEST.houseStyle.figure, 160);
      return figurePicture(await figureSvg(figure.figure, appearance), fonts, 600);
    }),
    floor: null,
  });
});

it.each<ExportFormatId>(['docx', 'xlsx'])('keeps its memory while drawing %s', async (formatId) => {
  await exported(formatId, REQUEST);
  console.log(`memory after ${formatId}: ${(process.memoryUsage().rss / 1e6).toFixed(0)} MB`);
});

function largeRequest(): ExportRequest {
  const pins = analyses();
  const setting = { houseStyle: houseStyle(), phrasebook: phrasebook() };
  return {
    ...setting,
    report: composeReport({ report: largeReport(200, pins), pins, ...setting }),
    pins,
    codeBooks: [],
    study: { title: 'Wet work', invented: true },
    changedAt: '2026-02-03T12:00:00.000Z',
    fontDirectory: FONTS,
  };
}

function withoutFigures(report: ComposedReport): ComposedReport {
  const isFigure = ({ kind }: { kind: string }): boolean => kind === 'figure';
  return { ...report, elements: report.elements.filter((element) => !isFigure(element)) };
}

/** The words of a report with the library's own looks, as short as a program can say it. */
async function bareDocument({ elements }: ComposedReport): Promise<unknown> {
  const children = elements.flatMap((element) =>
    element.kind === 'table'
      ? [new Paragraph(textOf(element.caption.runs)), bareTable(element), ...notesOf(element)]
      : [new Paragraph(textOf(runsOf(element)))],
  );
  return Packer.toBuffer(new Document({ sections: [{ children }] }));
}

function bareTable({ head, rows }: TableElement): Table {
  const lines = [...head, ...rows.map(({ cells }) => cells)];
  return new Table({
    rows: lines.map((cells) => {
      const children = cells.map(
        ({ runs }) => new TableCell({ children: [new Paragraph(textOf(runs))] }),
      );
      return new TableRow({ children });
    }),
  });
}

function notesOf({ notes }: TableElement | FigureElement): readonly Paragraph[] {
  return notes.map((note) => new Paragraph(textOf(note)));
}

function textOf(runs: readonly Run[]): string {
  return runs.map(({ text }) => text).join('');
}

/** The cells of a finished workbook, written again without any looks. */
async function bareWorkbook(finished: Uint8Array): Promise<unknown> {
  const cells = await cellsOf(finished);
  const workbook = new exceljs.Workbook();
  for (const [name, rows] of cells) workbook.addWorksheet(name).addRows(rows);
  return workbook.xlsx.writeBuffer();
}

const READ = new WeakMap<Uint8Array, readonly (readonly [string, unknown[][]])[]>();

async function cellsOf(finished: Uint8Array): Promise<readonly (readonly [string, unknown[][]])[]> {
  const known = READ.get(finished);
  if (known !== undefined) return known;
  const workbook = new exceljs.Workbook();
  await workbook.xlsx.load(Uint8Array.from(finished).buffer);
  const cells = workbook.worksheets.map((sheet): [string, unknown[][]] => [
    sheet.name,
    sheet.getSheetValues().map((row) => (Array.isArray(row) ? [...row] : [])),
  ]);
  READ.set(finished, cells);
  return cells;
}
