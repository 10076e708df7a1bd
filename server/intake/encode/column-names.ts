/** Names for the columns of a file, with what was odd about those in its first row. */
export interface ColumnNames {
  readonly names: readonly string[];
  /** Names that the file has more than once. */
  readonly repeated: readonly string[];
  /** Places, counted from 1, of columns that have no name in the file. */
  readonly unnamed: readonly number[];
}

/** Names columns: a blank name becomes "Column 3", and one used before gets a number. */
export function nameColumns(given: readonly string[]): ColumnNames {
  const wanted = given.map((name, index) => name.trim() || `Column ${String(index + 1)}`);
  const taken = new Set<string>();
  const names = wanted.map((name) => {
    const free = freeName(name, taken, wanted);
    taken.add(free);
    return free;
  });
  const repeated = wanted.filter((name, index) => wanted.indexOf(name) < index);
  const unnamed = given.flatMap((name, index) => (name.trim() === '' ? [index + 1] : []));
  return { names, repeated: [...new Set(repeated)], unnamed };
}

function freeName(name: string, taken: ReadonlySet<string>, wanted: readonly string[]): string {
  if (!taken.has(name)) return name;
  let number = 2;
  const numbered = (): string => `${name} (${String(number)})`;
  while (taken.has(numbered()) || wanted.includes(numbered())) number += 1;
  return numbered();
}
