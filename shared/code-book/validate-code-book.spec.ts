import { describe, expect, it } from 'vitest';
import { COUNTED_OUTCOME_COLUMN_ID, type CodeBook, type CodeBookColumn } from './code-book';
import { replaceColumn } from './edit-column';
import { proposeCodeBook } from './propose-code-book';
import { profileOf } from './testing/contents';
import { validateCodeBook } from './validate-code-book';

const data = {
  sex: ['Female', 'Male', 'Female'],
  age: ['31.5', '62.25', '40'],
  cases: ['3', '0', '8'],
  controls: ['30', '10', '80'],
};
const book = proposeCodeBook(profileOf(data));
const sex = columnOf('sex');
const age = columnOf('age');
const outcome = columnOf(COUNTED_OUTCOME_COLUMN_ID);
const band = { id: 'b', lower: 0, upper: 40, label: '0 to <40', sentenceLabel: 'under 40' };

describe('validateCodeBook', () => {
  it('finds nothing in a proposal, with its data or without', () => {
    expect(validateCodeBook(book)).toEqual([]);
    expect(validateCodeBook(book, dataValues(data))).toEqual([]);
  });

  it.each<[string, CodeBook, string]>([
    [
      'columnIdTwice',
      { ...book, columns: [...book.columns, { ...sex, name: 'x' }] },
      'columns.5.id',
    ],
    [
      'columnNameTwice',
      { ...book, columns: [...book.columns, { ...sex, id: 'x' }] },
      'columns.5.name',
    ],
    ['outcomeColumnMissing', { ...book, columns: book.columns.slice(0, 4) }, 'columns'],
    ['outcomeColumnUncalledFor', { ...book, layout: { kind: 'records' } }, 'columns.4'],
    [
      'outcomeLevelsChanged',
      withColumn({ ...outcome, levels: outcome.levels.slice(1), referenceLevelId: null }),
      'columns.4',
    ],
    ['outcomeLevelsChanged', withColumn({ ...outcome, kind: 'number' }), 'columns.4'],
    [
      'layoutColumnUnknown',
      {
        ...book,
        layout: { kind: 'casesAndControls', casesColumnId: 'gone', controlsColumnId: 'controls' },
      },
      'layout',
    ],
    [
      'layoutColumnTwice',
      {
        ...book,
        layout: { kind: 'casesAndControls', casesColumnId: 'cases', controlsColumnId: 'cases' },
      },
      'layout',
    ],
    ['layoutColumnNotCount', withColumn({ ...columnOf('cases'), kind: 'number' }), 'layout'],
    ['levelIdTwice', withColumn({ ...sex, bands: [{ ...band, id: 'male' }] }), 'columns.0'],
    [
      'codeInTwoLevels',
      withColumn({ ...sex, levels: [...sex.levels, { ...sex.levels[0]!, id: 'x', label: 'X' }] }),
      'columns.0.levels.2.codes',
    ],
    [
      'codeBothLevelAndMissing',
      withColumn({ ...sex, missingCodes: [{ code: 'Male', reason: 'x' }] }),
      'columns.0.missingCodes',
    ],
    [
      'missingCodeTwice',
      withColumn({ ...sex, missingCodes: [...sex.missingCodes, ...sex.missingCodes] }),
      'columns.0.missingCodes',
    ],
    ['bandEmpty', withColumn({ ...age, bands: [{ ...band, upper: 0 }] }), 'columns.1.bands'],
    [
      'bandsOverlap',
      withColumn({
        ...age,
        bands: [{ ...band, id: 'c', label: 'C', lower: 39.5, upper: null }, band],
      }),
      'columns.1.bands',
    ],
    [
      'referenceUnknown',
      withColumn({ ...sex, referenceLevelId: 'gone' }),
      'columns.0.referenceLevelId',
    ],
  ])('refuses %s', (code, wrong, path) => {
    expect(validateCodeBook(wrong)).toEqual([
      expect.objectContaining({
        code,
        severity: 'refusal',
        path,
        message: expect.stringMatching(/^[A-Z"].+\.$/) as string,
      }),
    ]);
  });

  it.each<[string, CodeBook]>([
    [
      'bandsLeaveGap',
      withColumn({ ...age, bands: [band, { ...band, id: 'c', label: 'C', lower: 41, upper: 50 }] }),
    ],
    [
      'labelTwice',
      withColumn({ ...sex, levels: sex.levels.map((level) => ({ ...level, label: 'Any' })) }),
    ],
    [
      'levelWithoutCodes',
      withColumn({
        ...sex,
        levels: sex.levels.map((level, at) => (at === 0 ? { ...level, codes: [] } : level)),
      }),
    ],
    ['noLevels', withColumn({ ...sex, levels: [] })],
  ])('cautions about %s', (code, odd) => {
    expect(validateCodeBook(odd)).toEqual([expect.objectContaining({ code, severity: 'caution' })]);
  });

  it('allows bands that touch, in any order', () => {
    const above = { ...band, id: 'c', label: 'C', lower: 40, upper: null };
    expect(validateCodeBook(withColumn({ ...age, bands: [above, band] }))).toEqual([]);
  });
});

describe('validateCodeBook with data', () => {
  it.each([
    ['countBlank', ['3', ' ', '8'], 'a blank'],
    ['countNotNumber', ['3', 'many', '8'], '"many"'],
    ['countNotWhole', ['3', '2.5', '8'], '2.5'],
    ['countNegative', ['3', '-1', '8'], '-1'],
  ])('refuses %s', (code, cases, words) => {
    const [finding] = validateCodeBook(book, dataValues({ ...data, cases }));
    expect(finding).toMatchObject({
      code,
      severity: 'refusal',
      columnId: 'cases',
      value: cases[1],
    });
    expect(finding?.message).toContain(words);
  });

  it('reads counts under the decimal mark of the data', () => {
    const german = {
      ...dataValues({ ...data, cases: ['3,0', '2', '8'] }),
      decimalMark: ',' as const,
    };
    expect(validateCodeBook(book, german)).toEqual([]);
  });

  it('refuses a count column that is not in the data, and cautions about any other', () => {
    const rest = { sex: data.sex, controls: data.controls };
    expect(
      validateCodeBook(book, dataValues(rest)).map(({ code, severity, columnId }) => [
        code,
        severity,
        columnId,
      ]),
    ).toEqual([
      ['columnNotInData', 'refusal', 'cases'],
      ['columnNotInData', 'caution', 'age'],
    ]);
  });

  it('cautions about values without a level and levels without records', () => {
    const referring = replaceColumn(book, { ...sex, referenceLevelId: 'male' });
    const found = validateCodeBook(
      referring,
      dataValues({ ...data, sex: ['Female', 'F', '', 'W'] }),
    );
    expect(found.map(({ code }) => code)).toEqual(['valuesNotInCodeBook', 'referenceNotInData']);
    expect(found[0]?.message).toContain('"F", "W"');
  });

  it('cautions about words in a banded column', () => {
    const banded = withColumn({ ...age, bands: [band] });
    const found = validateCodeBook(
      banded,
      dataValues({ ...data, age: ['31', 'a', 'b', 'c', 'd', 'e', 'f', ''] }),
    );
    expect(found).toEqual([
      expect.objectContaining({ code: 'valuesNotNumbers', columnId: 'age', value: 'a' }),
    ]);
    expect(found[0]?.message).toContain('"e" and 1 more');
  });
});

function columnOf(id: string): CodeBookColumn {
  return book.columns.find((column) => column.id === id)!;
}

function withColumn(column: CodeBookColumn): CodeBook {
  return replaceColumn(book, column);
}

function dataValues(columns: Readonly<Record<string, readonly string[]>>) {
  return { decimalMark: '.' as const, valuesOf: new Map(Object.entries(columns)) };
}
