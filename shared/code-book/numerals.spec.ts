import { describe, expect, it } from 'vitest';
import { isCount, parseNumber } from './numerals';

describe('parseNumber', () => {
  it.each([
    ['12', 12],
    ['-0.5', -0.5],
    ['+3', 3],
    ['.5', 0.5],
    ['5.', 5],
    [' 7 ', 7],
    ['1e3', 1000],
    ['\u22124', -4],
  ])('reads %j with a decimal point', (text, value) => {
    expect(parseNumber(text, '.')).toBe(value);
  });

  it.each(['', ' ', '1,5', '1.000,5', '12 kg', '0x10', 'Infinity', 'NaN', '1e999', '--1', '1-2'])(
    'finds no number in %j with a decimal point',
    (text) => {
      expect(parseNumber(text, '.')).toBeNull();
    },
  );

  it('reads a decimal comma only when told so', () => {
    expect(parseNumber('1,5', ',')).toBe(1.5);
    expect(parseNumber('1.5', ',')).toBeNull();
  });
});

describe('isCount', () => {
  it.each([0, 1, Number.MAX_SAFE_INTEGER])('accepts %d', (value) => {
    expect(isCount(value)).toBe(true);
  });

  it.each([-1, 0.5, Number.MAX_SAFE_INTEGER + 1, Infinity])('refuses %d', (value) => {
    expect(isCount(value)).toBe(false);
  });
});
