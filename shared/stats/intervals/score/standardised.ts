import type { FourfoldTable } from '../../fourfold-table';

/** A deviation over its standard error; 0 for no deviation, infinite where there is no variance. */
export function standardised(deviation: number, variance: number): number {
  if (deviation === 0) {
    return 0;
  }
  return variance > 0 ? deviation / Math.sqrt(variance) : Math.sign(deviation) * Infinity;
}

/** N / (N - 1), the factor by which Miettinen and Nurminen enlarge the variance. */
export function inflation(table: FourfoldTable): number {
  const total = table.index.total + table.reference.total;
  return total / (total - 1);
}
