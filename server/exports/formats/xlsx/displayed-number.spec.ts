import { describe, expect, it } from 'vitest';
import type { NumberStyle } from '#shared/house-style';
import { displayedNumber } from './displayed-number';

const STYLE: NumberStyle = {
  rounding: 'halfUp',
  decimalMark: '.',
  thousands: { separator: 'comma', fromDigits: 5 },
};

function percent(value: number, text: string, signed = false) {
  return { value, scale: 100, decimals: 1, signed, text };
}

describe('a displayed number', () => {
  it('keeps its precision where the sheet rounds to the printed digits', () => {
    const shown = displayedNumber(percent(34 / 163, '20.9'), STYLE);
    expect(shown).toEqual({ value: (34 / 163) * 100, format: '0.0' });
  });

  it('counts a tie of halves as the sheet does, from fifteen digits', () => {
    // 0.0285 * 100 is 2.8499999999999996 in binary; fifteen digits make it 2.85 again.
    const tie = { value: 0.0285, scale: 100, decimals: 1, signed: false, text: '2.9' };
    expect(displayedNumber(tie, STYLE).value).toBeCloseTo(2.85, 12);
  });

  it('gives way to the printed digits where the house style rounds another way', () => {
    expect(displayedNumber(percent(0.0225, '2.2'), STYLE).value).toBe(2.2);
  });

  it('has a true minus, and a plus where the report prints one', () => {
    expect(displayedNumber(percent(-0.0113, '−1.1'), STYLE).format).toBe('0.0;"−"0.0;0.0');
    expect(displayedNumber(percent(0.0113, '+1.1', true), STYLE).format).toBe('"+"0.0;"−"0.0;0.0');
  });

  it('shows no minus before zeros', () => {
    expect(displayedNumber(percent(-0.0001, '0.0', true), STYLE)).toEqual({
      value: 0,
      format: '"+"0.0;"−"0.0;0.0',
    });
  });

  it('groups thousands as the house style does', () => {
    const count = (value: number, text: string) => ({
      value,
      scale: 1,
      decimals: 0,
      signed: false,
      text,
    });
    const narrow: NumberStyle = {
      ...STYLE,
      thousands: { separator: 'narrowSpace', fromDigits: 5 },
    };
    expect(displayedNumber(count(1309, '1309'), STYLE).format).toBe('0');
    expect(displayedNumber(count(12345, '12,345'), STYLE).format).toBe('#,##0');
    expect(displayedNumber(count(12345, '12\u202f345'), narrow).format).toBe('#"\u202f"##0');
    expect(displayedNumber(count(1234567, '1\u202f234\u202f567'), narrow).format).toBe(
      '#"\u202f"###"\u202f"##0',
    );
  });

  it('shows in words what is no plain number in print', () => {
    expect(displayedNumber(percent(0.0004, '<0.1'), STYLE)).toEqual({
      value: 0.04,
      format: '"<0.1"',
    });
  });
});
