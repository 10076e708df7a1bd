import { intervalLabel } from '#shared/format';
import type { Framing, PhrasePart } from '../phrase';
import { fillPattern, joinParts, type SlotFilling } from '../phrasebook/fill-pattern';
import { countInText } from './counts';
import { moreDifference, moreRelative, unstratified } from './additions';
import { bracketed, detailOf, measureName, testDetail } from './details';
import { differenceWords, type DifferenceWords } from './difference';
import { countedGroup, groupPart } from './groups';
import { openingOf } from './opening';
import { occurrenceOf, occurrenceTerms, verbWords } from './outcome';
import { ratioWords, type RatioWords } from './ratio';
import { reasonOf } from './reasons';
import type { WordingContext } from './wording-context';

/** The sentence of a claim whose design gives risks (or prevalences). */
export function riskSentence(context: WordingContext, framing: Framing): readonly PhrasePart[] {
  const difference = differenceWords(context);
  const ratio = ratioWords(context, 'riskRatio');
  if (framing === 'relative') {
    return ratio ? relativeSentence(context, ratio, difference) : ratioMissing(context, difference);
  }
  if (!difference) {
    return nothingCompared(context);
  }
  return absoluteSentence(context, difference, framing === 'both' ? { ratio } : null);
}

/** In a trial the relative effect never stands without the absolute one. */
function relativeMore(
  context: WordingContext,
  difference: DifferenceWords | null,
): readonly PhrasePart[] {
  return context.claim.design === 'trial' && difference ? moreDifference(context, difference) : [];
}

function absoluteSentence(
  context: WordingContext,
  difference: DifferenceWords,
  relative: { readonly ratio: RatioWords | null } | null,
): readonly PhrasePart[] {
  const more = joinParts([
    relative ? moreRelative(context, relative.ratio, difference) : [],
    unstratified(context),
  ]);
  if (difference.isUnclear) {
    const estimate = differenceEstimate(context, difference);
    return unclearSentence(context, estimate, difference.compatible, more);
  }
  return fillPattern(context.book, 'absolute.clear', {
    ...subjects(context),
    change: difference.change,
    detail: detailOf(context, [difference.interval, testDetail(context)]),
    more,
  });
}

function relativeSentence(
  context: WordingContext,
  ratio: RatioWords,
  difference: DifferenceWords | null,
): readonly PhrasePart[] {
  const more = joinParts([relativeMore(context, difference), unstratified(context)]);
  if (ratio.hasNoWidth) {
    return withoutWidth(context, ratio, more);
  }
  if (ratio.isUnclear || ratio.form === 'named') {
    return unclearSentence(context, ratioEstimate(context, ratio), ratio.compatible, more);
  }
  const { named, interval } = ratio;
  const statistics = ratio.form === 'percent' ? [named, interval] : [interval];
  return fillPattern(context.book, `relative.${ratio.form}`, {
    ...subjects(context),
    change: ratio.change,
    detail: detailOf(context, [...statistics, testDetail(context)]),
    more,
  });
}

interface Subjects {
  readonly opening: SlotFilling;
  readonly outcome: SlotFilling;
  readonly index: SlotFilling;
  readonly reference: SlotFilling;
}

function subjects(context: WordingContext): Subjects {
  const { claim } = context;
  return {
    opening: openingOf(context),
    outcome: occurrenceOf(context),
    index: countedGroup(context, claim.index, 'full'),
    reference: countedGroup(context, claim.reference, 'those'),
  };
}

function unclearSentence(
  context: WordingContext,
  estimate: readonly PhrasePart[],
  limits: readonly PhrasePart[],
  more: readonly PhrasePart[],
): readonly PhrasePart[] {
  return fillPattern(context.book, 'unclear', {
    ...subjects(context),
    estimate,
    interval: intervalLabel(context.claim.level, context.style),
    limits,
    more,
  });
}

function withoutWidth(
  context: WordingContext,
  ratio: RatioWords,
  more: readonly PhrasePart[],
): readonly PhrasePart[] {
  return fillPattern(context.book, 'unclear.noWidth', {
    ...subjects(context),
    estimate: ratioEstimate(context, ratio),
    interval: intervalLabel(context.claim.level, context.style),
    more,
  });
}

function differenceEstimate(
  context: WordingContext,
  { direction, change, signedSize }: DifferenceWords,
): readonly PhrasePart[] {
  const { book, claim } = context;
  const detail = bracketed(context, [testDetail(context)]);
  return direction === 'same'
    ? fillPattern(book, 'estimate.named', {
        name: book.terms[claim.design].measures.riskDifference.name,
        size: signedSize,
        detail,
      })
    : fillPattern(book, 'estimate.change', { noun: occurrenceTerms(context).noun, change, detail });
}

function ratioEstimate(context: WordingContext, ratio: RatioWords): readonly PhrasePart[] {
  const { book } = context;
  if (ratio.form === 'named') {
    const detail = bracketed(context, [testDetail(context)]);
    const name = measureName(context, 'riskRatio');
    return fillPattern(book, 'estimate.named', { name, size: ratio.value, detail });
  }
  const named = ratio.form === 'percent' ? [ratio.named] : [];
  return fillPattern(book, 'estimate.change', {
    noun: occurrenceTerms(context).noun,
    change: ratio.change,
    detail: bracketed(context, [...named, testDetail(context)]),
  });
}

function ratioMissing(
  context: WordingContext,
  difference: DifferenceWords | null,
): readonly PhrasePart[] {
  const { claim, book } = context;
  if (!difference) {
    return nothingCompared(context);
  }
  const shared = {
    opening: openingOf(context),
    index: groupPart(context, claim.index, 'full'),
    reference: groupPart(context, claim.reference, 'those'),
    ratio: measureName(context, 'riskRatio'),
    reason: reasonOf(context, 'riskRatio'),
  };
  const more = joinParts([moreDifference(context, difference), unstratified(context)]);
  return claim.scope.kind === 'pooled'
    ? fillPattern(book, 'pooled.notEstimable', { ...shared, outcome: occurrenceOf(context), more })
    : fillPattern(book, 'relative.notEstimable', {
        ...shared,
        indexCount: countInText(context, claim.index),
        referenceCount: countInText(context, claim.reference),
        verb: verbWords(claim.outcome, book),
        more,
      });
}

function nothingCompared(context: WordingContext): readonly PhrasePart[] {
  return fillPattern(context.book, 'nothing.compared', {
    ...subjects(context),
    reason: reasonOf(context, 'riskDifference'),
  });
}
