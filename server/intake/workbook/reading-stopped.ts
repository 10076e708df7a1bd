import type { IntakeIssue } from '../intake-issue';

/**
 * Carries an issue out of the nested generators and parser callbacks of a workbook; the door of
 * this folder turns it into a value.
 */
export class ReadingStopped extends Error {
  constructor(readonly issue: IntakeIssue) {
    super(issue.code);
  }
}

/** Stops because a part of the workbook is not what it should be. */
export function damaged(part: string): ReadingStopped {
  return new ReadingStopped({ code: 'damagedWorkbook', facts: { part } });
}
