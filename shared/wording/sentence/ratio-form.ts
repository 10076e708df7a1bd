import type { Decimal } from '#shared/format';
import type { Direction } from '../phrase';

/** How a printed ratio is said: "49% higher", "4.5 times as high", or by its name at 1. */
export type RatioForm = 'percent' | 'times' | 'named';

/** Below twofold the printed ratio is said in percent, from twofold on in times. */
export function formOf(printed: Decimal): RatioForm {
  const one = oneOf(printed);
  if (printed.units === one) {
    return 'named';
  }
  return printed.units >= 2n * one ? 'times' : 'percent';
}

/** Which way a printed ratio points. */
export function directionOfRatio(printed: Decimal): Direction {
  const one = oneOf(printed);
  if (printed.units === one) {
    return 'same';
  }
  return printed.units > one ? 'higher' : 'lower';
}

/**
 * What a printed ratio says of percent: 1.49 is 49% higher, 0.76 is 24% lower. From the printed
 * digits, so that a reader can reproduce it.
 */
export function percentOfRatio(printed: Decimal): Decimal {
  const { units, decimals } = printed;
  const change = units - oneOf(printed);
  const size = change < 0n ? -change : change;
  return decimals < 2
    ? { units: size * 10n ** BigInt(2 - decimals), decimals: 0 }
    : { units: size, decimals: decimals - 2 };
}

function oneOf({ decimals }: Decimal): bigint {
  return 10n ** BigInt(decimals);
}
