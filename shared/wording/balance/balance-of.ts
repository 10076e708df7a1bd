import { formatEstimate, intervalLabel, joinLimits, type EstimateText } from '#shared/format';
import type { HouseStyle } from '#shared/house-style';
import type { EffectMeasureId } from '#shared/effects';
import { rationalOf, roundRational, withPercentSign, writeDecimal } from '#shared/format';
import type { Claim } from '../claim';
import { fillWords } from '../phrasebook/fill-pattern';
import type { Phrasebook } from '../phrasebook/phrasebook';
import type { Direction } from '../phrase';
import { occurrenceTerms } from '../sentence/outcome';
import { directionOfRatio, formOf, percentOfRatio } from '../sentence/ratio-form';
import { reasonOf } from '../sentence/reasons';
import { wordingContext, type WordingContext } from '../sentence/wording-context';
import type { Balance, BalanceSide } from './balance';
import { gaugeOf } from './gauge-of';
import { numberNeededWords } from './number-needed-words';

/**
 * Both sizes of a claim, in the words and digits of its sentence, with what the gauge draws.
 *
 * A side that the design does not give, or that is not estimable, says why.
 */
export function balanceOf(claim: Claim, style: HouseStyle, book: Phrasebook): Balance {
  const context = wordingContext(claim, style, book);
  const absolute = absoluteSide(context);
  const relative = relativeSide(context);
  return {
    absolute,
    relative,
    gauge: gaugeOf(context),
    referenceLabel: claim.reference.level.label,
    indexLabel: claim.index.level.label,
    name: fillWords(book, 'balance.name', {
      absolute: sideName(absolute, book),
      relative: sideName(relative, book),
    }),
  };
}

function absoluteSide(context: WordingContext): BalanceSide {
  const { claim, style, book } = context;
  if (claim.design === 'caseControl') {
    return { available: false, reason: fillWords(book, 'balance.noAbsoluteByDesign', {}) };
  }
  const text = printed(context, 'riskDifference');
  return text
    ? {
        available: true,
        direction: directionOfDifference(text),
        sizeText: text.value.text,
        unitText: fillWords(book, `balance.unit.${style.difference.unit}`, {}),
        intervalText: intervalText(context, text),
        secondText: numberNeededWords(context),
      }
    : missing(context, 'riskDifference');
}

function directionOfDifference({ value }: EstimateText): Direction {
  if (!/[1-9]/.test(value.text)) {
    return 'same';
  }
  return value.value > 0 ? 'higher' : 'lower';
}

function relativeSide(context: WordingContext): BalanceSide {
  const { claim, style, book } = context;
  const measure = claim.design === 'caseControl' ? 'oddsRatio' : 'riskRatio';
  const text = printed(context, measure);
  if (!text) {
    return missing(context, measure);
  }
  const value = claim.exact[measure] ?? { kind: 'real', value: text.value.value };
  const decimal = roundRational(rationalOf(value), 1, text.value.decimals, style.numbers.rounding);
  const direction = directionOfRatio(decimal);
  const percent = withPercentSign(writeDecimal(percentOfRatio(decimal), style.numbers), style);
  return {
    available: true,
    direction,
    sizeText: fillWords(book, 'balance.timesSize', { value: text.value.text }),
    unitText:
      measure === 'oddsRatio'
        ? fillWords(book, 'balance.oddsUnit', {})
        : fillWords(book, 'balance.timesUnit', { noun: occurrenceTerms(context).noun }),
    intervalText: intervalText(context, text),
    secondText:
      formOf(decimal) === 'percent' && direction !== 'same'
        ? fillWords(book, 'balance.percent', {
            size: percent,
            direction: fillWords(book, `direction.${direction}`, {}),
          })
        : null,
  };
}

function printed(context: WordingContext, measure: EffectMeasureId): EstimateText | null {
  const { claim, style, decimals } = context;
  const estimate = claim.measures[measure];
  return estimate.ok
    ? formatEstimate(
        measure,
        { estimate: estimate.value, exact: claim.exact[measure] },
        decimals,
        style,
      )
    : null;
}

function intervalText({ claim, style }: WordingContext, { lower, upper }: EstimateText): string {
  return (
    intervalLabel(claim.level, style) +
    style.interval.afterLabel +
    joinLimits(lower.text, upper.text, style)
  );
}

function missing(context: WordingContext, measure: EffectMeasureId): BalanceSide {
  const reason = reasonOf(context, measure)
    .map(({ text }) => text)
    .join('');
  return { available: false, reason: fillWords(context.book, 'balance.notEstimable', { reason }) };
}

function sideName(side: BalanceSide, book: Phrasebook): string {
  return side.available
    ? fillWords(book, 'balance.sideName', {
        size: side.sizeText,
        unit: side.unitText,
        interval: side.intervalText,
      })
    : side.reason;
}
