import { numberOf, readValue } from '#shared/analysis';
import type { AddressFacet, Quantity, ValueAddress } from '#shared/analysis';
import type { EffectMeasureId } from '#shared/effects';
import {
  decimalsOf,
  DIFFERENCE_SCALES,
  formatCount,
  formatEstimate,
  formatNumber,
  formatShare,
  formatShareLimit,
  intervalLabel,
  joinLimits,
  limitBrackets,
  withPercentSign,
} from '#shared/format';
import type { EstimateText, NumberText } from '#shared/format';
import type { DifferenceUnit } from '#shared/house-style';
import { fillWords } from '#shared/wording';
import type { PatternKey } from '#shared/wording';
import type { BoundValueFormat } from '../text/text-document';
import type { PrintedValue, ReadValue } from './print-value';

/** A share of people: "20.9%", "34 of 163", "21 per 100", or with its limits. */
export function printShare(value: ReadValue, format: BoundValueFormat): PrintedValue {
  if (format === 'per100' || format === 'per1000') return printPer(value, format);
  const text = format === 'count' ? countText(value) : (percentText(value) ?? countText(value));
  const limits = format === 'withLimits' ? shareLimits(value) : null;
  return withLimits(text, limits, value);
}

/** A difference with its sign, in the unit of the house style or per 100 or 1,000. */
export function printDifference(value: ReadValue, format: BoundValueFormat): PrintedValue {
  if (format === 'per100' || format === 'per1000') return printPer(value, format);
  const printed = estimateText('riskDifference', value);
  const key = SIZE_PATTERNS[value.houseStyle.difference.unit];
  const text = fillWords(value.phrasebook, key, { size: facetOf(printed, value).text });
  const limits = format === 'withLimits' ? printed : null;
  return withLimits(text, limits, value);
}

/** A ratio as a figure, or with its limits. */
export function printRatio(
  measure: EffectMeasureId,
  value: ReadValue,
  format: BoundValueFormat,
): PrintedValue {
  const printed = estimateText(measure, value);
  const text = facetOf(printed, value).text;
  const limits = format === 'withLimits' ? printed : null;
  return withLimits(text, limits, value);
}

/** A fraction of cases as a percentage, which may lie below 0, or with its limits. */
export function printFraction(value: ReadValue, format: BoundValueFormat): PrintedValue {
  const { houseStyle, result } = value;
  const decimals = decimalsOf(result, houseStyle).percent;
  const print = (quantity: Quantity): NumberText => {
    const figure = formatNumber(quantity, { scale: 100, decimals, sign: 'minus' }, houseStyle);
    return { ...figure, text: withPercentSign(figure.text, houseStyle) };
  };
  const [lower, upper] = [facet(value, 'lower'), facet(value, 'upper')];
  const limits =
    format === 'withLimits' && lower !== null && upper !== null
      ? { lower: print(lower), upper: print(upper) }
      : null;
  return withLimits(print(value.quantity).text, limits, value);
}

type SizeKey = Extract<PatternKey, `size.per${string}`>;

const SIZE_PATTERNS: Readonly<Record<DifferenceUnit, SizeKey>> = {
  percentagePoints: 'size.percentagePoints',
  per100: 'size.per100',
  per1000: 'size.per1000',
  per10000: 'size.per10000',
};

/** Whole numbers only: a share of people with decimals is a percentage. */
function printPer(value: ReadValue, unit: 'per100' | 'per1000'): PrintedValue {
  const { scale } = DIFFERENCE_SCALES[unit];
  const sign = value.address.quantity === 'riskDifference' ? 'plusAndMinus' : 'minus';
  const form = { scale, decimals: 0, sign } as const;
  const size = formatNumber(value.quantity, form, value.houseStyle).text;
  const text = fillWords(value.phrasebook, SIZE_PATTERNS[unit], { size });
  return [{ text, addresses: [value.address] }];
}

function percentText({ result, address, quantity, houseStyle }: ReadValue): string | null {
  const decimals = decimalsOf(result, houseStyle).percent;
  const figure =
    quantity.kind === 'fraction' && address.facet === 'value'
      ? formatShare(
          { events: quantity.numerator, total: quantity.denominator },
          decimals,
          houseStyle,
        )
      : formatShareLimit(numberOf(quantity), decimals, houseStyle);
  return figure === null ? null : withPercentSign(figure.text, houseStyle);
}

function countText({ quantity, houseStyle, phrasebook }: ReadValue): string {
  if (quantity.kind !== 'fraction') return houseStyle.table.missingCell.meaning;
  const count = (size: number): string => formatCount(size, houseStyle).text;
  const key = houseStyle.sentence.groupCount === 'nOfN' ? 'count.nOfN' : 'count.slash';
  const filled = { events: count(quantity.numerator), total: count(quantity.denominator) };
  return fillWords(phrasebook, key, filled);
}

function shareLimits(value: ReadValue): Pick<EstimateText, 'lower' | 'upper'> | null {
  const { houseStyle, result } = value;
  const lower = facet(value, 'lower');
  const upper = facet(value, 'upper');
  if (lower === null || upper === null) return null;
  const decimals = decimalsOf(result, houseStyle).percent;
  const print = (limit: Quantity): NumberText => {
    const printed = formatShareLimit(numberOf(limit), decimals, houseStyle);
    return { ...printed, text: withPercentSign(printed.text, houseStyle) };
  };
  return { lower: print(lower), upper: print(upper) };
}

function estimateText(measure: EffectMeasureId, value: ReadValue): EstimateText {
  const { result, houseStyle } = value;
  const exact = facet(value, 'value');
  const limits = { lower: facet(value, 'lower'), upper: facet(value, 'upper') };
  const number = (quantity: Quantity | null): number => numberOf(quantity ?? value.quantity);
  const { level } = result.specification;
  const interval = { lower: number(limits.lower), upper: number(limits.upper), level, method: '' };
  const estimate = { value: number(exact), interval };
  const decimals = decimalsOf(result, houseStyle);
  return formatEstimate(measure, { estimate, exact }, decimals, houseStyle);
}

function facetOf(printed: EstimateText, { address }: ReadValue): NumberText {
  return address.facet === 'lower' || address.facet === 'upper'
    ? printed[address.facet]
    : printed.value;
}

function facet({ result, address }: ReadValue, part: AddressFacet): Quantity | null {
  const read = readValue(result, { ...address, facet: part });
  return read.ok ? read.value : null;
}

/** " (95% CI 9.7 to 23.4)" behind an estimate; nothing behind a limit. */
function withLimits(
  text: string,
  limits: Pick<EstimateText, 'lower' | 'upper'> | null,
  { address, result, houseStyle }: ReadValue,
): PrintedValue {
  const printed = { text, addresses: [address] };
  if (limits === null || address.facet !== 'value') return [printed];
  const { open, close } = limitBrackets('sentence', houseStyle);
  const label = intervalLabel(result.specification.level, houseStyle);
  const limit = (facet: 'lower' | 'upper'): ValueAddress => ({ ...address, facet });
  return [
    printed,
    { text: ` (${label}${houseStyle.interval.afterLabel}${open}`, addresses: [] },
    {
      text: joinLimits(limits.lower.text, limits.upper.text, houseStyle),
      addresses: [limit('lower'), limit('upper')],
    },
    { text: `${close})`, addresses: [] },
  ];
}
