import type { CodeBook, CodeBookColumn } from '#shared/code-book';
import { expect, it } from 'vitest';
import { columnDifferences, onTopOf } from './code-book-differences';

const column: CodeBookColumn = {
  id: 'c1',
  name: 'dose',
  kind: 'orderedCategory',
  label: 'Dose',
  sentenceLabel: 'dose',
  unit: null,
  levels: [
    { id: 'a', codes: ['0'], label: 'None', sentenceLabel: 'none' },
    { id: 'b', codes: ['1', '2'], label: 'Some', sentenceLabel: 'some' },
  ],
  bands: [],
  missingCodes: [{ code: '', reason: 'Not answered' }],
  referenceLevelId: 'a',
};
const book = (columns: readonly CodeBookColumn[]): CodeBook => ({
  schemaVersion: 1,
  layout: { kind: 'records' },
  columns,
});

it('says nothing where two code books agree', () => {
  expect(columnDifferences(book([column]), book([column]))).toEqual([]);
});

it('describes both sides of a column that differs', () => {
  const other = { ...column, levels: column.levels.toReversed(), referenceLevelId: null };
  expect(columnDifferences(book([column]), book([other]))).toEqual([
    {
      columnId: 'c1',
      label: 'Dose',
      mine:
        'Dose (dose), ordered category; levels None, reference, Some (1, 2); ' +
        'missing blank: Not answered',
      theirs:
        'Dose (dose), ordered category; levels Some (1, 2), None; missing blank: Not answered',
    },
  ]);
});

it('names a column that only one of them has', () => {
  const [difference] = columnDifferences(book([column]), book([]));
  expect(difference?.theirs).toBe('Not there');
});

it('puts own changes on top and keeps what only others changed', () => {
  const second = { ...column, id: 'c2', name: 'site', label: 'Site' };
  const base = book([column, second]);
  const theirs = book([column, { ...second, label: 'Place' }]);
  const mine = book([{ ...column, label: 'Amount' }, second]);
  expect(onTopOf(theirs, mine, base).columns.map(({ label }) => label)).toEqual([
    'Amount',
    'Place',
  ]);
});
