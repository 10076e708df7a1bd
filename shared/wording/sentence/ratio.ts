import type { EffectMeasureId } from '#shared/effects';
import {
  formatEstimate,
  rationalOf,
  roundRational,
  withPercentSign,
  writeDecimal,
  type Decimal,
  type EstimateText,
} from '#shared/format';
import type { Quantity } from '#shared/analysis';
import { fillPattern, fillWords, joinParts } from '../phrasebook/fill-pattern';
import type { Direction, PhrasePart } from '../phrase';
import { intervalDetail, namedRatio } from './details';
import { directionOfRatio, formOf, percentOfRatio, type RatioForm } from './ratio-form';
import { addressOf, type WordingContext } from './wording-context';

/** The relative side of a claim, ready to be said. */
export interface RatioWords {
  readonly form: RatioForm;
  readonly direction: Direction;
  /** Whether the interval holds 1. */
  readonly isUnclear: boolean;
  /** Whether both limits are 1: everybody had the event, and the interval tells nothing. */
  readonly hasNoWidth: boolean;
  /** "49% higher" or "4.5 times as high". */
  readonly change: readonly PhrasePart[];
  /** "risk ratio 1.49". */
  readonly named: readonly PhrasePart[];
  /** "1.49". */
  readonly value: PhrasePart;
  /** "95% CI 1.09 to 2.05". */
  readonly interval: readonly PhrasePart[];
  /** "from 45% lower to 33% higher". */
  readonly compatible: readonly PhrasePart[];
}

/** Words of a ratio; null where it is not estimable. */
export function ratioWords(
  context: WordingContext,
  measure: Exclude<EffectMeasureId, 'riskDifference'>,
): RatioWords | null {
  const { claim, style, decimals } = context;
  const estimate = claim.measures[measure];
  if (!estimate.ok) {
    return null;
  }
  const exact: Quantity = claim.exact[measure] ?? { kind: 'real', value: estimate.value.value };
  const text = formatEstimate(measure, { estimate: estimate.value, exact }, decimals, style);
  const printed = printedDecimal(context, exact, text.value.decimals);
  const { interval } = estimate.value;
  return {
    form: formOf(printed),
    direction: directionOfRatio(printed),
    isUnclear: interval.lower <= 1 && interval.upper >= 1,
    hasNoWidth: interval.lower === 1 && interval.upper === 1,
    change: changeWords(context, printed, { quantity: measure, facet: 'value' }),
    named: namedRatio(context, measure, text),
    value: {
      kind: 'value',
      text: text.value.text,
      address: addressOf(context, measure, 'value'),
    },
    interval: intervalDetail(context, measure, text),
    compatible: compatibleWords(context, measure, text),
  };
}

function printedDecimal({ style }: WordingContext, value: Quantity, decimals: number): Decimal {
  return roundRational(rationalOf(value), 1, decimals, style.numbers.rounding);
}

interface RatioPlace {
  readonly quantity: EffectMeasureId;
  readonly facet: 'value' | 'lower' | 'upper';
}

function changeWords(
  context: WordingContext,
  printed: Decimal,
  { quantity, facet }: RatioPlace,
): readonly PhrasePart[] {
  const { book, style } = context;
  const form = formOf(printed);
  const direction = directionOfRatio(printed);
  if (form === 'named' || direction === 'same') {
    return fillPattern(book, 'compatible.none', {});
  }
  const figure =
    form === 'times'
      ? writeDecimal(printed, style.numbers)
      : withPercentSign(writeDecimal(percentOfRatio(printed), style.numbers), style);
  const words = form === 'times' ? 'direction.asHigh' : (`direction.${direction}` as const);
  return fillPattern(book, `change.${form}`, {
    size: { kind: 'value', text: figure, address: addressOf(context, quantity, facet) },
    direction: { kind: 'direction', text: fillWords(book, words, {}), direction },
  });
}

function compatibleWords(
  context: WordingContext,
  measure: Exclude<EffectMeasureId, 'riskDifference'>,
  { lower, upper }: EstimateText,
): readonly PhrasePart[] {
  const said = (
    facet: 'lower' | 'upper',
    { value, decimals }: EstimateText['lower'],
  ): readonly PhrasePart[] =>
    changeWords(context, printedDecimal(context, { kind: 'real', value }, decimals), {
      quantity: measure,
      facet,
    });
  return fillPattern(context.book, 'compatible.limits', {
    lower: joinParts([said('lower', lower)]),
    upper: joinParts([said('upper', upper)]),
  });
}
