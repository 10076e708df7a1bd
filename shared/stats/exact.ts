/**
 * a * b - c * d of whole numbers, correctly rounded even where the products pass 2^53 (counts of
 * ten million and more, where plain arithmetic would lose the difference).
 */
export function productDifference(a: number, b: number, c: number, d: number): number {
  const left = a * b;
  const right = c * d;
  const exact = Math.max(left, right) <= Number.MAX_SAFE_INTEGER;
  return exact ? left - right : Number(BigInt(a) * BigInt(b) - BigInt(c) * BigInt(d));
}
