import { addressKey, type ValueAddress } from '#shared/analysis';

/** A value of a pinned analysis as it prints by itself. */
export interface PrintedValue {
  readonly address: ValueAddress;
  readonly text: string;
  /** The table or figure that prints it too, as in "Table 2"; null when none does. */
  readonly printedIn: string | null;
}

/** A value that a typed number seems to repeat. */
export interface Likeness {
  readonly value: PrintedValue;
  /** Whether it says the same, or only the same after rounding. */
  readonly exact: boolean;
}

/** Whole numbers below this are too common (hours, months, grades) to be taken for results. */
const LEAST_TELLING_COUNT = 30;

/**
 * The value that a typed number most likely repeats; null when none comes near. Percentages and
 * decimals are compared after rounding to the typed digits, whole numbers only as they are.
 */
export function likeness(typed: string, values: readonly PrintedValue[]): Likeness | null {
  const number = readFigure(typed);
  if (number === null || !isTelling(number)) return null;
  const alike = values.flatMap((value) => {
    const printed = readFigure(value.text);
    return printed !== null && isAlike(number, printed) ? [{ value, printed }] : [];
  });
  const [best] = alike.toSorted((one, other) => rank(other, number) - rank(one, number));
  return best === undefined
    ? null
    : { value: best.value, exact: best.printed.value === number.value };
}

interface Figure {
  readonly value: number;
  readonly decimals: number;
  readonly percent: boolean;
}

/** Reads a figure with the decimal marks, thousands and signs that house styles print. */
function readFigure(text: string): Figure | null {
  const match = /^([+\u2212-]?)([\d\u2009\u202f,.\u00b7]+)[\u00a0\u202f]?(%?)$/u.exec(text.trim());
  if (match === null) return null;
  const [, sign = '', digits = '', percent] = match;
  const plain = digits.replace(/[\u2009\u202f]|,(?=\d{3}(?!\d))/gu, '').replace(/[,\u00b7]/u, '.');
  const value = Number(plain);
  if (!Number.isFinite(value)) return null;
  const decimals = plain.split('.')[1]?.length ?? 0;
  return {
    value: sign === '' || sign === '+' ? value : -value,
    decimals,
    percent: percent === '%',
  };
}

function isTelling({ value, decimals, percent }: Figure): boolean {
  return percent || decimals > 0 || Math.abs(value) >= LEAST_TELLING_COUNT;
}

function isAlike(typed: Figure, printed: Figure): boolean {
  if (typed.percent !== printed.percent) return false;
  if (typed.decimals === 0 && !typed.percent) {
    return printed.decimals === 0 && printed.value === typed.value;
  }
  const finer = printed.decimals - typed.decimals;
  return finer >= 0 && Math.abs(printed.value - typed.value) <= 0.5 * 10 ** -typed.decimals + 1e-9;
}

/** What the report prints already comes first, then what says the very same, then what is near. */
function rank(
  { value, printed }: { readonly value: PrintedValue; readonly printed: Figure },
  typed: Figure,
): number {
  const shown = value.printedIn === null ? 0 : 4;
  const same = printed.value === typed.value ? 2 : 0;
  return shown + same - Math.abs(printed.value - typed.value);
}

/** The key that binds a value. */
export function keyOf(likeness: Likeness): string {
  return addressKey(likeness.value.address);
}
