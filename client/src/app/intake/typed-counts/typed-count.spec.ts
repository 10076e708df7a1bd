import { expect, it } from 'vitest';
import { parsedCount } from './typed-count';

it.each([
  ['0', 0],
  [' 12 ', 12],
  ['1,234', 1234],
  ['1 234 567', 1234567],
  ['007', 7],
])('reads %j as %d', (text, count) => {
  expect(parsedCount(text)).toEqual({ ok: true, value: count });
});

it.each([
  ['', 'Type a count, or 0.'],
  ['-3', 'A count cannot be negative.'],
  ['−3', 'A count cannot be negative.'],
  ['12.5', 'Counts are whole numbers.'],
  ['0,5', 'Counts are whole numbers.'],
  ['a dozen', '"a dozen" is not a count.'],
  ['12345678901', 'This count is larger than a study can be.'],
])('refuses %j', (text, message) => {
  expect(parsedCount(text)).toEqual({ ok: false, issue: message });
});
