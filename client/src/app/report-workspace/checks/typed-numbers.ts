import { addressKey, type ValueAddress } from '#shared/analysis';

/** A value of a pinned analysis as it prints by itself. */
export interface PrintedValue {
  readonly key: string;
  readonly analysisId: string;
  readonly text: string;
  /** What the text says as a number; null when it is no plain figure. */
  readonly figure: Figure | null;
}

/** A figure as it was written. */
export interface Figure {
  readonly value: number;
  readonly decimals: number;
  readonly percent: boolean;
}

/** A value that a typed number seems to repeat. */
export interface Likeness {
  readonly value: PrintedValue;
  /** The table or figure that prints the value too, as in "Table 2". */
  readonly printedIn: string | null;
  /** Whether it says the same, or only the same after rounding. */
  readonly exact: boolean;
}

/** A value with what its text says. */
export function printedValue(address: ValueAddress, text: string): PrintedValue {
  const { analysisId } = address;
  return { key: addressKey(address), analysisId, text, figure: readFigure(text) };
}

/** Whole numbers below this are too common (hours, months, grades) to be taken for results. */
const LEAST_TELLING_COUNT = 30;

/**
 * The value that a typed number most likely repeats; null when none comes near. Percentages and
 * decimals are compared after rounding to the typed digits, whole numbers only as they are.
 */
export function likeness(
  typed: string,
  values: readonly PrintedValue[],
  placeOf: (key: string) => string | null,
): Likeness | null {
  const number = readFigure(typed);
  if (number === null || !isTelling(number)) return null;
  const alike = values.flatMap((value) => {
    if (value.figure === null || !isAlike(number, value.figure)) return [];
    const exact = value.figure.value === number.value;
    return [{ value, exact, printedIn: placeOf(value.key) }];
  });
  const [best] = alike.toSorted((one, other) => rank(other, number) - rank(one, number));
  return best ?? null;
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
function rank({ value, exact, printedIn }: Likeness, typed: Figure): number {
  const away = Math.abs((value.figure?.value ?? 0) - typed.value);
  return (printedIn === null ? 0 : 4) + (exact ? 2 : 0) - away;
}
