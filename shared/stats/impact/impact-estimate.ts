import type { Estimate } from '../estimate';

/**
 * A fraction of cases that an exposure accounts for (`attributable`), or of would-be cases that a
 * protective exposure spared (`prevented`); a share of 1, below 0 where a limit lies on the other
 * side. It means something only where the exposure is taken to cause the difference: words that
 * show it must say so.
 */
export interface ImpactEstimate extends Estimate {
  readonly kind: 'attributable' | 'prevented';
  readonly needsCausalReading: true;
}

/** 1 - 1/ratio where the ratio is above 1, 1 - ratio below, with limits from those of the ratio. */
export function fractionOfRatio({ value, interval }: Estimate, method: string): ImpactEstimate {
  const kind = value < 1 ? 'prevented' : 'attributable';
  const [first, last] =
    kind === 'prevented' ? [interval.upper, interval.lower] : [interval.lower, interval.upper];
  const fraction = FRACTIONS[kind];
  const limits = { lower: fraction(first), upper: fraction(last), level: interval.level, method };
  return { kind, value: fraction(value), interval: limits, needsCausalReading: true };
}

const FRACTIONS: Readonly<Record<ImpactEstimate['kind'], (ratio: number) => number>> = {
  attributable: (ratio) => 1 - 1 / ratio,
  prevented: (ratio) => 1 - ratio,
};
