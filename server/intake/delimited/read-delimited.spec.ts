import { parse } from 'csv-parse/sync';
import fc from 'fast-check';
import iconv from 'iconv-lite';
import { describe, expect, it } from 'vitest';
import { intakeProblem } from '../intake-issue';
import { LIMITS } from '../limits';
import { readBytes, readCells, type TestReading } from '../testing/read-bytes';

describe('a delimited file', () => {
  it.each([
    ['commas', 'a,b\n1,2\n3,4\n', {}],
    ['semicolons', 'a;b\n1;2\n3;4', {}],
    ['tabs', 'a\tb\n1\t2\n3\t4\n', { fileName: 'data.tsv' }],
    ['bars', 'a|b\n1|2\n3|4\n', {}],
    ['a chosen character', 'a~b\n1~2\n3~4\n', { options: { delimiter: '~' } }],
    [
      'a chosen character of two bytes',
      'a\u00a6b\n1\u00a62\n3\u00a64\n',
      { options: { delimiter: '\u00a6' } },
    ],
    ['Windows line ends', 'a,b\r\n1,2\r\n3,4\r\n', {}],
    ['old Mac line ends', 'a,b\r1,2\r3,4\r', {}],
    ['quotes', '"a","b"\n"1","2"\n3,"4"\n', {}],
    ['a byte-order mark', '\ufeffa,b\n1,2\n3,4\n', {}],
    ['blank lines', '\n\na,b\n1,2\n\n , \n3,4\n\n', {}],
  ] as const)('with %s', async (_, text, reading: TestReading) => {
    expect(await readCells(text, reading)).toEqual({ a: ['1', '3'], b: ['2', '4'] });
  });

  it('keeps delimiters, line ends and quotes inside quoted cells', async () => {
    const text = 'a,b\n"x, y","line\r\nbreak"\n"say ""so""",""\n5" pipe,"""q"""\n';
    expect(await readCells(text)).toEqual({
      a: ['x, y', 'say "so"', '5" pipe'],
      b: ['line\r\nbreak', '', '"q"'],
    });
  });

  it('keeps blanks around cells as they are', async () => {
    expect(await readCells('a,b\n yes,no \n')).toEqual({ a: [' yes'], b: ['no '] });
  });

  it('reads Windows-1252 when the bytes are no UTF-8', async () => {
    const bytes = iconv.encode('Gr\u00f6\u00dfe;Preis\n5;3 \u20ac\n', 'windows-1252');
    expect(await readCells(bytes)).toEqual({ 'Gr\u00f6\u00dfe': ['5'], Preis: ['3 \u20ac'] });
  });

  it('reads UTF-8 as Windows-1252 when told so', async () => {
    const read = await readCells('a\n\u00e9\n', { options: { encoding: 'windows-1252' } });
    expect(read).toEqual({ a: ['\u00c3\u00a9'] });
  });

  it.each(['utf-16le', 'utf-16be'])('reads %s with its byte-order mark', async (encoding) => {
    const bytes = iconv.encode('a\tb\n\u00e9\t\u20ac\n', encoding, { addBOM: true });
    const read = await readBytes(bytes, { fileName: 'data.txt' });
    expect(read.ok && read.value.profile.warnings.map(({ code }) => code)).toEqual([
      'convertedFromUtf16',
    ]);
    expect(await readCells(bytes, { fileName: 'data.txt' })).toEqual({
      a: ['\u00e9'],
      b: ['\u20ac'],
    });
  });

  it('says how it was read', async () => {
    const read = await readBytes('a;b\n1,5;2\n');
    expect(read.ok && read.value.profile.usedOptions).toEqual({
      delimiter: ';',
      encoding: 'utf-8',
      decimalMark: ',',
      sheet: null,
    });
  });

  it('hashes the bytes of the file', async () => {
    const read = await readBytes('abc\n1\n');
    // sha256sum of GNU coreutils over the same bytes
    expect(read.ok && read.value.sha256).toBe(
      '5cb310b6f87a23bce211e77652daf4e4931a010ffbca35148659961a9207e0fb',
    );
  });

  it('reads large files in chunks as small ones at once', async () => {
    const rows = Array.from({ length: 150_000 }, (_, row) => `${String(row)},"${String(row % 7)}"`);
    const cells = await readCells(`id,day\r\n${rows.join('\r\n')}\r\n`);
    expect(cells.id?.length).toBe(150_000);
    expect(cells.id?.every((cell, row) => cell === String(row))).toBe(true);
    expect(cells.day?.every((cell, row) => cell === String(row % 7))).toBe(true);
  });

  it('gives pieces that can be stored', async () => {
    const rows = Array.from({ length: 100_000 }, (_, row) => `${String(row)},x`);
    const read = await readBytes(`id,same\n${rows.join('\n')}`);
    if (!read.ok) throw new Error(read.issue.code);
    expect(read.value.chunks.every(({ bytes }) => bytes.length <= LIMITS.chunkBytes)).toBe(true);
    expect(read.value.columns.map(({ width, dictionarySize }) => [width, dictionarySize])).toEqual([
      [4, 100_000],
      [1, 1],
    ]);
  });

  it('reads what an independent parser reads', async () => {
    const cell = fc.string({
      unit: fc.constantFrom('a', '1', '"', ',', '\n', '\r\n', ' ', '\u00e9'),
      maxLength: 6,
    });
    const table = fc.integer({ min: 2, max: 5 }).chain((width) =>
      fc.array(fc.array(cell, { minLength: width, maxLength: width }), {
        minLength: 1,
        maxLength: 20,
      }),
    );
    await fc.assert(
      fc.asyncProperty(table, fc.constantFrom('\n', '\r\n'), async (rows, lineEnd) => {
        const header = rows[0]!.map((_, at) => `column ${String(at)}`);
        const lines = [header, ...rows].map((row) => row.map(quoted).join(','));
        const text = lines.join(lineEnd);
        const parsed: string[][] = parse(text);
        const expected = parsed.slice(1).filter((row) => !row.every((one) => /^[ \t]*$/.test(one)));
        if (expected.length === 0) return;
        const cells = await readCells(text, { options: { delimiter: ',' } });
        expect(header.map((name) => cells[name])).toEqual(
          header.map((_, at) => expected.map((row) => row[at])),
        );
      }),
      { numRuns: 200 },
    );
  });
});

describe('a delimited file that cannot be read', () => {
  it.each<[string, string | Buffer, TestReading, string]>([
    ['emptyFile', '', {}, 'The file is empty.'],
    ['emptyFile', ' \n\n', {}, 'The file is empty.'],
    ['headerOnly', 'a,b\n', {}, 'The file has column names but no row of data.'],
    [
      'raggedRow',
      'a,b\n1,2\n"x\ny",2\n1,2,3\n',
      {},
      'Line 5 has 3 cells, and the row of column names has 2.',
    ],
    ['raggedRow', 'a,b\n1\n', {}, 'Line 2 has 1 cell, and the row of column names has 2.'],
    ['strayQuote', 'a,b\n"1"x,2\n', {}, 'Line 2 has text after a closing quotation mark.'],
    [
      'quoteNotClosed',
      'a,b\n1,2\n1,"2\n3,4\n',
      {},
      'The quotation mark that opens in line 3 is never closed.',
    ],
    ['binaryContent', 'a,b\n1,\0\n', {}, 'Line 2 holds bytes that are no text.'],
    ['binaryContent', 'a,b\n1,"\0"\n', {}, 'Line 2 holds bytes that are no text.'],
    [
      'notUtf8',
      Buffer.from('a,b\n1,\xe9\n', 'latin1'),
      { options: { encoding: 'utf-8' } },
      'Line 2 is not valid UTF-8.',
    ],
    [
      'notUtf8',
      Buffer.from('\xef\xbb\xbfa,b\n1,2\n1,\xe9\n', 'latin1'),
      {},
      'Line 3 is not valid UTF-8.',
    ],
    [
      'mixedEncodings',
      Buffer.from('a,b\n1,\xc3\xa9\n2,\xe9\n', 'latin1'),
      {},
      'Line 3 is not valid UTF-8, though other lines are.',
    ],
    [
      'unknownEncoding',
      Buffer.from('a,b\n1,\x81\n', 'latin1'),
      {},
      'Line 2 is neither UTF-8 nor Windows-1252.',
    ],
    [
      'badDelimiter',
      'a"b\n1"2\n',
      { options: { delimiter: '"' } },
      'The character "\\"" can\'t separate columns.',
    ],
    [
      'cellTooLong',
      `a,b\n1,${'x'.repeat(LIMITS.cellBytes + 1)}\n`,
      {},
      'A cell in line 2, column "b", is longer than 64 kB.',
    ],
    [
      'tooManyColumns',
      `${'a,'.repeat(LIMITS.columns)}b\n`,
      {},
      'The file has more than 2000 columns.',
    ],
    [
      'nameTooLong',
      `a,${'x'.repeat(LIMITS.nameCharacters + 1)}\n1,2\n`,
      {},
      'The name of column 2 is longer than 900 characters.',
    ],
    [
      'rowTooLong',
      Buffer.concat([Buffer.from('a,b\n1,2\n"'), Buffer.alloc(LIMITS.rowBytes + 1, 'x\n')]),
      {},
      'The row at line 3 goes on for more than 16 MB.',
    ],
  ])('%s', async (code, bytes, reading, message) => {
    const read = await readBytes(bytes, reading);
    if (read.ok) throw new Error('read');
    const problem = intakeProblem(read.issue);
    expect([problem.code, problem.message]).toEqual([code, message]);
    expect(problem.wayOut).toMatch(/^[A-Z].+\.$/);
  });

  it.each<[string, string, Buffer, string]>([
    ['unknownType', 'data.sav', Buffer.from('$FL2'), 'Files ending in "sav" can\'t be read.'],
    ['unknownType', 'data', Buffer.from('a,b'), 'Files ending in "" can\'t be read.'],
    [
      'notItsType',
      'data.csv',
      Buffer.from('PK\x03\x04....'),
      'The name says CSV, but the content is a workbook or another ZIP archive.',
    ],
    [
      'notItsType',
      'data.tsv',
      Buffer.from('%PDF-1.7'),
      'The name says TSV, but the content is a PDF document.',
    ],
    [
      'notItsType',
      'data.xlsx',
      Buffer.from('a,b\n1,2\n'),
      'The name says XLSX, but the content is no workbook.',
    ],
    [
      'oldOrProtectedWorkbook',
      'data.xlsx',
      Buffer.from('d0cf11e0a1b11ae1', 'hex'),
      'This is a workbook in the old format, or one that needs a password.',
    ],
  ])('%s: %s', async (code, fileName, bytes, message) => {
    const read = await readBytes(bytes, { fileName });
    if (read.ok) throw new Error('read');
    expect(read.issue.code).toBe(code);
    expect(intakeProblem(read.issue).message).toBe(message);
  });

  it('never fails otherwise, whatever the bytes', async () => {
    const rows = 'id;name;n\n1;"x;y";2\n2;\u00e9;3\n3;"a ""b""";4\n'.repeat(20);
    const whole = Buffer.from(rows);
    const mutation = fc.record({ at: fc.nat(whole.length - 1), byte: fc.nat(255), cut: fc.nat(3) });
    await fc.assert(
      fc.asyncProperty(fc.array(mutation, { maxLength: 8 }), async (mutations) => {
        let bytes = Buffer.from(whole);
        for (const { at, byte, cut } of mutations) {
          bytes = Buffer.concat([bytes.subarray(0, at), Buffer.of(byte), bytes.subarray(at + cut)]);
        }
        const read = await readBytes(bytes);
        if (!read.ok) expect(intakeProblem(read.issue).message).not.toContain('{');
        else expect(read.value.rows).toBeGreaterThan(0);
      }),
      { numRuns: 300 },
    );
  });
});

function quoted(cell: string): string {
  return /["\n\r,]|^$/.test(cell) ? `"${cell.replaceAll('"', '""')}"` : cell;
}
