import { failure, success, type Result } from '#shared/core';
import {
  COUNTED_OUTCOME_COLUMN_ID,
  factorLevels,
  type CodeBook,
  type CodeBookColumn,
} from '#shared/code-book';
import { classifyCodes } from './classify-codes';
import type { Codes, EncodedCut } from './encoded-cut';
import { outcomeLevelPlace } from './row-weights';
import type { Restriction, TallyRequest } from './tally';
import type { TallyIssue } from './tally-issue';

/**
 * One axis to count along. `codes` is null for the outcome that two count columns stand for; then
 * `placeOf` gives the axis place of an outcome level. Classes are as `classifyCodes` gives them.
 */
export interface PlannedAxis {
  readonly columnId: string;
  readonly levelIds: readonly string[];
  readonly reasons: readonly string[];
  readonly codes: Codes | null;
  readonly classOf: Uint32Array;
}

/** A restriction: `passes[code]` is 1 where the record stays. `codes` as in an axis. */
export interface PlannedRestriction {
  readonly codes: Codes | null;
  readonly passes: Uint8Array;
}

/** What to count, resolved against a code book and a cut. */
export interface TallyPlan {
  readonly axes: readonly PlannedAxis[];
  readonly restrictions: readonly PlannedRestriction[];
}

/** Resolves a request; tells what it names that is not there. */
export function planTally(
  cut: EncodedCut,
  codeBook: CodeBook,
  request: TallyRequest,
): Result<TallyPlan, TallyIssue> {
  const twice = request.columnIds.find((id, at) => request.columnIds.indexOf(id) !== at);
  if (twice !== undefined) return failure(issueAbout('columnTwice', codeBook, twice));
  const axes = all(request.columnIds.map((id) => planAxis(cut, codeBook, id)));
  if (!axes.ok) return axes;
  const restrictions = all(request.restrictions.map((one) => planRestriction(cut, codeBook, one)));
  return restrictions.ok
    ? success({ axes: axes.value, restrictions: restrictions.value })
    : restrictions;
}

function all<Value>(
  results: readonly Result<Value, TallyIssue>[],
): Result<readonly Value[], TallyIssue> {
  const values: Value[] = [];
  for (const result of results) {
    if (!result.ok) return result;
    values.push(result.value);
  }
  return success(values);
}

function planAxis(
  cut: EncodedCut,
  codeBook: CodeBook,
  columnId: string,
): Result<PlannedAxis, TallyIssue> {
  const column = codeBook.columns.find(({ id }) => id === columnId);
  if (column === undefined) return failure(issueAbout('unknownColumn', codeBook, columnId));
  if (factorLevels(column).length === 0) {
    return failure(issueAbout('columnIsNoFactor', codeBook, columnId));
  }
  if (columnId === COUNTED_OUTCOME_COLUMN_ID) return success(outcomeAxis(column));
  const encoded = cut.columns.get(columnId);
  if (encoded === undefined) return failure(issueAbout('columnNotInData', codeBook, columnId));
  const classes = classifyCodes(column, encoded.dictionary, cut.decimalMark);
  return success({ columnId, codes: encoded.codes, ...classes });
}

/** The "codes" of the counted outcome are the outcome levels of the row weights. */
function outcomeAxis(column: CodeBookColumn): PlannedAxis {
  const levelIds = column.levels.map(({ id }) => id);
  const classOf = new Uint32Array(levelIds.length);
  levelIds.forEach((id, place) => {
    classOf[outcomeLevelPlace(id)] = place;
  });
  return { columnId: column.id, levelIds, reasons: [], codes: null, classOf };
}

function planRestriction(
  cut: EncodedCut,
  codeBook: CodeBook,
  { columnId, levelIds }: Restriction,
): Result<PlannedRestriction, TallyIssue> {
  const axis = planAxis(cut, codeBook, columnId);
  if (!axis.ok) return axis;
  const unknown = levelIds.find((id) => !axis.value.levelIds.includes(id));
  if (unknown !== undefined) {
    return failure(issueAbout('unknownLevel', codeBook, columnId, { level: unknown }));
  }
  const kept = new Set(levelIds.map((id) => axis.value.levelIds.indexOf(id)));
  const passes = Uint8Array.from(axis.value.classOf, (one) => (kept.has(one) ? 1 : 0));
  return success({ codes: axis.value.codes, passes });
}

function issueAbout(
  code: TallyIssue['code'],
  codeBook: CodeBook,
  columnId: string,
  facts: TallyIssue['facts'] = {},
): TallyIssue {
  const column = codeBook.columns.find(({ id }) => id === columnId);
  return { code, facts: { column: column?.label ?? columnId, ...facts } };
}
