/** A quadratic form in the inverse of a covariance matrix, with the matrix's rank. */
export interface QuadraticForm {
  readonly value: number;
  readonly rank: number;
}

/** Pivots below this share of the largest variance count as none. */
const NOTHING = 1e-10;

/**
 * x' V^- x for a vector of the space that a symmetric positive semidefinite V spans, by elimination
 * with the largest pivot first; dependent coordinates are passed over and lower the rank.
 */
export function quadraticForm(
  vector: readonly number[],
  matrix: readonly (readonly number[])[],
): QuadraticForm {
  const rest = [...vector];
  const left = matrix.map((row) => [...row]);
  const largest = Math.max(0, ...left.map((row, at) => row[at] ?? 0));
  let value = 0;
  let rank = 0;
  for (; rank < rest.length; rank += 1) {
    const pivot = largestDiagonal(left);
    const variance = left[pivot]?.[pivot] ?? 0;
    if (variance <= NOTHING * largest) break;
    value += ((rest[pivot] ?? 0) / variance) * (rest[pivot] ?? 0);
    eliminate(rest, left, pivot);
  }
  return { value, rank };
}

function largestDiagonal(matrix: readonly (readonly number[])[]): number {
  const diagonal = matrix.map((row, at) => row[at] ?? 0);
  return diagonal.indexOf(Math.max(...diagonal));
}

/** Takes one coordinate out of all others; its own row and column become 0. */
function eliminate(vector: number[], matrix: number[][], pivot: number): void {
  const pivotRow = [...(matrix[pivot] ?? [])];
  const variance = pivotRow[pivot] ?? 1;
  const own = vector[pivot] ?? 0;
  matrix.forEach((row, at) => {
    const factor = (pivotRow[at] ?? 0) / variance;
    vector[at] = at === pivot ? 0 : (vector[at] ?? 0) - factor * own;
    row.forEach((entry, column) => {
      const isOut = at === pivot || column === pivot;
      row[column] = isOut ? 0 : entry - factor * (pivotRow[column] ?? 0);
    });
  });
}
