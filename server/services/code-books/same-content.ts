import type { CodeBook } from '#shared/code-book';

/** Whether two code books say the same, whatever the order in which their fields were written. */
export function isSameContent(one: CodeBook, other: CodeBook): boolean {
  return JSON.stringify(one, inFixedOrder) === JSON.stringify(other, inFixedOrder);
}

function inFixedOrder(_key: string, value: unknown): unknown {
  if (typeof value !== 'object' || value === null || Array.isArray(value)) return value;
  const entries = Object.entries(value).filter(([, member]) => member !== undefined);
  return Object.fromEntries(entries.sort(([one], [other]) => (one < other ? -1 : 1)));
}
