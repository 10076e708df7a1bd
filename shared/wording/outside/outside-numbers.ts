import type { AddressFacet, ValueAddress } from '#shared/analysis';
import { DIFFERENCE_SCALES, formatNumber, formatPValue } from '#shared/format';
import type { EstimateText, NumberText, PValueText, SignDisplay } from '#shared/format';
import type { HouseStyle } from '#shared/house-style';
import { readOutsideNumbers, readPrintedPValue } from '#shared/outside-estimates';
import type { OutsideEstimate, PrintedNumber } from '#shared/outside-estimates';

/**
 * An estimate from elsewhere with its limits under a house style: its own digits, as they were
 * entered, with the style's marks and its unit of differences. Null where they can't be read.
 */
export function outsideText(estimate: OutsideEstimate, style: HouseStyle): EstimateText | null {
  const numbers = readOutsideNumbers(estimate);
  if (numbers === null) {
    return null;
  }
  const print = PRINTERS[estimate.measure === 'riskDifference' ? 'difference' : 'ratio'];
  return {
    value: print(numbers.value, style, 'plusAndMinus'),
    lower: print(numbers.lower, style, 'minus'),
    upper: print(numbers.upper, style, 'minus'),
  };
}

/**
 * The p-value of an estimate from elsewhere, as the house style prints p-values; a bound that was
 * entered ("<0.001") stays that bound. Null where none was entered.
 */
export function outsidePValue(
  { pValue, level }: OutsideEstimate,
  style: HouseStyle,
): PValueText | null {
  const printed = pValue === null ? null : readPrintedPValue(pValue);
  if (printed === null || pValue === null) {
    return null;
  }
  const relation = pValue.includes('<') ? '<' : pValue.includes('>') ? '>' : '=';
  if (relation === '=') {
    return formatPValue(Number(pValue.replace(/[^\d.]/g, '')), level, style);
  }
  const bound = relation === '<' ? printed.highest : printed.lowest;
  const { figure } = formatPValue(bound, level, style);
  return { relation, figure, text: relation + figure, number: null };
}

/** The place of a number of an estimate from elsewhere. */
export function outsideAddress(estimate: OutsideEstimate, facet: AddressFacet): ValueAddress {
  const { analysisId, levelId, id: estimateId } = estimate;
  const scope = { kind: 'crude' } as const;
  return { analysisId, quantity: 'outsideEstimate', levelId, scope, facet, estimateId };
}

type Printer = (number: PrintedNumber, style: HouseStyle, sign: SignDisplay) => NumberText;

const PRINTERS: Readonly<Record<'difference' | 'ratio', Printer>> = {
  difference: ({ value, decimals }, style, sign) => {
    const { scale, fewerDecimals } = DIFFERENCE_SCALES[style.difference.unit];
    const form = { scale, decimals: Math.max(0, decimals - fewerDecimals), sign };
    return formatNumber({ kind: 'real', value: value / PERCENT }, form, style);
  },
  ratio: ({ value, decimals }, style) =>
    formatNumber({ kind: 'real', value }, { scale: 1, decimals, sign: 'minus' }, style),
};

/** Differences are entered in percentage points. */
const PERCENT = 100;
