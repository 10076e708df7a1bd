/**
 * A lasting id for a level, from its code: the code in small letters and digits, or with a number
 * after it where another level has that id already.
 */
export function levelIdFor(code: string, taken: ReadonlySet<string>): string {
  return freeId(slug(code) || 'level', taken);
}

/**
 * Ids of columns, by name: the id that a name has already in `known`, or one made from the name.
 *
 * Gives one id for each name, in the same order; no two are equal, and none is in `reserved`.
 */
export function columnIdsFor(
  names: readonly string[],
  known: ReadonlyMap<string, string>,
  reserved: readonly string[],
): readonly string[] {
  const taken = new Set([...known.values(), ...reserved]);
  return names.map((name) => {
    const id = known.get(name) ?? freeId(slug(name) || 'column', taken);
    taken.add(id);
    return id;
  });
}

const LONGEST_SLUG = 60;

function slug(text: string): string {
  return text
    .normalize('NFKD')
    .toLowerCase()
    .replace(/[\u0300-\u036f]/g, '')
    .replace(/[^a-z0-9]+/g, '-')
    .slice(0, LONGEST_SLUG)
    .replace(/^-+|-+$/g, '');
}

function freeId(wanted: string, taken: ReadonlySet<string>): string {
  if (!taken.has(wanted)) return wanted;
  let number = 2;
  while (taken.has(`${wanted}-${String(number)}`)) number += 1;
  return `${wanted}-${String(number)}`;
}
