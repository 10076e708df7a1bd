import openData from '../reference-values/open-data.json' with { type: 'json' };

/**
 * The values of a quantity of the open data on which general-purpose statistics libraries agree,
 * at full precision. Source: ../reference-values/open-data.json, with the versions of each.
 */
export function referenceOf(query: string, quantity: string, place = 0): readonly number[] {
  const found = openData.cases.filter((one) => one.query === query && one.quantity === quantity);
  const expected = found[place]?.expected;
  if (expected === undefined) throw new Error(`No reference value: ${query}, ${quantity}`);
  return expected;
}

/** The file of an open data set. Source: ../data/README.md. */
export function dataFile(name: string): string {
  return new URL(`../data/${name}`, import.meta.url).pathname;
}

/** Shares as they print in percent or percentage points: scaled by 100, without their signs. */
export function inPoints(shares: readonly number[], decimals = 1): readonly string[] {
  return shares.map((share) => Math.abs(100 * share).toFixed(decimals));
}

/** Ratios as they print: two decimals. */
export function asRatios(...ratios: readonly number[]): readonly string[] {
  return ratios.map((ratio) => ratio.toFixed(2));
}
