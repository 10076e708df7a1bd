import { sizeInWords } from '../errors/size-in-words';
import type { IntakeIssue } from './intake-issue';
import { LIMITS } from './limits';

/** The issue with the limit that it ran into, for its words. */
export function withLimit(issue: IntakeIssue): IntakeIssue {
  const limit = LIMIT_OF[issue.code];
  return limit === undefined ? issue : { ...issue, facts: { limit, ...issue.facts } };
}

const LIMIT_OF: Partial<Record<IntakeIssue['code'], string | number>> = {
  rowTooLong: sizeInWords(LIMITS.rowBytes),
  cellTooLong: sizeInWords(LIMITS.cellBytes),
  tooManyColumns: LIMITS.columns,
  nameTooLong: LIMITS.nameCharacters,
  tooMuchText: sizeInWords(LIMITS.dictionaryBytes),
  workbookTooLarge: sizeInWords(LIMITS.unpackedBytes),
};
