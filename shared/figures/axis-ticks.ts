/** Ticks of an axis that begins at zero; the last one is its end. */
export interface AxisTicks {
  readonly values: readonly number[];
  readonly decimals: number;
}

const MOST_INTERVALS = 5;
const MANTISSAS = [1, 2, 2.5, 5, 10] as const;

/**
 * Ticks from zero to cover `highest`, in steps of 1, 2, 2.5 or 5 times a power of ten, at most
 * five intervals. A share's axis ends at `most` (its 100) whatever has to be covered.
 */
export function axisTicks(highest: number, most: number): AxisTicks {
  const covered = highest > 0 ? Math.min(highest, most) : Math.min(1, most);
  const power = Math.floor(Math.log10(covered / MOST_INTERVALS));
  const step = MANTISSAS.map((mantissa) => Number(`${String(mantissa)}e${String(power)}`)).find(
    (candidate) => intervalsOf(covered, candidate) <= MOST_INTERVALS,
  );
  const size = step ?? covered;
  const decimals = decimalsOf(size);
  const count = Math.min(intervalsOf(covered, size), Math.floor(most / size + 1e-9));
  const values = Array.from({ length: count + 1 }, (_, index) =>
    Number((index * size).toFixed(decimals)),
  );
  return { values, decimals };
}

function intervalsOf(covered: number, step: number): number {
  return Math.max(1, Math.ceil(covered / step - 1e-9));
}

function decimalsOf(step: number): number {
  const [mantissa = '', exponent = '0'] = step.toExponential().split('e');
  return Math.max(0, mantissa.replace(/^\d\.?/u, '').length - Number(exponent));
}
