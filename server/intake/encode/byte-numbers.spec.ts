import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { parseNumber } from '#shared/code-book';
import { readNumber } from './byte-numbers';

const numberLike = fc.oneof(
  fc.double({ noNaN: true }).map(String),
  fc.float({ noNaN: true, min: -1e6, max: 1e6 }).map((value) => value.toFixed(3)),
  fc.integer().map(String),
  fc.string({ unit: fc.constantFrom(...'0123456789.,-+eE \u2212'.split('')), maxLength: 20 }),
);

describe('readNumber', () => {
  it('reads what parseNumber reads with a decimal point', () => {
    fc.assert(
      fc.property(numberLike, (text) => {
        const read = readNumber(Buffer.from(text));
        const value = read === null || read.writing === 'comma' ? null : read.value;
        expect(value).toBe(parseNumber(text, '.'));
      }),
      { numRuns: 2000 },
    );
  });

  it('reads what parseNumber reads with a decimal comma', () => {
    fc.assert(
      fc.property(numberLike, (text) => {
        const turned = text.replaceAll('.', ',');
        const read = readNumber(Buffer.from(turned));
        expect(read === null || read.writing === 'point' ? null : read.value).toBe(
          parseNumber(turned, ','),
        );
      }),
      { numRuns: 2000 },
    );
  });

  it.each([
    ['12', 'whole', false],
    ['1.5', 'point', false],
    ['1,5', 'comma', false],
    ['1,234', 'comma', true],
    ['0,234', 'comma', false],
    ['1.5e3', 'point', false],
  ])('says how %s is written', (text, writing, grouped) => {
    expect(readNumber(Buffer.from(text))).toMatchObject({ writing, grouped });
  });

  it.each(['', 'abc', '1,234,567', '1-2', '12 kg', '.', '-'])('finds no number in %j', (text) => {
    expect(readNumber(Buffer.from(text))).toBeNull();
  });
});
