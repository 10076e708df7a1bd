/** Remembers what was found for an object, for as long as the object lives. */
export function remembered<Key extends object, Value>(
  find: (key: Key) => Value,
): (key: Key) => Value {
  const known = new WeakMap<Key, Value>();
  return (key) => {
    const before = known.get(key);
    if (before !== undefined) return before;
    const value = find(key);
    known.set(key, value);
    return value;
  };
}
