import { describe, expect, it } from 'vitest';
import { proposeCodeBook, renameColumn, replaceColumn } from '#shared/code-book';
import { readBytes, type TestReading } from '../testing/read-bytes';

describe('the profile of a file', () => {
  it('counts, sums and lists what each column holds', async () => {
    const { profile } = await profiled('band,n\n20-29,5\n0-9,-1.5\n20-29,\n,7\n');
    expect(profile.rows).toBe(4);
    expect(profile.columns).toEqual([
      {
        columnId: 'band',
        name: 'band',
        guessedKind: 'orderedCategory',
        distinct: 2,
        blank: 1,
        numeric: 0,
        minimum: null,
        maximum: null,
        sum: null,
        values: [
          { value: '20-29', count: 2 },
          { value: '0-9', count: 1 },
          { value: '', count: 1 },
        ],
        truncated: false,
      },
      {
        columnId: 'n',
        name: 'n',
        guessedKind: 'count',
        distinct: 3,
        blank: 1,
        numeric: 3,
        minimum: -1.5,
        maximum: 7,
        sum: 10.5,
        values: [
          { value: '5', count: 1 },
          { value: '-1.5', count: 1 },
          { value: '', count: 1 },
          { value: '7', count: 1 },
        ],
        truncated: false,
      },
    ]);
  });

  it('lists the commonest thousand of more values, in order of first appearance', async () => {
    const rare = Array.from({ length: 1500 }, (_, at) => `r${String(at)}`);
    const common = Array.from({ length: 10 }, (_, at) => `c${String(at)}`);
    const { profile } = await profiled(`v\n${[...rare, ...common, ...common].join('\n')}\n`);
    const [column] = profile.columns;
    expect(column).toMatchObject({ distinct: 1510, truncated: true });
    expect(column?.values.map(({ value }) => value)).toEqual([...rare.slice(0, 990), ...common]);
  });

  it.each<[string, string, TestReading, string, number]>([
    ['a decimal point', 'a,b\n1.5,x\n2.25,y\n', {}, '.', 2],
    ['a decimal comma', 'a;b\n1,5;x\n2,25;y\n3;z\n', {}, ',', 3],
    ['a decimal comma between quotes', 'a,b\n"1,5",x\n"2,25",y\n', {}, ',', 2],
    ['a chosen mark', 'a;b\n1,5;x\n2.25;y\n', { options: { decimalMark: '.' } }, '.', 1],
    ['commas with three decimals beside semicolons', 'a;b\n1,500;x\n2,250;y\n', {}, ',', 2],
    ['thousands with commas beside commas', 'a,b\n"1,500",x\n"2,250",y\n', {}, '.', 0],
  ])('finds %s', async (_, text, reading, mark, numeric) => {
    const { profile } = await profiled(text, reading);
    expect(profile.usedOptions.decimalMark).toBe(mark);
    expect(profile.columns[0]?.numeric).toBe(numeric);
  });

  it('keeps the ids and the code book of the data set', async () => {
    const { profile: first } = await profiled('Age (years),sex\n31.5,m\n40.5,f\n');
    const book = proposeCodeBook(first);
    const previous = replaceColumn(
      { ...book, columns: book.columns.map((column) => ({ ...column, id: `own-${column.id}` })) },
      renameColumn({ ...book.columns[1]!, id: 'own-sex' }, { label: 'Sex at birth' }),
    );
    const { profile, proposal } = await profiled('sex,Age (years),ward\nm,31.5,A\nx,40.5,B\n', {
      previous,
    });
    expect(profile.columns.map(({ columnId }) => columnId)).toEqual([
      'own-sex',
      'own-age-years',
      'ward',
    ]);
    expect(proposal.codeBook.columns[1]).toMatchObject({ id: 'own-sex', label: 'Sex at birth' });
    expect(proposal.differences.map(({ code }) => code)).toEqual([
      'levelNew',
      'levelGone',
      'columnNew',
    ]);
  });
});

describe('warnings', () => {
  const many = (count: number, text: (at: number) => string): string =>
    Array.from({ length: count }, (_, at) => text(at)).join('\n');

  it.each<[string, string, string]>([
    ['emptyColumn', 'a,b\n1,\n2,\n', '"b" is empty.'],
    ['mostlyBlank', 'a,b\n1,\n2,\n3,x\n', '"b" is blank in 66 % of rows.'],
    [
      'caseVariants',
      'a,b\n1,Yes\n2,yes \n3,no\n',
      'Values of "b" differ only by case or blanks: "Yes" and "yes ".',
    ],
    [
      'mixedNumbersAndText',
      'a,b\nx,1\ny,2\nz,3\nx,about 4\n',
      '"b" holds numbers, and texts among them: "about 4".',
    ],
    [
      'groupedNumbers',
      'a;b\nx;1 000\ny;2 000\n',
      '"b" holds numbers with a mark between thousands, which are read as text. Save them without that mark.',
    ],
    [
      'groupedNumbers',
      'a,b\nx,"1,000"\ny,"2,000"\n',
      '"b" holds numbers with a mark between thousands, which are read as text. Save them without that mark.',
    ],
    [
      'tooManyLevels',
      `a,b\n${many(400, (at) => `1,text ${String(at % 100)}`)}\n`,
      '"b" has 100 different texts, too many for levels.',
    ],
    [
      'totalAmongLevels',
      'a,n\nx,1\ny,2\nTotal,3\n',
      '"Total" in "a" looks like a sum of other rows, which would then count twice.',
    ],
    [
      'negativeCount',
      'a,count\nx,1\ny,-2\nz,3\n',
      '"count" looks like a count but is negative in 1 row.',
    ],
    [
      'fractionalCount',
      'a,count\nx,1.5\ny,2\nz,3.5\n',
      '"count" looks like a count but is not whole in 2 rows.',
    ],
    [
      'possibleMissingCode',
      `a,age\n${many(40, (at) => `x,${String(20 + at)}`)}\nx,999\nx,999\n`,
      '999 in "age", in 2 rows, looks like a code for no answer. If it is one, mark it as missing.',
    ],
    [
      'possibleMissingCode',
      `a,age\n${many(40, (at) => `x,${String(20 + at)}`)}\nx,-9\n`,
      '-9 in "age", in 1 row, looks like a code for no answer. If it is one, mark it as missing.',
    ],
    [
      'repeatedColumnName',
      'a,a,b\nx,y,z\n',
      'Several columns are named "a". The later ones got a number.',
    ],
    ['unnamedColumn', 'a,,b\nx,y,z\n', 'Column 2 has no name in the file.'],
    [
      'headerLooksLikeData',
      '1,2,x\n3,4,y\n',
      'The first row holds numbers, but it is taken for the column names.',
    ],
    [
      'oneColumn',
      'a\nx\ny\n',
      'Only one column was found. If there are more, choose what separates them.',
    ],
    ['repeatedHeader', 'a,b\n1,x\na,b\n2,y\n', 'The column names come again in line 3; left out.'],
    ['blankRows', 'a,b\n1,x\n\n,\n2,y\n', '2 blank rows were left out.'],
    [
      'decimalMarksDiffer',
      'a;b\n1,5;2.5\n2,25;3\n',
      'Decimals are written with a comma in some values and with a point in others. Those with a point are read as text.',
    ],
  ])('%s', async (code, text, message) => {
    const { profile } = await profiled(text);
    expect(
      profile.warnings.filter((warning) => warning.code === code).map((warning) => warning.message),
    ).toEqual([message]);
  });

  it('are none for a clean file', async () => {
    const { profile } = await profiled('id,sex,age\n1,m,31\n2,f,45\n3,m,28\n');
    expect(profile.warnings).toEqual([]);
  });

  it('leave out rows that repeat the header, but never count them', async () => {
    const { profile } = await profiled('a,b\n1,x\na,b\n2,y\n');
    expect(profile.rows).toBe(2);
    expect(profile.columns[1]?.values.map(({ value }) => value)).toEqual(['x', 'y']);
  });
});

async function profiled(text: string, reading: TestReading = {}) {
  const read = await readBytes(text, reading);
  if (!read.ok) throw new Error(read.issue.code);
  return read.value;
}
