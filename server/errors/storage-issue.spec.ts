import { expect, it } from 'vitest';
import { storageIssue } from './storage-issue';

function failed(code: string): Error {
  return Object.assign(new Error(code), { code });
}

it.each([
  [failed('SQLITE_FULL'), 'diskFull'],
  [Object.assign(new Error('wrapped'), { parent: failed('SQLITE_BUSY') }), 'databaseBusy'],
  [
    Object.assign(new Error('wrapped'), { parent: failed('SQLITE_READONLY_DBMOVED') }),
    'diskReadOnly',
  ],
  [failed('ENOSPC'), 'diskFull'],
  [failed('EROFS'), 'diskReadOnly'],
  [failed('SQLITE_CONSTRAINT'), null],
  [failed('ENOENT'), null],
  [new Error('a bug'), null],
  ['a text', null],
  [null, null],
])('knows what the machine caused (%#)', (problem, issue) => {
  expect(storageIssue(problem)).toBe(issue);
});
