import type { CutProfile } from '#shared/api';
import type { CodeBook, CodeBookFinding, DataValues } from '#shared/code-book';

/** The values of an upload, as far as its profile lists them. */
export function dataValuesOf(profile: CutProfile): DataValues {
  return {
    decimalMark: profile.usedOptions.decimalMark ?? '.',
    valuesOf: new Map(
      profile.columns.map(({ columnId, values }) => [columnId, values.map(({ value }) => value)]),
    ),
  };
}

/** Whether a finding may rest on values that a shortened profile leaves out. */
export function isDoubtful({ code, columnId }: CodeBookFinding, profile: CutProfile): boolean {
  if (code !== 'levelNotInData' && code !== 'referenceNotInData') return false;
  return profile.columns.find((column) => column.columnId === columnId)?.truncated ?? false;
}

/** The profile with the column ids of a code book, found by the columns' names. */
export function profileUnder(profile: CutProfile, codeBook: CodeBook | null): CutProfile {
  const ids = new Map(codeBook?.columns.map(({ id, name }) => [name, id]));
  const columns = profile.columns.map((column) => ({
    ...column,
    columnId: ids.get(column.name) ?? column.columnId,
  }));
  return { ...profile, columns };
}
