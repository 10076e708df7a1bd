import {
  formatPValue,
  intervalLabel,
  joinLimits,
  limitBrackets,
  pValueStatement,
  type EstimateText,
} from '#shared/format';
import type { EffectMeasureId } from '#shared/effects';
import { fillPattern, joinParts, type SlotFilling } from '../phrasebook/fill-pattern';
import type { PhrasePart } from '../phrase';
import { addressOf, type WordingContext } from './wording-context';

/** "95% CI 9.7 to 23.4", limits of `measure`; `mirrored` prints the upper one first. */
export function intervalDetail(
  context: WordingContext,
  measure: EffectMeasureId,
  { lower, upper }: EstimateText,
  order: 'asItIs' | 'mirrored' = 'asItIs',
): readonly PhrasePart[] {
  const { claim, style } = context;
  const { open, close } = limitBrackets('sentence', style);
  const [first, second] = order === 'asItIs' ? [lower, upper] : [upper, lower];
  const limits: PhrasePart = {
    kind: 'limits',
    text: joinLimits(first.text, second.text, style),
    lower: addressOf(context, measure, 'lower'),
    upper: addressOf(context, measure, 'upper'),
    first: order === 'asItIs' ? 'lower' : 'upper',
  };
  const label = intervalLabel(claim.level, style) + style.interval.afterLabel;
  return joinParts([label, open, limits, close]);
}

/** "risk ratio 1.49" or "RR = 1.49". */
export function namedRatio(
  context: WordingContext,
  measure: EffectMeasureId,
  { value }: EstimateText,
): readonly PhrasePart[] {
  return fillPattern(context.book, 'ratio.named', {
    name: measureName(context, measure),
    joiner: context.style.sentence.measureJoiner,
    value: valuePart(context, measure, value.text),
  });
}

/** How the house style names a measure: in full, or by its abbreviation. */
export function measureName(
  { claim, style, book }: WordingContext,
  measure: EffectMeasureId,
): string {
  const terms = book.terms[claim.design].measures[measure];
  return style.sentence.measureNames === 'abbreviated' ? terms.short : terms.name;
}

/** A printed estimate, bound to its address. */
export function valuePart(
  context: WordingContext,
  measure: EffectMeasureId,
  text: string,
): PhrasePart {
  return { kind: 'value', text, address: addressOf(context, measure, 'value') };
}

/** Statistics of one pair of brackets, in order, with the house style's joiner between them. */
export function detailOf(
  { style }: WordingContext,
  statistics: readonly (readonly PhrasePart[])[],
): readonly PhrasePart[] {
  const filled = statistics.filter((parts) => parts.length > 0);
  const joined = filled.flatMap<SlotFilling>((parts, place) =>
    place === 0 ? [parts] : [style.interval.joiner, parts],
  );
  return joinParts(joined);
}

/** " (…)" round statistics; nothing where there are none. */
export function bracketed(
  context: WordingContext,
  statistics: readonly (readonly PhrasePart[])[],
): readonly PhrasePart[] {
  const detail = detailOf(context, statistics);
  return detail.length === 0 ? [] : joinParts([' (', detail, ')']);
}

/** "P = .03" where the house style prints p-values in sentences. */
export function testDetail(context: WordingContext): readonly PhrasePart[] {
  const { claim, style } = context;
  if (style.sentence.pValue === 'omitted' || !claim.test.ok) {
    return [];
  }
  const pValue = formatPValue(claim.test.value.pValue, claim.level, style);
  const { symbol, italic, relation } = pValueStatement(pValue, style);
  const words: PhrasePart = { kind: 'text', text: symbol, ...(italic ? { italic: true } : {}) };
  const figure: PhrasePart = {
    kind: 'value',
    text: pValue.figure,
    address: addressOf(context, claim.testQuantity, 'pValue'),
  };
  return joinParts([words, relation, figure]);
}
