import type { CodeBookColumn, ProfiledColumn } from '#shared/code-book';
import { expect, it } from 'vitest';
import { levelCounts, missingRows, unknownCodes } from './column-contents';
import { grainOf, parsedCutPoints } from './cut-points';

const contents: ProfiledColumn = {
  columnId: 'age',
  name: 'age',
  guessedKind: 'number',
  distinct: 4,
  blank: 1,
  numeric: 9,
  minimum: 20,
  maximum: 61,
  sum: 300,
  values: [
    { value: '20', count: 3 },
    { value: '40', count: 4 },
    { value: '61', count: 2 },
    { value: '', count: 1 },
  ],
  truncated: false,
};

const level = (id: string, codes: readonly string[]) => ({
  id,
  codes,
  label: id,
  sentenceLabel: id,
});

const column: CodeBookColumn = {
  id: 'age',
  name: 'age',
  kind: 'category',
  label: 'Age',
  sentenceLabel: 'age',
  unit: null,
  levels: [level('young', ['20', '40']), level('none', ['9'])],
  bands: [
    { ...level('below-40', []), lower: null, upper: 40 },
    { ...level('from-40', []), lower: 40, upper: null },
  ],
  missingCodes: [{ code: '', reason: 'Not answered' }],
  referenceLevelId: null,
};

it('counts the rows of levels and missing codes', () => {
  const counts = levelCounts(column, contents, '.');
  expect([...counts.ofLevel]).toEqual([
    ['young', 7],
    ['none', 0],
  ]);
  expect(counts.counted).toBe(7);
  expect(missingRows(counts)).toBe(1);
});

it('puts a cut point into the band above it', () => {
  const counts = levelCounts({ ...column, kind: 'number' }, contents, '.');
  expect([...counts.ofLevel]).toEqual([
    ['below-40', 3],
    ['from-40', 6],
  ]);
});

it('says nothing of what a shortened profile does not list', () => {
  const short = { ...contents, truncated: true };
  expect(levelCounts(column, short, '.').ofLevel.get('none')).toBeNull();
  expect(levelCounts({ ...column, kind: 'number' }, short, '.').counted).toBeNull();
});

it('names values that have no meaning', () => {
  expect(unknownCodes(column, contents)).toEqual([{ code: '61', count: 2 }]);
});

it.each([
  ['40, 60 75', [40, 60, 75]],
  ['0.5;1', [0.5, 1]],
  ['', []],
])('reads the cut points %j', (text, points) => {
  expect(parsedCutPoints(text)).toEqual({ ok: true, value: points });
});

it('refuses a cut point that is no number', () => {
  expect(parsedCutPoints('40, sixty')).toMatchObject({ ok: false });
});

it('tells whole numbers from others', () => {
  expect(grainOf(contents, '.')).toBe('wholeNumbers');
  const halves = { ...contents, values: [{ value: '1.5', count: 1 }] };
  expect(grainOf(halves, '.')).toBe('anyNumbers');
  expect(grainOf(null, '.')).toBe('anyNumbers');
});
