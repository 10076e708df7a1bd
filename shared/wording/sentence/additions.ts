import type { PhrasePart } from '../phrase';
import { fillPattern } from '../phrasebook/fill-pattern';
import { countInText } from './counts';
import { detailOf, measureName } from './details';
import type { DifferenceWords } from './difference';
import { verbWords } from './outcome';
import type { RatioWords } from './ratio';
import { reasonOf } from './reasons';
import type { WordingContext } from './wording-context';

/** The absolute side behind the relative one, signed. */
export function moreDifference(
  { book }: WordingContext,
  { signedSize, signedInterval }: DifferenceWords,
): readonly PhrasePart[] {
  return fillPattern(book, 'more.difference', { size: signedSize, detail: signedInterval });
}

/** The relative side behind the absolute one; by its name where either leaves the matter open. */
export function moreRelative(
  context: WordingContext,
  ratio: RatioWords | null,
  difference: DifferenceWords,
): readonly PhrasePart[] {
  const { book } = context;
  const name = measureName(context, 'riskRatio');
  if (!ratio) {
    const reason = reasonOf(context, 'riskRatio');
    return fillPattern(book, 'more.ratioNotEstimable', { ratio: name, reason });
  }
  if (difference.isUnclear || ratio.isUnclear || ratio.form === 'named') {
    return fillPattern(book, 'more.ratio', { name, value: ratio.value, detail: ratio.interval });
  }
  const statistics = ratio.form === 'percent' ? [ratio.named, ratio.interval] : [ratio.interval];
  const detail = detailOf(context, statistics);
  return fillPattern(book, 'more.relative', { change: ratio.change, detail });
}

/** A pooled effect is no comparison of the crude risks; they are given apart and called so. */
export function unstratified(context: WordingContext): readonly PhrasePart[] {
  const { claim, book } = context;
  return claim.scope.kind === 'pooled'
    ? fillPattern(book, 'more.unstratified', {
        indexCount: countInText(context, claim.index),
        referenceCount: countInText(context, claim.reference),
        verb: verbWords(claim.outcome, book),
      })
    : [];
}
