import { beforeAll, describe, expect, it } from 'vitest';
import { listValues, numberOf } from '#shared/analysis';
import { elementsNamed, textIn, type XmlElement } from '../builders/xml-tree';
import { exported, partTree } from './file-parts';
import { SAMPLE_PINS, sampleRequest } from './sample-request';

const REQUEST = sampleRequest();

let file: Uint8Array;
let shared: readonly string[];

beforeAll(async () => {
  file = await exported('xlsx', REQUEST);
  shared = elementsNamed(partTree(file, 'xl/sharedStrings.xml'), 'si').map((item) =>
    elementsNamed(item, 't').map(textIn).join(''),
  );
}, 60_000);

function sheetNames(): readonly string[] {
  return elementsNamed(partTree(file, 'xl/workbook.xml'), 'sheet').map(
    (sheet) => sheet.attributes.name!,
  );
}

function sheet(name: string): XmlElement {
  return partTree(file, `xl/worksheets/sheet${sheetNames().indexOf(name) + 1}.xml`);
}

/** Rows of a sheet: texts as they are, numbers as numbers. */
function rowsOf(name: string): readonly (readonly (string | number)[])[] {
  return elementsNamed(sheet(name), 'row').map((row) =>
    elementsNamed(row, 'c')
      .filter((cell) => elementsNamed(cell, 'v').length > 0)
      .map((cell) => valueOf(cell)),
  );
}

function valueOf(cell: XmlElement): string | number {
  const value = Number(textIn(elementsNamed(cell, 'v')[0]!));
  return cell.attributes.t === 's' ? shared[value]! : value;
}

it('has a sheet for each table and figure, and three about what stands behind them', () => {
  expect(sheetNames()).toEqual([
    'Table 1',
    'Figure 1',
    'Table 2',
    'Table 3',
    'Figure 2',
    'Table 4',
    'Values',
    'Data dictionary',
    'Notes',
  ]);
});

describe('a table', () => {
  it('has a caption, heads down to each number, rows and notes', () => {
    const rows = rowsOf('Table 1');
    expect(rows[0]![0]).toMatch(/^Table 1\. Risk of hand eczema/);
    expect(rows[2]).toEqual([
      'Wet work per shift',
      'n',
      'N',
      'Risk, %',
      'Difference, points',
      'Lower limit',
      'Upper limit',
      'Risk ratio',
      'Lower limit',
      'Upper limit',
    ]);
    expect(rows.at(-1)).toEqual(['CI, confidence interval.']);
  });

  it('keeps numbers as numbers, at full precision in the unit of the head', () => {
    const row = rowsOf('Table 1').find(([head]) => head === 'Over 6 h')!;
    const [, events, total, risk, difference] = row as number[];
    expect([events, total]).toEqual([34, 163]);
    expect(risk).toBe((34 / 163) * 100);
    expect(difference).toBeCloseTo((34 / 163 - 11 / 236) * 100, 10);
  });

  it('stays in sight and prints its heads on every page', () => {
    const [pane] = elementsNamed(sheet('Table 1'), 'pane');
    expect(pane!.attributes).toMatchObject({ state: 'frozen', xSplit: '1', ySplit: '3' });
    const titles = elementsNamed(partTree(file, 'xl/workbook.xml'), 'definedName').map(textIn);
    expect(titles).toContain("'Table 1'!$2:$3");
  });

  it('merges heads above the lowest row of heads only', () => {
    const merged = elementsNamed(sheet('Table 1'), 'mergeCell').map(
      ({ attributes }) => attributes.ref,
    );
    expect(
      merged.every((range) => !/[A-Z]+(3|[4-9]|1\d):/.test(range!) || range!.startsWith('A')),
    ).toBe(true);
  });
});

describe('the values', () => {
  it('are all there, at full precision', () => {
    const expected = SAMPLE_PINS.flatMap((pin) => listValues(pin.result, pin.analysisId));
    const rows = elementsNamed(sheet('Values'), 'row').slice(1);
    const values = rows.map((row) =>
      valueOf(elementsNamed(row, 'c').find(({ attributes }) => attributes.r!.startsWith('H'))!),
    );
    expect(values).toEqual(expected.map(({ quantity }) => numberOf(quantity)));
  });

  it('are named in words and by address, with the exact fraction where there is one', () => {
    const row = rowsOf('Values').find(
      (cells) => cells.at(-1) === 'a1/risk/over6/stratum:ward/value',
    );
    expect(row).toEqual([
      'A1',
      'Hand eczema by wet work',
      1,
      '2026-01-31',
      'Risk',
      'Wet work per shift: Over 6 h',
      'Hospital ward',
      34 / 163,
      '34/163',
      'share, 0 to 1',
      'a1/risk/over6/stratum:ward/value',
    ]);
  });
});

it('describes the variables behind the numbers', () => {
  const rows = rowsOf('Data dictionary').map((row) => row.join(' | '));
  expect(rows).toContain(
    'Staff survey | 2 | wetwork | Wet work per shift | ordered category | level | 3 | Over 6 h | 4; 5',
  );
  expect(rows).toContain(
    'Staff survey | 2 | wetwork | Wet work per shift | ordered category | missing | not asked | (blank)',
  );
  expect(rows).toContain(
    'Staff survey | 2 | age | Age | number | years | band | 1 | Under 40 | below 40 | reference',
  );
  expect(rows).toContain('Staff survey | 2 | person_id | Person | identifier');
});

it('says in the notes what to mind, what was done, and what could not be printed', () => {
  const notes = rowsOf('Notes').map((row) => row.join(': '));
  expect(notes).toContain('Not printed: [No analysis is chosen yet. Choose one for this block.]');
  expect(notes.some((note) => note.includes('clinician'))).toBe(true);
  expect(notes.some((note) => note.startsWith('Methods A1: We compared'))).toBe(true);
  expect(notes.some((note) => note.includes('data of 31 January 2026'))).toBe(true);
});

it('names a font in every cell', () => {
  const fonts = elementsNamed(partTree(file, 'xl/styles.xml'), 'font');
  const cells = sheetNames().flatMap((name) => elementsNamed(sheet(name), 'c'));
  const formats = elementsNamed(
    elementsNamed(partTree(file, 'xl/styles.xml'), 'cellXfs')[0]!,
    'xf',
  );
  const names = cells.map((cell) => {
    const font = fonts[Number(formats[Number(cell.attributes.s)]!.attributes.fontId)]!;
    return elementsNamed(font, 'name')[0]!.attributes.val;
  });
  expect(new Set(names)).toEqual(new Set(['Arial']));
});
