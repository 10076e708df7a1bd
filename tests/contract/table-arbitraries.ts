import fc from 'fast-check';
import type { Rows } from './enumeration';

/** Tables of two to four rows and columns with small counts, zeros as often as they come. */
export function tables(largest: number, longest = 4): fc.Arbitrary<Rows> {
  const count = fc.integer({ min: 0, max: largest });
  return fc
    .record({
      rows: fc.integer({ min: 2, max: longest }),
      columns: fc.integer({ min: 2, max: longest }),
    })
    .chain(({ rows, columns }) =>
      fc.array(fc.array(count, { minLength: columns, maxLength: columns }), {
        minLength: rows,
        maxLength: rows,
      }),
    );
}
