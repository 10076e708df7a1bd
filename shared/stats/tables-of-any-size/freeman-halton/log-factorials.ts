/** Logarithms of factorials: as whole multiples of a small unit, and as plain doubles. */
export interface LogFactorials {
  /** log(k!) in units of 2^-scale, made of rounded logarithms of primes. */
  readonly units: Float64Array;
  readonly logs: Float64Array;
  readonly scale: number;
  /** What the rounding can move a sum over a table's cells by, in units. */
  readonly rounding: number;
}

/**
 * Tables of log factorials for counts up to a total.
 *
 * Every prime has one whole number of units, so that products of factorials which are equal have
 * equal sums, however they are made up: ties need no tolerance. Sums stay below 2^53.
 */
export function logFactorials(total: number): LogFactorials {
  const logs = cumulated(total, Math.log);
  const largest = Math.max(1, logs[total] ?? 1);
  const scale = Math.floor(Math.log2(2 ** 51 / largest));
  const factors = smallestFactors(total);
  const primeUnits = (prime: number): number => Math.round(Math.log(prime) * 2 ** scale);
  const unitsOfNumbers = new Float64Array(total + 1);
  for (let number = 2; number <= total; number += 1) {
    const factor = factors[number] ?? number;
    unitsOfNumbers[number] = (unitsOfNumbers[number / factor] ?? 0) + primeUnits(factor);
  }
  const units = cumulated(total, (number) => unitsOfNumbers[number] ?? 0);
  return { units, logs, scale, rounding: Math.ceil(largest / Math.LN2) };
}

/** Sums of the parts up to each number, with what rounding drops carried along. */
function cumulated(total: number, partOf: (number: number) => number): Float64Array {
  const sums = new Float64Array(total + 1);
  let sum = 0;
  let dropped = 0;
  for (let number = 2; number <= total; number += 1) {
    const part = partOf(number) + dropped;
    const next = sum + part;
    dropped = part - (next - sum);
    sum = next;
    sums[number] = sum;
  }
  return sums;
}

function smallestFactors(total: number): Uint32Array {
  const factors = Uint32Array.from({ length: total + 1 }, (_, number) => number);
  for (let factor = 2; factor * factor <= total; factor += 1) {
    for (let multiple = factor * factor; multiple <= total; multiple += factor) {
      factors[multiple] = Math.min(factors[multiple] ?? multiple, factor);
    }
  }
  return factors;
}
