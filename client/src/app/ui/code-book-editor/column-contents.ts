import {
  type CodeBookColumn,
  type DecimalMark,
  FACTOR_SOURCE,
  type ProfiledColumn,
  parseNumber,
} from '#shared/code-book';

/** How often each code, level and band occurs; null where the file's profile does not say. */
export interface LevelCounts {
  readonly ofLevel: ReadonlyMap<string, number | null>;
  readonly ofMissingCode: ReadonlyMap<string, number | null>;
  readonly counted: number | null;
  readonly largest: number;
}

/** A value of the file that is neither a level nor a missing code. */
export interface UnknownCode {
  readonly code: string;
  readonly count: number;
}

/** Counts the rows of each level or band and missing code of a column. */
export function levelCounts(
  column: CodeBookColumn,
  contents: ProfiledColumn | null,
  decimalMark: DecimalMark,
): LevelCounts {
  const rows = new Map(contents?.values.map(({ value, count }) => [value, count]));
  const countOf = (code: string): number | null =>
    rows.get(code) ?? (contents === null || contents.truncated ? null : 0);
  const ofLevel =
    FACTOR_SOURCE[column.kind] === 'bands'
      ? bandCounts(column, contents, decimalMark)
      : new Map(column.levels.map(({ id, codes }) => [id, sum(codes.map(countOf))]));
  const ofMissingCode = new Map(column.missingCodes.map(({ code }) => [code, countOf(code)]));
  return {
    ofLevel,
    ofMissingCode,
    counted: sum([...ofLevel.values()]),
    largest: Math.max(1, ...[...ofLevel.values()].map((count) => count ?? 0)),
  };
}

/** Values of the file that the column has no meaning for. */
export function unknownCodes(
  column: CodeBookColumn,
  contents: ProfiledColumn | null,
): readonly UnknownCode[] {
  if (contents === null || FACTOR_SOURCE[column.kind] !== 'levels') return [];
  const known = new Set([
    ...column.levels.flatMap(({ codes }) => codes),
    ...column.missingCodes.map(({ code }) => code),
  ]);
  return contents.values
    .filter(({ value }) => !known.has(value))
    .map(({ value, count }) => ({ code: value, count }));
}

/** Rows that a column leaves out: those with a missing code. */
export function missingRows(counts: LevelCounts): number | null {
  return sum([...counts.ofMissingCode.values()]);
}

/** Only a profile that lists every value can tell how many numbers lie in a band. */
function bandCounts(
  { bands, missingCodes }: CodeBookColumn,
  contents: ProfiledColumn | null,
  decimalMark: DecimalMark,
): ReadonlyMap<string, number | null> {
  if (contents === null || contents.truncated) return new Map(bands.map(({ id }) => [id, null]));
  const missing = new Set(missingCodes.map(({ code }) => code));
  const numbers = contents.values
    .filter(({ value }) => !missing.has(value))
    .map(({ value, count }) => ({ number: parseNumber(value, decimalMark), count }));
  return new Map(
    bands.map(({ id, lower, upper }) => [
      id,
      numbers
        .filter(({ number }) => isWithin(number, lower ?? -Infinity, upper ?? Infinity))
        .reduce((total, { count }) => total + count, 0),
    ]),
  );
}

function isWithin(number: number | null, lower: number, upper: number): boolean {
  return number !== null && number >= lower && number < upper;
}

function sum(counts: readonly (number | null)[]): number | null {
  return counts.reduce<number | null>(
    (total, count) => (total === null || count === null ? null : total + count),
    0,
  );
}
