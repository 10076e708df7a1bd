/** The finest unit that scores may be multiples of. */
const FINEST = 1e6;

/**
 * Scores moved and scaled to the smallest whole numbers from 0 up, which leaves a trend as it is;
 * null where they are no multiples of a millionth, or too far apart to be exact.
 */
export function wholeScores(scores: readonly number[]): readonly number[] | null {
  const least = Math.min(...scores);
  for (let unit = 1; unit <= FINEST; unit *= 10) {
    const whole = scores.map((score) => (score - least) * unit);
    const rounded = whole.map((score) => Math.round(score));
    const isWhole = whole.every(
      (score, at) => Math.abs(score - (rounded[at] ?? 0)) <= 1e-9 * Math.max(1, score),
    );
    if (isWhole && rounded.every((score) => Number.isSafeInteger(score))) {
      const divisor = rounded.reduce(greatestCommonDivisor, 0);
      return rounded.map((score) => score / divisor);
    }
  }
  return null;
}

function greatestCommonDivisor(one: number, other: number): number {
  return other === 0 ? one : greatestCommonDivisor(other, one % other);
}
