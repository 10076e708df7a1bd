import type { CodeBookEditIssue } from './edit-levels';

/** Says in plain words why an edit of the code book can't be made. */
export function codeBookEditMessage(issue: CodeBookEditIssue): string {
  return MESSAGES[issue.code];
}

const MESSAGES: Readonly<Record<CodeBookEditIssue['code'], string>> = {
  unknownLevel: 'That level is not in this column any more.',
  unknownCode: 'That code is not among the missing codes of this column.',
  unknownReference: 'The reference has to be one of the levels of this column.',
  tooFewLevelsToMerge: 'Pick at least two levels to merge.',
  levelIsNotMerged: 'This level stands for one code only, so there is nothing to take apart.',
  cutPointsNeeded: 'Give at least one cut point.',
  cutPointsNotAscending: 'Give the cut points as numbers, each larger than the one before it.',
  reasonNeeded: 'Say why the code counts as missing, as in "Not answered".',
};
