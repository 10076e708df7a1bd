import { failure, success, type Issue, type Result } from '#shared/core';

/** Why a house style cannot be used; facts: field, message (one plain sentence). */
export type HouseStyleIssue = Issue<'houseStyleInvalid'>;

/** Reads one field; `field` is its path, as in "percent.sign". */
export type FieldReader<Value> = (value: unknown, field: string) => Result<Value, HouseStyleIssue>;

/** A record with exactly these fields. */
export function recordOf<Fields extends object>(readers: {
  readonly [Name in keyof Fields]: FieldReader<Fields[Name]>;
}): FieldReader<Fields> {
  const names = Object.keys(readers) as (keyof Fields & string)[];
  return (value, field) => {
    if (typeof value !== 'object' || value === null || Array.isArray(value)) {
      return refuse(field, 'must be an object');
    }
    const unknown = Object.keys(value).find(
      (name) => !names.includes(name as keyof Fields & string),
    );
    if (unknown !== undefined) {
      return refuse(pathOf(field, unknown), 'is no setting of a house style');
    }
    return readAll(value as Readonly<Record<string, unknown>>, names, readers, field);
  };
}

function readAll<Fields extends object>(
  value: Readonly<Record<string, unknown>>,
  names: readonly (keyof Fields & string)[],
  readers: { readonly [Name in keyof Fields]: FieldReader<Fields[Name]> },
  field: string,
): Result<Fields, HouseStyleIssue> {
  const read: Partial<Fields> = {};
  for (const name of names) {
    const path = pathOf(field, name);
    if (value[name] === undefined) {
      return refuse(path, 'is missing');
    }
    const result = readers[name](value[name], path);
    if (!result.ok) {
      return result;
    }
    read[name] = result.value;
  }
  return success(read as Fields);
}

/** One of several values. */
export function oneOf<const Values extends readonly (string | number)[]>(
  ...values: Values
): FieldReader<Values[number]> {
  return (value, field) =>
    values.includes(value as Values[number])
      ? success(value as Values[number])
      : refuse(field, `must be one of ${values.map((one) => JSON.stringify(one)).join(', ')}`);
}

/** Words; `mayBeEmpty` lets them be left out. */
export function words(emptiness: 'required' | 'mayBeEmpty' = 'required'): FieldReader<string> {
  return (value, field) =>
    typeof value === 'string' && (emptiness === 'mayBeEmpty' || value.trim() !== '')
      ? success(value)
      : refuse(field, emptiness === 'required' ? 'must hold some text' : 'must be text');
}

/** Yes or no. */
export const yesOrNo: FieldReader<boolean> = (value, field) =>
  typeof value === 'boolean' ? success(value) : refuse(field, 'must be true or false');

/** A number between two bounds, both allowed. */
export function numberBetween(least: number, most: number): FieldReader<number> {
  return (value, field) =>
    typeof value === 'number' && value >= least && value <= most
      ? success(value)
      : refuse(field, `must be a number from ${least} to ${most}`);
}

/** A whole number between two bounds, both allowed. */
export function wholeBetween(least: number, most: number): FieldReader<number> {
  return (value, field) =>
    Number.isInteger(value) && (value as number) >= least && (value as number) <= most
      ? success(value as number)
      : refuse(field, `must be a whole number from ${least} to ${most}`);
}

/** A day such as 2026-01-31. */
export const day: FieldReader<string> = (value, field) =>
  typeof value === 'string' && isDay(value)
    ? success(value)
    : refuse(field, 'must be a day such as 2026-01-31');

/** What a reader accepts, or null. */
export function orNull<Value>(reader: FieldReader<Value>): FieldReader<Value | null> {
  return (value, field) => (value === null ? success(null) : reader(value, field));
}

/** A list of at least one entry; `follows` checks the list as a whole. */
export function listOf<Value>(
  reader: FieldReader<Value>,
  follows: (entries: readonly Value[]) => string | null = () => null,
): FieldReader<readonly Value[]> {
  return (value, field) => {
    if (!Array.isArray(value) || value.length === 0) {
      return refuse(field, 'must be a list with at least one entry');
    }
    const entries: Value[] = [];
    for (const [place, entry] of value.entries()) {
      const result = reader(entry, `${field}[${place}]`);
      if (!result.ok) {
        return result;
      }
      entries.push(result.value);
    }
    const problem = follows(entries);
    return problem === null ? success(entries) : refuse(field, problem);
  };
}

/** An issue that names the field in plain words. */
export function refuse(field: string, problem: string): Result<never, HouseStyleIssue> {
  const name = field === '' ? 'The house style' : field;
  return failure({
    code: 'houseStyleInvalid',
    facts: { field, message: `${name} ${problem}.` },
  });
}

function pathOf(field: string, name: string): string {
  return field === '' ? name : `${field}.${name}`;
}

function isDay(text: string): boolean {
  const [, year, month, date] = /^(\d{4})-(\d{2})-(\d{2})$/.exec(text) ?? [];
  const longest = new Date(Date.UTC(Number(year), Number(month), 0)).getUTCDate();
  return Number(month) >= 1 && Number(month) <= 12 && Number(date) >= 1 && Number(date) <= longest;
}
