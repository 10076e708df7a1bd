/** Remembers what was found for an object, for as long as the object lives. */
export function remembered<Key extends object, Value>(
  find: (key: Key) => Value,
): (key: Key) => Value {
  const known = new WeakMap<Key, Value>();
  return (key) => {
    const value = known.get(key) ?? find(key);
    known.set(key, value);
    return value;
  };
}
