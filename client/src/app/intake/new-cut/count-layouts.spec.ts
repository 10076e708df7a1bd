import type { ColumnProfile } from '#shared/api';
import { expect, it } from 'vitest';
import { compareCuts } from './compare-cuts';
import { countChoices, layoutOf, layoutSlots } from './count-layouts';
import { dataValuesOf, isDoubtful, profileUnder } from './data-values';

const column = (name: string, values: readonly string[], kind: ColumnProfile['guessedKind']) => {
  const numbers = values.map(Number).filter((value) => !Number.isNaN(value));
  return {
    columnId: name,
    name,
    guessedKind: kind,
    distinct: values.length,
    blank: values.filter((value) => value === '').length,
    numeric: numbers.length,
    minimum: numbers.length === 0 ? null : Math.min(...numbers),
    maximum: numbers.length === 0 ? null : Math.max(...numbers),
    sum: numbers.length === 0 ? null : numbers.reduce((sum, number) => sum + number, 0),
    values: values.map((value) => ({ value, count: 1 })),
    truncated: false,
  };
};

const total = column('total', ['40', '50'], 'count');
const ill = column('ill', ['4', '9'], 'count');
const group = column('group', ['a', 'b'], 'category');
const change = column('change', ['-1', '2'], 'number');
const columns = [total, ill, group, change];

it('lets only whole numbers from zero on be counts', () => {
  expect(countChoices(columns).map(({ name }) => name)).toEqual(['total', 'ill']);
});

it('takes the smaller of two counts as the events', () => {
  expect(layoutOf('eventsAndTotal', countChoices(columns))).toEqual({
    kind: 'eventsAndTotal',
    eventsColumnId: 'ill',
    totalColumnId: 'total',
  });
});

it('offers no layout that lacks columns', () => {
  expect(layoutOf('casesAndControls', [ill])).toBeNull();
  expect(layoutOf('count', [])).toBeNull();
  expect(layoutOf('records', [])).toEqual({ kind: 'records' });
});

it('exchanges a column of a layout', () => {
  const [cases] = layoutSlots({
    kind: 'casesAndControls',
    casesColumnId: 'ill',
    controlsColumnId: 'total',
  });
  expect(cases?.with('other')).toMatchObject({ casesColumnId: 'other', controlsColumnId: 'total' });
});

const profile = {
  fileName: 'a.csv',
  rows: 2,
  columns,
  warnings: [],
  usedOptions: { delimiter: ',', encoding: 'utf-8' as const, decimalMark: null, sheet: null },
  sheets: [],
};

it('gives a profile the ids of a code book by name', () => {
  const book = {
    schemaVersion: 1 as const,
    layout: { kind: 'records' as const },
    columns: [
      {
        ...{ id: 'lasting', name: 'group', kind: 'category' as const, label: 'G' },
        ...{ sentenceLabel: 'g', unit: null, levels: [], bands: [], missingCodes: [] },
        referenceLevelId: null,
      },
    ],
  };
  expect(profileUnder(profile, book).columns.map(({ columnId }) => columnId)).toContain('lasting');
  expect(dataValuesOf(profile).valuesOf.get('group')).toEqual(['a', 'b']);
});

it('holds no level absent that a shortened profile may leave out', () => {
  const short = { ...profile, columns: [{ ...group, truncated: true }] };
  const finding = {
    code: 'levelNotInData' as const,
    severity: 'caution' as const,
    columnId: 'group',
    levelId: 'c',
    path: '',
    message: '',
    value: null,
  };
  expect(isDoubtful(finding, short)).toBe(true);
  expect(isDoubtful(finding, profile)).toBe(false);
});

it('compares rows, and blanks where they differ', () => {
  const after = { ...profile, rows: 3, columns: [{ ...group, blank: 1 }, ill] };
  expect(compareCuts(profile, after)).toEqual([
    { name: 'Rows', before: '2', after: '3' },
    { name: 'group, blank', before: '0', after: '1' },
  ]);
});
