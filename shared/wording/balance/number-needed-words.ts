import { numberNeeded, type NumberNeeded, type NumberNeededSide } from '#shared/effects';
import { formatCount, joinLimits } from '#shared/format';
import { fillWords } from '../phrasebook/fill-pattern';
import type { WordingContext } from '../sentence/wording-context';

/**
 * The number needed of a claim with its limits: "NNTB 17 (9 to 102)" in a trial, "1 more for every
 * 7 (5 to 11)" in a cohort. Where the difference's interval holds 0 the limits run through
 * infinity. Null where the design gives none, the house style says none, or nothing is estimable.
 */
export function numberNeededWords(context: WordingContext): string | null {
  const { claim, style } = context;
  const difference = claim.measures.riskDifference;
  const given = claim.design === 'trial' || claim.design === 'cohort';
  if (!given || style.sentence.numberNeeded === 'never' || !difference.ok) {
    return null;
  }
  const exact = claim.exact.riskDifference;
  const needed = numberNeeded(difference.value, exact?.kind === 'fraction' ? exact : null);
  return limitedWords(context, needed);
}

const INFINITY = '∞';

function limitedWords(context: WordingContext, { value, limits }: NumberNeeded): string {
  const { book, style } = context;
  const needed = sideWords(context, value);
  if (limits.kind === 'oneSided') {
    const nearest = countWords(limits.nearest, context);
    const farthest = countWords(limits.farthest, context);
    const joined = joinLimits(nearest, farthest, style);
    return fillWords(book, 'needed.limited', { needed, limits: joined });
  }
  const fewer: NumberNeededSide = { change: 'fewer', count: limits.fewer };
  const more: NumberNeededSide = { change: 'more', count: limits.more };
  const [first, last] = value.change === 'fewer' ? [fewer, more] : [more, fewer];
  const trial = context.claim.design === 'trial';
  const through = trial ? 'needed.treatThroughInfinity' : 'needed.throughInfinity';
  return fillWords(book, 'needed.limited', {
    needed,
    limits: fillWords(book, through, {
      first: sideWords(context, first),
      last: sideWords(context, last),
    }),
  });
}

function sideWords(context: WordingContext, { change, count }: NumberNeededSide): string {
  const { claim, style, book } = context;
  const isTrial = claim.design === 'trial';
  if (count === null) {
    return fillWords(book, isTrial ? 'needed.treatNone' : 'needed.none', {});
  }
  const filling = { count: countWords(count, context) };
  if (!isTrial) {
    return fillWords(book, `needed.${change}`, filling);
  }
  const benefit = (change === 'fewer') === (claim.outcome.desirability === 'harmful');
  const plain = style.sentence.numberNeeded === 'plain';
  const key = plain
    ? (`needed.plain${benefit ? 'Benefit' : 'Harm'}` as const)
    : (`needed.${benefit ? 'benefit' : 'harm'}` as const);
  return fillWords(book, key, filling);
}

function countWords(count: number | null, { style }: WordingContext): string {
  return count === null ? INFINITY : formatCount(count, style).text;
}
