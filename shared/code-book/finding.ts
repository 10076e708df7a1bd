/** Whether a code book can't be used so (`refusal`), or a person should look (`caution`). */
export type FindingSeverity = 'refusal' | 'caution';

/** Everything that `validateCodeBook` finds. */
export type CodeBookFindingCode =
  | 'columnIdTwice'
  | 'columnNameTwice'
  | 'outcomeColumnMissing'
  | 'outcomeColumnUncalledFor'
  | 'outcomeLevelsChanged'
  | 'layoutColumnUnknown'
  | 'layoutColumnTwice'
  | 'layoutColumnNotCount'
  | 'levelIdTwice'
  | 'levelWithoutCodes'
  | 'labelTwice'
  | 'codeInTwoLevels'
  | 'codeBothLevelAndMissing'
  | 'missingCodeTwice'
  | 'bandEmpty'
  | 'bandsOverlap'
  | 'bandsLeaveGap'
  | 'referenceUnknown'
  | 'noLevels'
  | 'columnNotInData'
  | 'levelNotInData'
  | 'referenceNotInData'
  | 'valuesNotInCodeBook'
  | 'valuesNotNumbers'
  | 'countBlank'
  | 'countNotNumber'
  | 'countNotWhole'
  | 'countNegative'
  | 'eventsExceedTotal';

/**
 * One thing wrong or odd in a code book, in plain words. `path` leads to the place in the code
 * book ("columns.2.levels.0"); `value` is the value of the file that is at fault, where one is.
 */
export interface CodeBookFinding {
  readonly code: CodeBookFindingCode;
  readonly severity: FindingSeverity;
  readonly columnId: string | null;
  readonly levelId: string | null;
  readonly path: string;
  readonly message: string;
  readonly value: string | null;
}

/** What a finding is about; what is left out is null. */
export interface FindingPlace {
  readonly path: string;
  readonly columnId?: string;
  readonly levelId?: string;
  readonly value?: string;
}

/** A finding that keeps a code book from being used. */
export function refusal(
  code: CodeBookFindingCode,
  message: string,
  place: FindingPlace,
): CodeBookFinding {
  return finding('refusal', code, message, place);
}

/** A finding that a person should look at. */
export function caution(
  code: CodeBookFindingCode,
  message: string,
  place: FindingPlace,
): CodeBookFinding {
  return finding('caution', code, message, place);
}

function finding(
  severity: FindingSeverity,
  code: CodeBookFindingCode,
  message: string,
  place: FindingPlace,
): CodeBookFinding {
  return {
    code,
    severity,
    columnId: place.columnId ?? null,
    levelId: place.levelId ?? null,
    path: place.path,
    message,
    value: place.value ?? null,
  };
}

/** The members of a list that repeat an earlier one, each with its place in the list. */
export function repeated<Member>(
  members: readonly Member[],
  keyOf: (member: Member) => string,
): readonly { readonly member: Member; readonly index: number }[] {
  const seen = new Set<string>();
  return members.flatMap((member, index) => {
    const key = keyOf(member);
    if (seen.has(key)) return [{ member, index }];
    seen.add(key);
    return [];
  });
}
