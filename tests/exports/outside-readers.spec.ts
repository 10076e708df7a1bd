import { describe, expect, it } from 'vitest';
import { listValues, numberOf } from '#shared/analysis';
import type { ComposedReport, TableBodyCell, TableElement } from '#shared/layout';
import { valueLedger } from '#shared/report';
import type { PrintedNumber } from '#shared/report';
import { HOUSE_STYLE_IDS } from '../builders/house-styles';
import { askPython, printedText, shownSheets, skipsWithout } from '../builders/outside-readers';
import { exported } from './file-parts';
import { laidRequest } from './laid-report';
import { SAMPLE_PINS, sampleRequest } from './sample-request';

// These programs know nothing of ours: what they find in a file is what everybody finds.

const TIME = 180_000;

/** Blanks of every width are one blank. */
function plain(text: string): string {
  return text.replace(/\s+/g, ' ');
}

/** Whether a number stands in a text as it is, not as a part of a longer one. */
function stands(number: string, text: string): boolean {
  const escaped = plain(number).replace(/[.*+?^${}()|[\]\\]/g, '\\$&');
  return new RegExp(`(?<!\\d[.,]?)${escaped}(?!\\d)`).test(text);
}

describe.skipIf(skipsWithout('libreOffice', 'popplerText'))('LibreOffice', () => {
  it.each(HOUSE_STYLE_IDS)(
    'prints every number of the report from the document: %s',
    async (styleId) => {
      const request = sampleRequest(styleId);
      const text = plain(await printedText('report.docx', await exported('docx', request)));
      const lost = numbersInText(request.report).filter((number) => !stands(number.text, text));
      expect(lost).toEqual([]);
      expect(text).toContain('[No analysis is chosen yet. Choose one for this block.]');
    },
    TIME,
  );

  it(
    'breaks no number over two lines, and no word of a head',
    async () => {
      const request = sampleRequest('compact-clinical');
      const text = await printedText('report.docx', await exported('docx', request));
      const lines = text.split('\n').map(plain);
      const words = new Set(lines.flatMap((line) => line.split(' ')));
      const tables = request.report.elements.filter(isTable);
      const broken = cellsOf(tables)
        .map(printedIn)
        .filter((printed) => !lines.some((line) => line.includes(printed)));
      const heads = tables.flatMap(({ head }) => head.flat().map(printedIn));
      const torn = heads.flatMap((head) => head.split(' ')).filter((word) => !words.has(word));
      expect([...broken, ...torn]).toEqual([]);
    },
    TIME,
  );

  it.each(HOUSE_STYLE_IDS)(
    'shows in the workbook the digits that the report prints: %s',
    async (styleId) => {
      const request = sampleRequest(styleId);
      const sheets = await shownSheets(await exported('xlsx', request));
      for (const table of request.report.elements.filter(isTable)) {
        const rows = sheets[`Table ${table.caption.number}`]!;
        const first = rows.length - table.rows.length - table.notes.length;
        const shown = rows.slice(first - 1).map((row) => row.map(plain));
        for (const row of table.rows) expect(shown).toContainEqual(expectedCells(row.cells, table));
      }
    },
    TIME,
  );

  it(
    'reads no label as a formula',
    async () => {
      const labels = { title: '=1+1', words: '=1+1', level: '@SUM(1)', category: '-2+3' };
      const sheets = await shownSheets(await exported('xlsx', laidRequest(labels)));
      expect(sheets['Table 1']!.flat()).toEqual(expect.arrayContaining(['=1+1', '@SUM(1)']));
      expect(sheets['Figure 1']!.flat()).toEqual(expect.arrayContaining(['-2+3']));
      const all = [...sheets['Table 1']!, ...sheets['Figure 1']!].flat();
      expect(all.filter((text) => /^[12]$|Err/.test(text))).toEqual([]);
    },
    TIME,
  );
});

describe.skipIf(skipsWithout('openpyxl'))('openpyxl', () => {
  it(
    'reads every value at full precision',
    async () => {
      const found = await askPython(
        'report.xlsx',
        await exported('xlsx', sampleRequest()),
        `
import json, sys, openpyxl
sheet = openpyxl.load_workbook(sys.argv[1])['Values']
print(json.dumps([row[7].value for row in sheet.iter_rows(min_row=2)]))
`,
      );
      const expected = SAMPLE_PINS.flatMap((pin) => listValues(pin.result, pin.analysisId));
      expect(found).toEqual(expected.map(({ quantity }) => numberOf(quantity)));
    },
    TIME,
  );

  it(
    'sees text where labels look like formulas, marked for who edits them',
    async () => {
      const found = await askPython(
        'report.xlsx',
        await exported('xlsx', laidRequest({ level: '=1+1' })),
        `
import json, sys, openpyxl
sheet = openpyxl.load_workbook(sys.argv[1])['Table 1']
cells = [cell for row in sheet.iter_rows() for cell in row if cell.value == '=1+1']
print(json.dumps([[cell.data_type, cell.quotePrefix] for cell in cells]))
`,
      );
      expect(found).toEqual([
        ['s', true],
        ['s', true],
      ]);
    },
    TIME,
  );
});

describe.skipIf(skipsWithout('pythonDocx'))('python-docx', () => {
  it(
    'finds styles, tables, properties and the picture',
    async () => {
      const found = await askPython(
        'report.docx',
        await exported('docx', laidRequest()),
        `
import json, sys, docx
document = docx.Document(sys.argv[1])
table = document.tables[0]
print(json.dumps({
  'styles': [paragraph.style.name for paragraph in document.paragraphs],
  'row': [cell.text for cell in table.rows[3].cells],
  'title': document.core_properties.title,
  'modified': document.core_properties.modified.isoformat(),
  'pictures': len(document.inline_shapes),
}))
`,
      );
      expect(found).toMatchObject({
        row: ['Over 6 h', '34/12\u202f163', '+16.2 (−0.1 to +23.4)'],
        title: 'A laid report',
        modified: '2026-02-03T23:30:00',
        pictures: 1,
      });
      expect((found as { styles: string[] }).styles).toEqual([
        'Title',
        'Draft Note',
        'Draft Note',
        'Draft Note',
        'Heading 1',
        'Body Text',
        'List Number',
        'List Bullet',
        'Caption',
        'Table Note',
        'Table Note',
        'Figure',
        'Caption',
        'Problem',
      ]);
    },
    TIME,
  );
});

/** Pictures hold outlines; their numbers are in the sheets of the workbook. */
function numbersInText(report: ComposedReport): readonly PrintedNumber[] {
  const figures = report.elements.filter(({ kind }) => kind === 'figure');
  const drawn = new Set(figures.map(({ blockId }) => blockId));
  return valueLedger(report).filter(({ blockId }) => !drawn.has(blockId));
}

function isTable(element: { readonly kind: string }): element is TableElement {
  return element.kind === 'table';
}

/** The text of a cell as it prints. */
function printedIn({ runs }: Pick<TableBodyCell, 'runs'>): string {
  return plain(runs.map(({ text }) => text).join(''));
}

/** Body cells with numbers; words may wrap. */
function cellsOf(tables: readonly TableElement[]): readonly TableBodyCell[] {
  return tables
    .flatMap(({ rows }) => rows.flatMap(({ cells }) => cells))
    .filter(({ numbers }) => numbers.some((number) => number !== null));
}

/** What the cells of a row show in a sheet: every number in a cell of its own. */
function expectedCells(cells: readonly TableBodyCell[], table: TableElement): readonly string[] {
  return table.columns.flatMap((column, index) => {
    const cell = cells[index];
    const breadth = Math.max(1, column.parts.length);
    if (cell === undefined) return Array.from({ length: breadth }, () => '');
    const printed = cell.numbers.map((number) => (number === null ? '' : plain(number.text)));
    if (printed.some((text) => text !== '')) return printed;
    return [printedIn(cell), ...Array.from({ length: breadth - 1 }, () => '')];
  });
}
