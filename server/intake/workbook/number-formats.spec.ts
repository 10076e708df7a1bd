import { describe, expect, it } from 'vitest';
import { dayText, formatMeaning } from './number-formats';

describe('formatMeaning', () => {
  it.each([
    [0, undefined, 'number'],
    [14, undefined, 'date'],
    [22, undefined, 'dateTime'],
    [46, undefined, 'time'],
    [164, 'yyyy-mm-dd', 'date'],
    [164, 'dd/mm/yyyy hh:mm', 'dateTime'],
    [164, '[h]:mm:ss', 'time'],
    [164, '0.00', 'number'],
    [164, '#,##0 "days"', 'number'],
    [164, '[Red]0.0;[Blue]-0.0', 'number'],
    [164, '[$-409]d mmm yyyy;@', 'date'],
    [164, 'General', 'number'],
    [164, '0\\d', 'number'],
    [164, 'mmm', 'date'],
  ] as const)('takes format %d %s for a %s', (id, code, meaning) => {
    expect(formatMeaning(id, code)).toBe(meaning);
  });
});

/** Day numbers as Excel's documentation and LibreOffice show them. */
describe('dayText', () => {
  it.each([
    [1, 'date', '1900', '1900-01-01'],
    [59, 'date', '1900', '1900-02-28'],
    [61, 'date', '1900', '1900-03-01'],
    [25_569, 'date', '1900', '1970-01-01'],
    [39_448, 'date', '1900', '2008-01-01'],
    [37_986, 'date', '1904', '2008-01-01'],
    [46_112.5, 'dateTime', '1900', '2026-03-31T12:00:00'],
    [46_112, 'dateTime', '1900', '2026-03-31T00:00:00'],
    [46_112.25, 'date', '1900', '2026-03-31T06:00:00'],
    [0.75, 'time', '1900', '18:00:00'],
    [45_000.999999999, 'date', '1900', '2023-03-16'],
  ] as const)('shows %d as %s in the calendar of %s', (serial, meaning, calendar, text) => {
    expect(dayText(serial, meaning, calendar)).toBe(text);
  });

  it.each([-1, 2_958_466, NaN])('finds no day in %d', (serial) => {
    expect(dayText(serial, 'date', '1900')).toBeNull();
  });
});
