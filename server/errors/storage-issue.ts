import type { IssueCode } from './issues';

/** What the database or the file system says when it cannot write, and what that means here. */
const STORAGE_CODES: readonly (readonly [start: string, code: IssueCode])[] = [
  ['SQLITE_BUSY', 'databaseBusy'],
  ['SQLITE_LOCKED', 'databaseBusy'],
  ['SQLITE_FULL', 'diskFull'],
  ['ENOSPC', 'diskFull'],
  ['EDQUOT', 'diskFull'],
  ['SQLITE_READONLY', 'diskReadOnly'],
  ['EROFS', 'diskReadOnly'],
];

/** The issue of an error that the machine caused, not the program; null for any other. */
export function storageIssue(problem: unknown): IssueCode | null {
  const said = codeOf(problem);
  const known = STORAGE_CODES.find(([start]) => said.startsWith(start));
  return known === undefined ? null : known[1];
}

/** Sequelize wraps the error of the database as `parent`. */
function codeOf(problem: unknown): string {
  if (typeof problem !== 'object' || problem === null) return '';
  if ('parent' in problem) return codeOf(problem.parent);
  return 'code' in problem && typeof problem.code === 'string' ? problem.code : '';
}
