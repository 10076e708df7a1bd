import { describe, expect, it } from 'vitest';
import { columnIdsFor, levelIdFor } from './ids';

describe('levelIdFor', () => {
  it.each([
    ['0-39g/day', '0-39g-day'],
    ['Gr\u00f6\u00dfe M', 'gro-e-m'],
    ['120+', '120'],
    ['', 'level'],
    ['\u03b1', 'level'],
  ])('makes an id from %j', (code, id) => {
    expect(levelIdFor(code, new Set())).toBe(id);
  });

  it('numbers an id that is taken', () => {
    expect(levelIdFor('<40', new Set(['40', '40-2']))).toBe('40-3');
  });
});

describe('columnIdsFor', () => {
  it('keeps known ids and makes free ones for the rest', () => {
    const known = new Map([['Age', 'age-in-years']]);
    expect(columnIdsFor(['Age', 'age', 'AGE', 'total'], known, ['total'])).toEqual([
      'age-in-years',
      'age',
      'age-2',
      'total-2',
    ]);
  });
});
