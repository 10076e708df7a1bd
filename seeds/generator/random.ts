/** A small repeatable random source (mulberry32): the same seed gives the same data everywhere. */
export function randomSource(seed: number): () => number {
  let state = seed >>> 0;
  return () => {
    state = (state + 0x6d2b79f5) >>> 0;
    let mixed = Math.imul(state ^ (state >>> 15), state | 1);
    mixed ^= mixed + Math.imul(mixed ^ (mixed >>> 7), mixed | 61);
    return ((mixed ^ (mixed >>> 14)) >>> 0) / 4294967296;
  };
}

/** A shuffled copy (Fisher–Yates), so that the records of a demonstration file are in no order. */
export function shuffled<Item>(items: readonly Item[], random: () => number): readonly Item[] {
  const copy = [...items];
  for (let last = copy.length - 1; last > 0; last -= 1) {
    const other = Math.floor(random() * (last + 1));
    [copy[last], copy[other]] = [copy[other] as Item, copy[last] as Item];
  }
  return copy;
}
