import { expect, it } from 'vitest';
import { initialsOf } from './present-person';

it.each([
  ['Ada Juniper Birch', 'AB'],
  ['  ada   birch ', 'AB'],
  ['Ömer', 'Ö'],
  ['', ''],
  ['𝒜da Birch', '𝒜B'],
])('takes the initials of %j', (name, initials) => {
  expect(initialsOf(name)).toBe(initials);
});
