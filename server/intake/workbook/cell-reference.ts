/** The column of a cell reference such as "BC12", counted from 0; −1 when there is none. */
export function columnOfReference(reference: string): number {
  let column = 0;
  for (let at = 0; at < reference.length; at += 1) {
    const letter = reference.charCodeAt(at) & ~0x20;
    if (letter < 0x41 || letter > 0x5a) break;
    column = column * 26 + (letter - 0x40);
  }
  return column - 1;
}

/** The letters of a column counted from 0: 0 is "A", 27 "AB". */
export function lettersOfColumn(column: number): string {
  const last = String.fromCharCode(0x41 + (column % 26));
  return column < 26 ? last : lettersOfColumn(Math.floor(column / 26) - 1) + last;
}

/** The row of a cell reference, counted from 1; NaN when there is none. */
export function rowOfReference(reference: string): number {
  return Number(/\d+$/.exec(reference)?.[0] ?? NaN);
}
