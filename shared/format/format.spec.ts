import { describe, expect, it } from 'vitest';
import type { Estimate } from '#shared/stats';
import {
  footnoteMarker,
  formatCount,
  formatEstimate,
  formatNumber,
  formatPValue,
  formatShare,
  intervalLabel,
  joinLimits,
  MINUS,
  NO_BREAK_SPACE,
  withPercentSign,
  decimalsUnder,
  type PrecisionBasis,
} from './index';
import { NARROW_NO_BREAK_SPACE } from './number-text';
import { percentDecimals } from './percent-decimals';
import { OPEN_CLINICAL, styleWith } from './testing/house-style';

const DECIMALS = { percent: 1, riskDifference: 1, riskRatio: 2, oddsRatio: 2 };

function estimate(value: number, lower: number, upper: number): Estimate {
  return { value, interval: { lower, upper, level: 0.95, method: 'any' } };
}

function ratio(value: number, lower: number, upper: number, style = OPEN_CLINICAL) {
  const shown = { estimate: estimate(value, lower, upper), exact: null };
  const basis: PrecisionBasis = {
    groups: [],
    estimates: { riskDifference: [], riskRatio: [shown.estimate], oddsRatio: [] },
  };
  const text = formatEstimate('riskRatio', shown, decimalsUnder(basis, style), style);
  return [text.value.text, text.lower.text, text.upper.text].join(' ');
}

function difference(value: number, lower: number, upper: number, signs?: 'signed' | 'none') {
  const shown = { estimate: estimate(value, lower, upper), exact: null };
  const text = formatEstimate('riskDifference', shown, DECIMALS, OPEN_CLINICAL, signs);
  return [text.value.text, text.lower.text, text.upper.text].join(' ');
}

describe('counts', () => {
  it('group thousands as the style says', () => {
    expect(formatCount(1234, OPEN_CLINICAL).text).toBe('1234');
    expect(formatCount(12345, OPEN_CLINICAL).text).toBe(`12${NARROW_NO_BREAK_SPACE}345`);
    const comma = styleWith('numbers', { thousands: { separator: 'comma', fromDigits: 4 } });
    expect(formatCount(1234567, comma).text).toBe('1,234,567');
    expect(formatCount(999, comma).text).toBe('999');
  });
});

describe('percentages', () => {
  it('are exact from the counts and carry the number behind them', () => {
    expect(formatShare({ events: 49, total: 400 }, 1, OPEN_CLINICAL)).toEqual({
      text: '12.3',
      value: 49 / 400,
      scale: 100,
      decimals: 1,
      signed: false,
    });
  });

  it('are not shown for groups below the style’s smallest, nor for nobody', () => {
    expect(formatShare({ events: 3, total: 19 }, 0, OPEN_CLINICAL)).toBeNull();
    expect(formatShare({ events: 3, total: 20 }, 0, OPEN_CLINICAL)?.text).toBe('15');
    const all = styleWith('percent', { countsOnlyBelow: 0 });
    expect(formatShare({ events: 0, total: 0 }, 0, all)).toBeNull();
  });

  // AMA Manual of Style, 11th edition, section 18.7: 9 of 28 is 32%, not 32.1%.
  it('have no more digits than the denominator carries', () => {
    const decimals = percentDecimals([{ events: 9, total: 28 }], OPEN_CLINICAL.percent);
    expect(formatShare({ events: 9, total: 28 }, decimals, OPEN_CLINICAL)?.text).toBe('32');
  });

  it('have one setting for an analysis: what most groups ask for, or the smallest group', () => {
    const groups = [50, 250, 300].map((total) => ({ events: 10, total }));
    expect(percentDecimals(groups, OPEN_CLINICAL.percent)).toBe(1);
    const smallest = styleWith('percent', { mixedDenominators: 'smallest' });
    expect(percentDecimals(groups, smallest.percent)).toBe(0);
  });

  it('get one more decimal below the style’s mark', () => {
    const style = styleWith('percent', {
      decimalsByDenominator: [{ from: 0, decimals: 0 }],
      oneMoreDecimalBelow: 10,
    });
    expect(percentDecimals([{ events: 9, total: 100 }], style.percent)).toBe(1);
    expect(percentDecimals([{ events: 10, total: 100 }], style.percent)).toBe(0);
    expect(percentDecimals([{ events: 0, total: 100 }], style.percent)).toBe(0);
  });

  it('carry their sign closed, spaced or as a word', () => {
    expect(withPercentSign('12.5', OPEN_CLINICAL)).toBe('12.5%');
    const spaced = styleWith('percent', { sign: 'spaced' });
    expect(withPercentSign('12.5', spaced)).toBe(`12.5${NO_BREAK_SPACE}%`);
    const word = styleWith('percent', { sign: 'word', word: 'per cent' });
    expect(withPercentSign('12.5', word)).toBe(`12.5${NO_BREAK_SPACE}per cent`);
  });

  it('use the decimal mark of the style', () => {
    const comma = styleWith('numbers', { decimalMark: ',' });
    expect(formatShare({ events: 49, total: 400 }, 1, comma)?.text).toBe('12,3');
    const raised = styleWith('numbers', { decimalMark: '·' });
    expect(formatShare({ events: 49, total: 400 }, 1, raised)?.text).toBe('12·3');
  });
});

describe('differences', () => {
  it('have a true minus and an explicit plus beside limits with a minus only', () => {
    expect(difference(-0.0605, -0.111, -0.01)).toBe(`${MINUS}6.1 ${MINUS}11.1 ${MINUS}1.0`);
    expect(difference(0.162, 0.097, 0.234)).toBe('+16.2 9.7 23.4');
  });

  it('have no sign where words carry the direction', () => {
    expect(difference(-0.022, -0.085, 0.041, 'none')).toBe('2.2 8.5 4.1');
  });

  it('have no negative zero', () => {
    const form = { scale: 100, decimals: 1, sign: 'plusAndMinus' } as const;
    expect(formatNumber({ kind: 'real', value: -0.0004 }, form, OPEN_CLINICAL).text).toBe('0.0');
  });

  it('never print a limit as 0 that is not 0', () => {
    expect(difference(0.03, 0.0003, 0.06)).toBe('+3.00 0.03 6.00');
    expect(difference(0.03, 0, 0.06)).toBe('+3.0 0.0 6.0');
  });

  it('are per 1,000 with one decimal less where the style counts so', () => {
    const style = { ...OPEN_CLINICAL, difference: { unit: 'per1000' } as const };
    const basis: PrecisionBasis = {
      groups: [{ events: 10, total: 300 }],
      estimates: {
        riskDifference: [estimate(-0.0605, -0.111, -0.01)],
        riskRatio: [],
        oddsRatio: [],
      },
    };
    const shown = { estimate: basis.estimates.riskDifference[0]!, exact: null };
    const text = formatEstimate('riskDifference', shown, decimalsUnder(basis, style), style);
    expect(text.value).toMatchObject({ text: `${MINUS}61`, scale: 1000, decimals: 0 });
  });

  it('are rounded from the exact fraction, not from the double', () => {
    const shown = {
      estimate: estimate(0.001_249_999, 0.0008, 0.0017),
      exact: { kind: 'fraction', numerator: 1, denominator: 800 } as const,
    };
    const text = formatEstimate(
      'riskDifference',
      shown,
      { ...DECIMALS, riskDifference: 2 },
      OPEN_CLINICAL,
    );
    expect(text.value.text).toBe('+0.13');
  });
});

describe('ratios', () => {
  it.each([
    [[1.486, 1.09, 2.05], '1.49 1.09 2.05'],
    [[0.158, 0.058, 0.43], '0.16 0.06 0.43'],
    [[0.0512, 0.0123, 0.21], '0.051 0.012 0.210'],
    [[6.331, 2.337, 17.14], '6.33 2.34 17.14'],
    [[1.4, 0.996, 2], '1.400 0.996 2.000'],
    [[1.4, 1, 2], '1.40 1.00 2.00'],
    [[0.3, 0.0034, 0.9], '0.30 0.0034 0.90'],
  ] as const)('%o', ([value, lower, upper], text) => {
    expect(ratio(value, lower, upper)).toBe(text);
  });

  it('of a style with one decimal keep two significant digits below 1', () => {
    const style = { ...OPEN_CLINICAL, ratio: { decimals: 1 } as const };
    expect(ratio(4.53, 2.3, 8.6, style)).toBe('4.5 2.3 8.6');
    expect(ratio(0.158, 0.058, 0.43, style)).toBe('0.16 0.06 0.43');
    expect(ratio(1.44, 0.73, 2.85, style)).toBe('1.44 0.73 2.85');
  });

  it('of one column share their decimals', () => {
    const basis: PrecisionBasis = {
      groups: [],
      estimates: {
        riskDifference: [],
        riskRatio: [estimate(1.4, 0.996, 2), estimate(3, 2, 4)],
        oddsRatio: [estimate(3, 2, 4)],
      },
    };
    expect(decimalsUnder(basis, OPEN_CLINICAL)).toMatchObject({ riskRatio: 3, oddsRatio: 2 });
  });
});

describe('p-values', () => {
  const compact = styleWith('pValue', {
    leadingZero: false,
    decimals: [
      { below: 0.01, decimals: 3 },
      { below: 1, decimals: 2 },
    ],
  });

  it.each([
    [0.0004, '<.001'],
    [0.00099999, '<.001'],
    [0.001, '.001'],
    [0.0099, '.010'],
    [0.012, '.01'],
    [0.046, '.046'],
    [0.0496, '.0496'],
    [0.049999, '.049999'],
    [0.0504, '.05'],
    [0.05, '.05'],
    [0.17, '.17'],
    [0.99, '.99'],
    [0.994, '>.99'],
    [1, '>.99'],
    [0, '<.001'],
  ])('%d prints %s and never crosses 0.05', (value, text) => {
    expect(formatPValue(value, 0.95, compact).text).toBe(text);
  });

  it('stay on their side of the analysis’ own level', () => {
    expect(formatPValue(0.0096, 0.99, compact).text).toBe('.0096');
    expect(formatPValue(0.0496, 0.9, compact).text).toBe('.05');
    expect(formatPValue(0.0996, 0.9, compact).text).toBe('.0996');
    expect(formatPValue(0.0003, 0.9995, compact).text).toBe('<.0005');
  });

  it('keep no number where a bound is printed', () => {
    expect(formatPValue(0.0004, 0.95, compact).number).toBeNull();
    expect(formatPValue(0.17, 0.95, compact).number).toMatchObject({ value: 0.17, decimals: 2 });
  });

  it('have a leading zero and three decimals where the style says so', () => {
    expect(formatPValue(0.012, 0.95, OPEN_CLINICAL).text).toBe('0.012');
    expect(formatPValue(0.49, 0.95, OPEN_CLINICAL).text).toBe('0.49');
    expect(formatPValue(0.00001, 0.95, OPEN_CLINICAL).text).toBe('<0.001');
  });
});

describe('limits', () => {
  const dash = styleWith('interval', { separator: 'enDash' });
  const comma = styleWith('interval', { separator: 'comma' });

  it('are joined by the style’s separator, and never by a dash beside a minus', () => {
    expect(joinLimits('9.7', '23.4', OPEN_CLINICAL)).toBe('9.7 to 23.4');
    expect(joinLimits('9.7', '23.4', dash)).toBe('9.7–23.4');
    expect(joinLimits(`${MINUS}11.1`, `${MINUS}1.0`, dash)).toBe(`${MINUS}11.1 to ${MINUS}1.0`);
    expect(joinLimits('9.7', '23.4', comma)).toBe('9.7, 23.4');
  });

  it('have no comma between decimal commas', () => {
    const both = { ...comma, numbers: { ...comma.numbers, decimalMark: ',' as const } };
    expect(joinLimits('9,7', '23,4', both)).toBe('9,7; 23,4');
  });

  it('name their level', () => {
    expect(intervalLabel(0.95, OPEN_CLINICAL)).toBe(`95%${NO_BREAK_SPACE}CI`);
    expect(intervalLabel(0.999, styleWith('interval', { label: 'spelled' }))).toBe(
      `99.9%${NO_BREAK_SPACE}confidence interval`,
    );
  });
});

describe('footnote markers', () => {
  it.each([
    ['letters', ['a', 'b', 'z', 'aa']],
    ['symbols', ['*', '†', '††', '†††††']],
    ['numbers', ['1', '2', '26', '27']],
  ] as const)('%s', (footnoteMarkers, want) => {
    const { table } = styleWith('table', { footnoteMarkers });
    const places = footnoteMarkers === 'symbols' ? [0, 1, 7, 25] : [0, 1, 25, 26];
    expect(places.map((place) => footnoteMarker(place, table))).toEqual(want);
  });
});
