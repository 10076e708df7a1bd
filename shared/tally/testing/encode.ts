import type { Codes, EncodedColumn, EncodedCut } from '../encoded-cut';

/** A cut encoded from its cells, column by column, for tests; codes as wide as they need be. */
export function encodeCut(columns: Readonly<Record<string, readonly string[]>>): EncodedCut {
  return {
    rows: Math.max(0, ...Object.values(columns).map((cells) => cells.length)),
    decimalMark: '.',
    columns: new Map(Object.entries(columns).map(([id, cells]) => [id, encodeColumn(cells)])),
  };
}

/** A column encoded in order of first appearance. */
export function encodeColumn(cells: readonly string[]): EncodedColumn {
  const codeOf = new Map<string, number>();
  const codes = cells.map((cell) => {
    const code = codeOf.get(cell) ?? codeOf.size;
    codeOf.set(cell, code);
    return code;
  });
  return { dictionary: [...codeOf.keys()], codes: narrowest(codeOf.size).from(codes) };
}

function narrowest(values: number): { readonly from: (codes: readonly number[]) => Codes } {
  if (values <= 256) return Uint8Array;
  return values <= 65_536 ? Uint16Array : Uint32Array;
}
