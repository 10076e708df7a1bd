import {
  BLANK_REASON,
  FACTOR_SOURCE,
  factorLevels,
  NOT_A_NUMBER,
  parseNumber,
  type CodeBookColumn,
  type DecimalMark,
} from '#shared/code-book';

/** Reason of a value that the code book does not know. */
export const NOT_IN_CODE_BOOK = 'Value not in the code book';

/** Reason of a number that lies in no band. */
export const OUTSIDE_BANDS = 'Outside the bands';

/**
 * What each code of a column means: `classOf[code]` below `levelIds.length` is the place of a
 * level in print order, from there on the place of a reason to leave the record out.
 */
export interface CodeClasses {
  readonly levelIds: readonly string[];
  readonly reasons: readonly string[];
  readonly classOf: Uint32Array;
}

/** Sorts the dictionary of a column into its levels and the reasons to leave records out. */
export function classifyCodes(
  column: CodeBookColumn,
  dictionary: readonly string[],
  decimalMark: DecimalMark,
): CodeClasses {
  const levelIds = factorLevels(column).map(({ id }) => id);
  const placeOf = placeFinder(column, levelIds, decimalMark);
  const reasons: string[] = [];
  const classOf = Uint32Array.from(dictionary, (value) => {
    const place = placeOf(value);
    return typeof place === 'number' ? place : levelIds.length + placeIn(reasons, place);
  });
  return { levelIds, reasons, classOf };
}

/** Gives the place of a value's level, or the reason why it has none. */
type PlaceFinder = (value: string) => number | string;

function placeFinder(
  column: CodeBookColumn,
  levelIds: readonly string[],
  decimalMark: DecimalMark,
): PlaceFinder {
  const missing = new Map(column.missingCodes.map(({ code, reason }) => [code, reason]));
  const find =
    FACTOR_SOURCE[column.kind] === 'bands'
      ? bandFinder(column, decimalMark)
      : levelFinder(column, levelIds);
  return (value) => missing.get(value) ?? (value.trim() === '' ? BLANK_REASON : find(value));
}

function levelFinder(column: CodeBookColumn, levelIds: readonly string[]): PlaceFinder {
  const places = new Map(
    column.levels.flatMap(({ id, codes }) => codes.map((code) => [code, levelIds.indexOf(id)])),
  );
  return (value) => places.get(value) ?? NOT_IN_CODE_BOOK;
}

function bandFinder({ bands }: CodeBookColumn, decimalMark: DecimalMark): PlaceFinder {
  return (value) => {
    const number = parseNumber(value, decimalMark);
    if (number === null) return NOT_A_NUMBER;
    const place = bands.findIndex(
      ({ lower, upper }) => number >= (lower ?? -Infinity) && number < (upper ?? Infinity),
    );
    return place < 0 ? OUTSIDE_BANDS : place;
  };
}

function placeIn(reasons: string[], reason: string): number {
  const known = reasons.indexOf(reason);
  return known < 0 ? reasons.push(reason) - 1 : known;
}
