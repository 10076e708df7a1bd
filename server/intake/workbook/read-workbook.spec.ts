import { readFile } from 'node:fs/promises';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { intakeProblem } from '../intake-issue';
import { buildWorkbook, handmadeWorkbook, relations } from '../testing/build-workbook';
import { readBytes, readCells } from '../testing/read-bytes';

const XLSX = { fileName: 'data.xlsx' };

describe('a workbook', () => {
  it('gives texts, numbers, dates, truth values, formulas and errors as a person sees them', async () => {
    const bytes = await buildWorkbook((workbook) => {
      const sheet = workbook.addWorksheet('Data');
      sheet.addRow(['text', 'number', 'day', 'moment', 'yes', 'formula', 'error', 'rich']);
      const row = sheet.addRow([
        'a, "b"',
        0.1,
        new Date(Date.UTC(2026, 2, 31)),
        new Date(Date.UTC(2026, 2, 31, 14, 5)),
        true,
        { formula: 'B2*2', result: 0.2 },
        { error: '#DIV/0!' },
        { richText: [{ text: 'bold', font: { bold: true } }, { text: ' plain' }] },
      ]);
      row.getCell(3).numFmt = 'dd/mm/yyyy';
      row.getCell(4).numFmt = 'yyyy-mm-dd hh:mm';
      sheet.addRow([
        '\u00e9\u20ac',
        1e21,
        null,
        null,
        false,
        { formula: '"x"', result: 'x' },
        null,
        '0012',
      ]);
    });
    expect(await readCells(bytes, XLSX)).toEqual({
      text: ['a, "b"', '\u00e9\u20ac'],
      number: ['0.1', '1e+21'],
      day: ['2026-03-31', ''],
      moment: ['2026-03-31T14:05:00', ''],
      yes: ['TRUE', 'FALSE'],
      formula: ['0.2', 'x'],
      error: ['#DIV/0!', ''],
      rich: ['bold plain', '0012'],
    });
  });

  it('is read from its first visible sheet that holds anything, or from the one chosen', async () => {
    const bytes = await buildWorkbook((workbook) => {
      workbook.addWorksheet('Hidden', { state: 'hidden' }).addRows([['h'], [1]]);
      workbook.addWorksheet('Empty');
      workbook.addWorksheet('First').addRows([['a'], [1]]);
      workbook.addWorksheet('Second').addRows([['b'], [2]]);
    });
    expect(await readCells(bytes, XLSX)).toEqual({ a: ['1'] });
    expect(await readCells(bytes, { ...XLSX, options: { sheet: 'Second' } })).toEqual({ b: ['2'] });
    expect(await readCells(bytes, { ...XLSX, options: { sheet: 'Hidden' } })).toEqual({ h: ['1'] });
    const read = await readBytes(bytes, XLSX);
    expect(read.ok && read.value.profile.sheets).toEqual(['Hidden', 'Empty', 'First', 'Second']);
    expect(read.ok && read.value.profile.usedOptions.sheet).toBe('First');
    expect(read.ok && read.value.profile.warnings[0]?.message).toBe(
      'The sheet "First" was read. The workbook also has "Hidden", "Empty", "Second".',
    );
  });

  it('may begin anywhere in the sheet', async () => {
    const bytes = await buildWorkbook((workbook) => {
      const sheet = workbook.addWorksheet('Data');
      sheet.getCell('C4').value = 'a';
      sheet.getCell('D4').value = 'b';
      sheet.getCell('D5').value = 2;
      sheet.getCell('C6').value = 3;
    });
    expect(await readCells(bytes, XLSX)).toEqual({ a: ['', '3'], b: ['2', ''] });
  });

  it('tells of what is odd in the sheet', async () => {
    const bytes = await buildWorkbook((workbook) => {
      const sheet = workbook.addWorksheet('Data');
      sheet.addRows([['a', 'b'], ['x', 1], ['x', 2], ['y', { formula: 'A1' }, null, 'note'], []]);
      sheet.addRow(['z', { error: '#N/A' }]);
      sheet.addRow(['z', 4]).hidden = true;
      sheet.mergeCells('A2:A3');
    });
    const read = await readBytes(bytes, XLSX);
    expect(
      read.ok && read.value.profile.warnings.map(({ code, message }) => [code, message]),
    ).toEqual([
      [
        'severalTables',
        '1 cell outside the columns of the first table, the first being D4; left out. Keep one table in a sheet.',
      ],
      [
        'severalTables',
        'The sheet goes on in row 6 after a blank row. If that is another table, move it to a sheet of its own.',
      ],
      [
        'mergedCells',
        '1 group of merged cells, the first being A2:A3; all but the first cell of a group are blank.',
      ],
      ['errorCells', "1 cell with an error, the first being #N/A in B6; read as the error's name."],
      [
        'formulaWithoutValue',
        '1 cell with a formula without a stored result; read as blank. Open the workbook, save it, and load it again.',
      ],
      ['hiddenRows', '1 hidden row of the sheet, read like the others.'],
    ]);
  });

  it('reads numbers that stand as text', async () => {
    const bytes = await buildWorkbook((workbook) => {
      workbook.addWorksheet('Data').addRows([['n'], ['12'], ['7'], [5]]);
    });
    const read = await readBytes(bytes, XLSX);
    expect(read.ok && read.value.profile.columns[0]).toMatchObject({ numeric: 3, sum: 24 });
  });

  it('reads the other ways in which programs write cells', async () => {
    const sheet =
      '<row><c t="inlineStr"><is><t>a</t><rPh><t>aid</t></rPh></is></c><c t="str"><v>b_x000A_c</v></c></row>' +
      '<row r="3"><c t="d"><v>2026-03-31T00:00:00Z</v></c><c r="B3" t="s"><v>0</v></c></row>' +
      '<row r="4"><c r="B4"><v>1.50</v></c></row>';
    expect(await readCells(handmadeWorkbook(sheet), XLSX)).toEqual({
      a: ['2026-03-31', ''],
      'b\nc': ['a', '1.5'],
    });
  });

  it('reads elements with a prefix and the calendar of 1904', async () => {
    const ns = 'xmlns:x="http://schemas.openxmlformats.org/spreadsheetml/2006/main"';
    const bytes = handmadeWorkbook('', {
      'xl/worksheets/sheet1.xml': `<x:worksheet ${ns}><x:sheetData><x:row><x:c t="s"><x:v>0</x:v></x:c></x:row><x:row><x:c s="1"><x:v>37986</x:v></x:c></x:row></x:sheetData></x:worksheet>`,
      'xl/workbook.xml': `<x:workbook ${ns} xmlns:q="q"><x:workbookPr date1904="1"/><x:sheets><x:sheet name="One" q:id="r1"/></x:sheets></x:workbook>`,
      'xl/_rels/workbook.xml.rels': relations([
        ['r1', 'worksheet', 'worksheets/sheet1.xml'],
        ['r2', 'sharedStrings', 'sharedStrings.xml'],
        ['r3', 'styles', 'styles.xml'],
      ]),
      'xl/styles.xml': `<x:styleSheet ${ns}><x:cellStyleXfs><x:xf numFmtId="9"/></x:cellStyleXfs><x:cellXfs><x:xf numFmtId="0"/><x:xf numFmtId="14"/></x:cellXfs></x:styleSheet>`,
    });
    expect(await readCells(bytes, XLSX)).toEqual({ a: ['2008-01-01'] });
  });

  it('reads what LibreOffice saved', async () => {
    expect(await readCells(await savedBy('libreoffice'), XLSX)).toEqual({
      day: ['2026-03-31', '2026-04-01', ''],
      group: ['K\u00fcche', 'Station "4"', 'none'],
      n: ['12', '3', '0'],
      share: ['0.1', '2.5', ''],
    });
  });

  it('reads what openpyxl saved', async () => {
    expect(await readCells(await savedBy('openpyxl'), XLSX)).toEqual({
      day: ['2026-03-31', ''],
      moment: ['2026-03-31T14:05:00', ''],
      group: ['K\u00fcche', 'Station "4"'],
      n: ['12', '0.1'],
      flag: ['TRUE', 'FALSE'],
    });
  });

  it('reads a long sheet', async () => {
    const bytes = await buildWorkbook((workbook) => {
      const sheet = workbook.addWorksheet('Data');
      sheet.addRow(['id', 'group']);
      for (let row = 0; row < 20_000; row += 1) sheet.addRow([row, `group ${String(row % 3)}`]);
    });
    const cells = await readCells(bytes, XLSX);
    expect(cells.id?.every((cell, row) => cell === String(row))).toBe(true);
    expect(cells.group?.[19_999]).toBe('group 1');
  });
});

describe('a workbook that cannot be read', () => {
  const row = '<row><c t="s"><v>0</v></c></row><row><c><v>1</v></c></row>';
  const sheetOf = (xml: string) => handmadeWorkbook('', { 'xl/worksheets/sheet1.xml': xml });

  it.each<[string, () => Buffer | Promise<Buffer>, string]>([
    [
      'damagedWorkbook',
      () => handmadeWorkbook(row).subarray(0, 300),
      "The workbook is damaged: directory can't be read.",
    ],
    [
      'damagedWorkbook',
      () => withByteChanged(handmadeWorkbook(row)),
      'The workbook is damaged: the part "xl/worksheets/sheet1.xml" can\'t be read.',
    ],
    [
      'damagedWorkbook',
      () => sheetOf('<worksheet><sheetData><row>'),
      'The workbook is damaged: the part "xl/worksheets/sheet1.xml" can\'t be read.',
    ],
    [
      'damagedWorkbook',
      () =>
        sheetOf(
          `<!DOCTYPE x [<!ENTITY a "b">]><worksheet><sheetData>${row}</sheetData></worksheet>`,
        ),
      'The workbook is damaged: the part "xl/worksheets/sheet1.xml" can\'t be read.',
    ],
    [
      'damagedWorkbook',
      () => handmadeWorkbook(row, { '_rels/.rels': '<Relationships/>' }),
      "The workbook is damaged: list of parts can't be read.",
    ],
    [
      'damagedWorkbook',
      () =>
        handmadeWorkbook(row, {
          'xl/_rels/workbook.xml.rels': relations([['r1', 'worksheet', 'gone.xml']]),
        }),
      'The workbook is damaged: the missing part "xl/gone.xml" can\'t be read.',
    ],
    [
      'rowsOutOfOrder',
      () => handmadeWorkbook('<row r="5"><c t="s"><v>0</v></c></row><row r="2"/>'),
      "Row 5 of the sheet is out of order, so the sheet can't be read row by row.",
    ],
    [
      'emptyWorkbook',
      () => buildWorkbook((workbook) => workbook.addWorksheet('Empty')),
      'No sheet of the workbook holds data.',
    ],
    [
      'headerOnly',
      () => buildWorkbook((workbook) => workbook.addWorksheet('Data').addRow(['a'])),
      'The file has column names but no row of data.',
    ],
    [
      'tooManyColumns',
      () =>
        handmadeWorkbook('<row><c r="A1" t="s"><v>0</v></c><c r="XFD1" t="s"><v>0</v></c></row>'),
      'The file has more than 2000 columns.',
    ],
  ])('%s', async (code, make, message) => {
    const read = await readBytes(await make(), XLSX);
    if (read.ok) throw new Error('read');
    expect([read.issue.code, intakeProblem(read.issue).message]).toEqual([code, message]);
  });

  it('noSuchSheet', async () => {
    const read = await readBytes(handmadeWorkbook(row), { ...XLSX, options: { sheet: 'Two' } });
    if (read.ok) throw new Error('read');
    const { message, wayOut } = intakeProblem(read.issue);
    expect([message, wayOut]).toEqual([
      'The workbook has no sheet "Two".',
      'Choose one of its sheets: "One".',
    ]);
  });

  it('workbookTooLarge: before what it unpacks to fills the memory', async () => {
    const blanks = Buffer.alloc(20 * 1024 * 1024, ' ');
    const bytes = handmadeWorkbook('', { 'xl/worksheets/sheet1.xml': blanks });
    expect(bytes.length).toBeLessThan(100_000);
    const read = await readBytes(bytes, XLSX);
    expect(read.ok ? 'read' : read.issue.code).toBe('workbookTooLarge');
  });

  it('workbookTooLarge: also when its directory tells a smaller size', async () => {
    const bytes = handmadeWorkbook('', {
      'xl/worksheets/sheet1.xml': `<worksheet>${'<a/>'.repeat(5 * 1024 * 1024)}</worksheet>`,
    });
    const directory = bytes.lastIndexOf('xl/worksheets/sheet1.xml') - 46;
    bytes.writeUInt32LE(100, directory + 24);
    const read = await readBytes(bytes, XLSX);
    expect(read.ok ? 'read' : read.issue.code).toBe('workbookTooLarge');
  });

  it('never fails otherwise, whatever the bytes', async () => {
    const whole = await buildWorkbook((workbook) => {
      workbook.addWorksheet('Data').addRows([
        ['a', 'b'],
        [1, 'x'],
        [2, new Date(0)],
      ]);
    });
    await fc.assert(
      fc.asyncProperty(
        fc.array(fc.record({ at: fc.nat(whole.length - 1), byte: fc.nat(255) }), {
          minLength: 1,
          maxLength: 4,
        }),
        fc.option(fc.nat(whole.length)),
        async (changes, end) => {
          const bytes = Buffer.from(whole.subarray(0, end ?? whole.length));
          for (const { at, byte } of changes) bytes[at] = byte;
          const read = await readBytes(bytes, XLSX);
          if (!read.ok) expect(intakeProblem(read.issue).message).not.toContain('{');
        },
      ),
      { numRuns: 300 },
    );
  });
});

/** A workbook of invented data that another program saved (LibreOffice 7.4, openpyxl 3.0). */
function savedBy(program: string): Promise<Buffer> {
  return readFile(new URL(`../testing/files/saved-by-${program}.xlsx`, import.meta.url));
}

/** Changes a byte within the packed bytes of the sheet. */
function withByteChanged(bytes: Buffer): Buffer {
  const changed = Buffer.from(bytes);
  const at = changed.indexOf('xl/worksheets/sheet1.xml') + 'xl/worksheets/sheet1.xml'.length + 12;
  changed[at] = (changed[at] ?? 0) ^ 0x10;
  return changed;
}
