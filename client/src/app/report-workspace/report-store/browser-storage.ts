/** What this browser keeps under a key; null when nothing readable is there. */
export function readKept(key: string): unknown {
  try {
    return JSON.parse(localStorage.getItem(key) ?? 'null') as unknown;
  } catch {
    return null;
  }
}

/** Keeps a value. Storage may be full or forbidden; the value then lives as long as the page. */
export function keep(key: string, value: unknown): void {
  try {
    localStorage.setItem(key, JSON.stringify(value));
  } catch {
    // Nothing else can be done here, and the page still holds the value.
  }
}

/** Forgets a value. */
export function forget(key: string): void {
  try {
    localStorage.removeItem(key);
  } catch {
    // What cannot be removed could not be kept either.
  }
}

/** The keys that begin so, in order. */
export function keptKeys(prefix: string): readonly string[] {
  try {
    return Object.keys(localStorage)
      .filter((key) => key.startsWith(prefix))
      .toSorted();
  } catch {
    return [];
  }
}
