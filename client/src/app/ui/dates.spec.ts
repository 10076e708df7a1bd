import { expect, it } from 'vitest';
import { dayAfter, daysSinceMonday, isoDay, longDate, shortDate, weekdayAndDay } from './dates';

it('writes days in full and short', () => {
  expect(longDate(new Date(2025, 11, 1))).toBe('Monday 1 December 2025');
  expect(shortDate('2025-12-05')).toBe('5 Dec 2025');
  expect(weekdayAndDay('2025-12-05')).toBe('Fri 5');
});

it('counts days over the ends of months and years', () => {
  expect(dayAfter('2024-02-28', 1)).toBe('2024-02-29');
  expect(dayAfter('2025-01-01', -1)).toBe('2024-12-31');
});

it('begins the week on Monday', () => {
  expect(['2025-12-01', '2025-12-07'].map(daysSinceMonday)).toEqual([0, 6]);
});

it('takes the day where the reader is', () => {
  expect(isoDay(new Date(2025, 0, 9, 23, 59))).toBe('2025-01-09');
});
