import { describe, expect, it } from 'vitest';
import { COUNTED_OUTCOME_COLUMN_ID, type CodeBook } from './code-book';
import { factorLevels } from './factor-levels';
import { proposeCodeBook } from './propose-code-book';
import { profileOf } from './testing/contents';

describe('proposeCodeBook', () => {
  it('puts the levels of an ordered column in their true order and starts from the lowest', () => {
    const column = columnOf(
      proposeCodeBook(profileOf({ alcgp: ['120+', '0-39g/day', '40-79'] })),
      'alcgp',
    );
    expect(column.kind).toBe('orderedCategory');
    expect(column.levels.map(({ label }) => label)).toEqual(['0-39g/day', '40-79', '120+']);
    expect(column.levels.map(({ id }) => id)).toEqual(['0-39g-day', '40-79', '120']);
    expect(column.referenceLevelId).toBe('0-39g-day');
  });

  it('marks blanks and usual words for no answer as missing', () => {
    const column = columnOf(
      proposeCodeBook(profileOf({ Sex: ['Male', '', 'NA', 'Female'] })),
      'sex',
    );
    expect(column.levels.map(({ label, sentenceLabel }) => [label, sentenceLabel])).toEqual([
      ['Male', 'male'],
      ['Female', 'female'],
    ]);
    expect(column.missingCodes).toEqual([
      { code: '', reason: 'Blank' },
      { code: 'NA', reason: 'Not available' },
    ]);
  });

  it('labels a column from its name, with its unit', () => {
    const column = columnOf(
      proposeCodeBook(profileOf({ 'wet_work (hours)': ['1.5', '2.25'] })),
      'wet-work-hours',
    );
    expect(column).toMatchObject({
      label: 'Wet work',
      sentenceLabel: 'wet work',
      unit: 'hours',
      kind: 'number',
      levels: [],
    });
  });

  it('marks words in a column of numbers', () => {
    const hours = [...Array.from({ length: 30 }, (_, index) => String(index)), 'some'];
    const column = columnOf(proposeCodeBook(profileOf({ hours })), 'hours');
    expect(column.missingCodes).toContainEqual({ code: 'some', reason: 'Not a number' });
  });

  it('takes a negative word for the reference', () => {
    const book = proposeCodeBook(profileOf({ gloves: ['Yes', 'No'] }));
    expect(columnOf(book, 'gloves').referenceLevelId).toBe('no');
  });
});

describe('the layout', () => {
  const groups = { group: ['a', 'b', 'c'] };

  it('is one record a row without a count', () => {
    expect(proposeCodeBook(profileOf(groups)).layout).toEqual({ kind: 'records' });
  });

  it('is one count when a column is named so', () => {
    const book = proposeCodeBook(profileOf({ ...groups, count: ['3', '0', '8'] }));
    expect(book.layout).toEqual({ kind: 'count', columnId: 'count' });
  });

  it('stays one record a row beside an identifier, and the count is a number', () => {
    const book = proposeCodeBook(profileOf({ id: ['1', '2', '3'], count: ['3', '0', '8'] }));
    expect(book.layout).toEqual({ kind: 'records' });
    expect(columnOf(book, 'count').kind).toBe('number');
  });

  it('is cases and controls, with the outcome that they stand for', () => {
    const book = proposeCodeBook(
      profileOf({ ...groups, ncases: ['3', '0', '8'], ncontrols: ['30', '10', '80'] }),
    );
    expect(book.layout).toEqual({
      kind: 'casesAndControls',
      casesColumnId: 'ncases',
      controlsColumnId: 'ncontrols',
    });
    expect(factorLevels(columnOf(book, COUNTED_OUTCOME_COLUMN_ID))).toEqual([
      { id: 'event', label: 'Case', sentenceLabel: 'case' },
      { id: 'non-event', label: 'Control', sentenceLabel: 'control' },
    ]);
  });

  it('is events and total, unless the events are more', () => {
    const fitting = profileOf({ ...groups, events: ['3', '0', '8'], total: ['30', '10', '80'] });
    expect(proposeCodeBook(fitting).layout).toEqual({
      kind: 'eventsAndTotal',
      eventsColumnId: 'events',
      totalColumnId: 'total',
    });
    const excessive = profileOf({ ...groups, events: ['30', '10', '80'], n: ['3', '0', '8'] });
    expect(proposeCodeBook(excessive).layout).toEqual({ kind: 'count', columnId: 'n' });
  });
});

function columnOf(book: CodeBook, id: string) {
  return book.columns.find((column) => column.id === id)!;
}
