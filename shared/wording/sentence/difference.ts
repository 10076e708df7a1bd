import type { Estimate } from '#shared/stats';
import { formatEstimate, type EstimateText, type NumberText } from '#shared/format';
import type { HouseStyle } from '#shared/house-style';
import { fillPattern, fillWords, joinParts, type SlotFilling } from '../phrasebook/fill-pattern';
import type { Direction, PhrasePart } from '../phrase';
import { intervalDetail, valuePart } from './details';
import { addressOf, type WordingContext } from './wording-context';

/** The absolute side of a claim, ready to be said. */
export interface DifferenceWords {
  readonly direction: Direction;
  /** Whether the interval holds 0. */
  readonly isUnclear: boolean;
  /** "16.2 percentage points higher". */
  readonly change: readonly PhrasePart[];
  /** "−6.1 percentage points". */
  readonly signedSize: readonly PhrasePart[];
  /** "95% CI 9.7 to 23.4" beside a direction in words. */
  readonly interval: readonly PhrasePart[];
  /** "95% CI −11.1 to −1.0" beside a signed estimate. */
  readonly signedInterval: readonly PhrasePart[];
  /** "from 3.7 percentage points lower to 6.8 higher". */
  readonly compatible: readonly PhrasePart[];
}

/** Words of the risk difference; null where it is not estimable. */
export function differenceWords(context: WordingContext): DifferenceWords | null {
  const { claim, style, decimals } = context;
  const estimate = claim.measures.riskDifference;
  if (!estimate.ok) {
    return null;
  }
  const printed = { estimate: estimate.value, exact: claim.exact.riskDifference };
  const sizes = formatEstimate('riskDifference', printed, decimals, style, 'none');
  const signed = formatEstimate('riskDifference', printed, decimals, style);
  const { interval } = estimate.value;
  const direction = directionOf(estimate.value.value, sizes.value);
  const order = interval.upper <= 0 ? 'mirrored' : 'asItIs';
  return {
    direction,
    isUnclear: interval.lower <= 0 && interval.upper >= 0,
    change: sized(context, valuePart(context, 'riskDifference', sizes.value.text), direction),
    signedSize: sizeWords(context, valuePart(context, 'riskDifference', signed.value.text)),
    interval: intervalDetail(context, 'riskDifference', sizes, order),
    signedInterval: intervalDetail(context, 'riskDifference', signed),
    compatible: compatibleWords(context, estimate.value, sizes),
  };
}

/** A value that prints as zero points nowhere. */
function directionOf(value: number, printed: NumberText): Direction {
  if (!/[1-9]/.test(printed.text)) {
    return 'same';
  }
  return value > 0 ? 'higher' : 'lower';
}

function sized(
  context: WordingContext,
  size: PhrasePart,
  direction: Direction,
): readonly PhrasePart[] {
  return fillPattern(context.book, 'change.sized', {
    size: sizeWords(context, size),
    direction: directionPart(context, direction),
  });
}

function directionPart({ book }: WordingContext, direction: Direction): SlotFilling {
  return direction === 'same'
    ? ''
    : { kind: 'direction', text: fillWords(book, `direction.${direction}`, {}), direction };
}

function sizeWords({ book, style }: WordingContext, size: PhrasePart): readonly PhrasePart[] {
  return fillPattern(book, sizeKey(size.text, style), { size });
}

type SizeKey = `size.${HouseStyle['difference']['unit'] | 'percentagePoint'}`;

function sizeKey(text: string, { difference }: HouseStyle): SizeKey {
  const isOne = difference.unit === 'percentagePoints' && text === '1';
  return isOne ? 'size.percentagePoint' : `size.${difference.unit}`;
}

/** Both directions that the interval allows; the first limit carries the unit. */
function compatibleWords(
  context: WordingContext,
  { interval }: Estimate,
  { lower, upper }: EstimateText,
): readonly PhrasePart[] {
  const lowerPart: PhrasePart = {
    kind: 'value',
    text: lower.text,
    address: addressOf(context, 'riskDifference', 'lower'),
  };
  const upperPart: PhrasePart = {
    kind: 'value',
    text: upper.text,
    address: addressOf(context, 'riskDifference', 'upper'),
  };
  const none = fillPattern(context.book, 'compatible.none', {});
  const bareUpper = joinParts([upperPart, ' ', directionPart(context, 'higher')]);
  return fillPattern(context.book, 'compatible.limits', {
    lower: interval.lower === 0 ? none : sized(context, lowerPart, 'lower'),
    upper:
      interval.upper === 0
        ? none
        : interval.lower === 0
          ? sized(context, upperPart, 'higher')
          : bareUpper,
  });
}
