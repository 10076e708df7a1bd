import type { HouseStyle, PValueStyle } from '#shared/house-style';
import { NO_BREAK_SPACE, type NumberText } from './number-text';
import { rationalOf, type Rational } from './rational';
import { numberOfDecimal, roundRational } from './round';
import { writeDecimal } from './write-decimal';

/** A printed p-value. `text` is what a column headed "P" prints: ".03", "<.001", ">.99". */
export interface PValueText {
  readonly relation: '=' | '<' | '>';
  readonly figure: string;
  readonly text: string;
  /** Null where a bound is printed in place of the value. */
  readonly number: NumberText | null;
}

/**
 * A p-value under a house style.
 *
 * `level` is the confidence level of the analysis: the printed value lies on the same side of
 * `1 - level` as the true one (.0496 stays .0496). Never 0, never 1, below the floor "<".
 */
export function formatPValue(pValue: number, level: number, style: HouseStyle): PValueText {
  const rules = style.pValue;
  const threshold = Number((1 - level).toPrecision(12));
  const floor = Math.min(rules.floor, threshold);
  if (pValue < floor) {
    return bound('<', floor, style);
  }
  if (pValue > rules.ceiling) {
    return bound('>', rules.ceiling, style);
  }
  const decimals = decimalsOnItsSide(pValue, threshold, rules);
  const text = figureOf(real(pValue), decimals, style);
  const number = { text, value: pValue, scale: 1, decimals, signed: false };
  return { relation: '=', figure: text, text, number };
}

/** The symbol, the relation and the figure of a statement such as "P = .03", in parts. */
export function pValueStatement(
  pValue: PValueText,
  { pValue: rules }: HouseStyle,
): { readonly symbol: string; readonly italic: boolean; readonly relation: string } {
  const space = rules.spacing === 'spaced' ? NO_BREAK_SPACE : '';
  return {
    symbol: rules.symbol,
    italic: rules.italic,
    relation: space + pValue.relation + space,
  };
}

const MOST_DECIMALS = 9;

function bound(relation: '<' | '>', value: number, style: HouseStyle): PValueText {
  const decimals = (String(value).split('.')[1] ?? '').length;
  const figure = figureOf(real(value), decimals, style);
  return { relation, figure, text: relation + figure, number: null };
}

function decimalsOnItsSide(pValue: number, threshold: number, rules: PValueStyle): number {
  const step = rules.decimals.find(({ below }) => pValue < below);
  let decimals = step?.decimals ?? rules.decimals.at(-1)?.decimals ?? 2;
  while (decimals < MOST_DECIMALS && changesSide(pValue, threshold, decimals)) {
    decimals += 1;
  }
  return decimals;
}

function changesSide(pValue: number, threshold: number, decimals: number): boolean {
  const printed = numberOfDecimal(roundRational(real(pValue), 1, decimals, 'halfUp'));
  return printed < threshold !== pValue < threshold || printed === 0;
}

function figureOf(value: Rational, decimals: number, style: HouseStyle): string {
  const decimal = roundRational(value, 1, decimals, style.numbers.rounding);
  const text = writeDecimal(decimal, style.numbers);
  return style.pValue.leadingZero ? text : text.replace(/^0/, '');
}

function real(value: number): Rational {
  return rationalOf({ kind: 'real', value });
}
