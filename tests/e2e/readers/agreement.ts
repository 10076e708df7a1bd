import { expect } from '@playwright/test';
import type { DocumentPart, DocumentPicture, ReadDocument } from './docx';
import { numbersIn } from './numbers';
import type { PrintedBlock, PrintedFigure, PrintedTable } from './proof';
import type { ReadCell, ReadWorkbook } from './xlsx';

/** Every number that the blocks print, in order. */
export function printedNumbers(blocks: readonly PrintedBlock[]): readonly string[] {
  return blocks.flatMap(({ paragraphs, tables, figures }) =>
    [
      ...paragraphs,
      ...tables.flatMap(({ caption, head, rows, notes }) => [
        caption,
        ...head.flat(),
        ...rows.flat(),
        ...notes,
      ]),
      ...figures.flatMap(({ caption, texts, notes }) => [caption, ...texts, ...notes]),
    ].flatMap(numbersIn),
  );
}

/**
 * A document says what the proof says: the same paragraphs, cells, captions, notes and pictures,
 * word by word and in the same order.
 */
export function expectSameDocument(blocks: readonly PrintedBlock[], document: ReadDocument): void {
  const parts = [...document.parts];
  const pictures = [...document.pictures];
  for (const block of blocks) {
    for (const text of block.paragraphs) takeParagraph(parts, text);
    for (const table of block.tables) takeTable(parts, table);
    for (const figure of block.figures) takeFigure(parts, pictures, figure);
  }
}

/** A workbook shows the digits that the proof shows, a number a cell. */
export function expectSameWorkbook(blocks: readonly PrintedBlock[], workbook: ReadWorkbook): void {
  for (const { name, tables, figures } of blocks) {
    for (const table of tables) expectSameSheet(table, sheetOf(workbook, name));
    for (const figure of figures) expectSameNumbers(figure, sheetOf(workbook, name));
  }
}

/** The rows of a sheet; one that is not there is an error. */
export function sheetOf(workbook: ReadWorkbook, name: string): readonly (readonly ReadCell[])[] {
  const sheet = workbook.get(name);
  if (sheet === undefined) throw new Error(`The workbook has no sheet ${name}.`);
  return sheet;
}

function takeParagraph(parts: DocumentPart[], text: string): void {
  const at = parts.findIndex((part) => part.kind === 'paragraph' && part.text === text);
  expect(at, `the document says "${text}"; it goes on with ${summary(parts)}`).not.toBe(-1);
  parts.splice(0, at + 1);
}

/** A house style says what stands between number and title, and whether on two lines. */
function takeCaption(parts: DocumentPart[], caption: string): void {
  const [, number = '', title = ''] = /^(\w+ \d+)\. (.*)$/.exec(caption) ?? [];
  expect(title).not.toBe('');
  const at = parts.findIndex((part) => part.kind === 'paragraph' && part.text.startsWith(number));
  expect(at, `the document has a caption ${number}`).not.toBe(-1);
  const [first, second] = parts
    .slice(at, at + 2)
    .map((part) => (part.kind === 'paragraph' ? part.text : ''));
  const lines = first === number ? 2 : 1;
  expect(lines === 2 ? second : first?.slice(number.length).replace(/^\W+/, '')).toBe(title);
  parts.splice(0, at + lines);
}

function takeTable(parts: DocumentPart[], { caption, head, rows, notes }: PrintedTable): void {
  takeCaption(parts, caption);
  const [table] = parts;
  expect(table?.kind).toBe('table');
  expect(table).toEqual({ kind: 'table', rows: [...head, ...rows] });
  parts.shift();
  for (const note of notes) takeParagraph(parts, note);
}

function takeFigure(
  parts: DocumentPart[],
  pictures: DocumentPicture[],
  { caption, altText, notes }: PrintedFigure,
): void {
  takeCaption(parts, caption);
  expect(pictures.shift()).toEqual({ altText, vector: true, raster: true });
  for (const note of notes) takeParagraph(parts, note);
}

function expectSameSheet(
  { caption, rows, notes }: PrintedTable,
  sheet: readonly (readonly ReadCell[])[],
): void {
  expect(sheet[0]?.[0]?.shown).toBe(caption);
  const left = sheet.slice(1).map((cells) => cells.map(({ shown }) => shown));
  for (const [label = '', ...cells] of rows) {
    const at = left.findIndex(([head]) => head === label);
    expect(at, `the sheet has a row ${label}`).not.toBe(-1);
    const [found = []] = left.splice(0, at + 1).slice(-1);
    expect(found.slice(1).flatMap(numbersIn), label).toEqual(cells.flatMap(numbersIn));
  }
  expect(left.map(([text]) => text)).toEqual(expect.arrayContaining([...notes]));
}

/** A bar a row: events, total, value and limits; the value is what stands over the bar. */
function expectSameNumbers(
  { caption, rows, texts }: PrintedFigure,
  sheet: readonly (readonly ReadCell[])[],
): void {
  expect(sheet[0]?.[0]?.shown).toBe(caption);
  const bars = sheet
    .map((cells) => cells.flatMap((cell) => (cell.kind === 'number' ? [cell.shown] : [])))
    .filter((numbers) => numbers.length > 0);
  const read = rows.map((cells) => numbersIn(cells.slice(-2).join(' ').replace('/', ' ')));
  expect(bars).toEqual(read);
  const overBars = bars.map(([, , value]) => value ?? '').filter((value) => value !== '');
  expect(texts).toEqual(expect.arrayContaining(overBars));
}

function summary(parts: readonly DocumentPart[]): string {
  return parts
    .slice(0, 6)
    .map((part) => (part.kind === 'paragraph' ? `"${part.text.slice(0, 90)}"` : 'a table'))
    .join(', ');
}
