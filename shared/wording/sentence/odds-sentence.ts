import { intervalLabel } from '#shared/format';
import type { AddressedQuantity, ValueAddress } from '#shared/analysis';
import type { GroupCount } from '#shared/stats';
import { fillPattern, type SlotFilling } from '../phrasebook/fill-pattern';
import type { PhrasePart } from '../phrase';
import { countOf, shareOf } from './counts';
import { bracketed, measureName, testDetail } from './details';
import { groupPart } from './groups';
import { openingOf } from './opening';
import { ratioWords, type RatioWords } from './ratio';
import { reasonOf } from './reasons';
import { countAddress, type WordingContext } from './wording-context';

/**
 * The sentence of a case–control claim. Risks and differences are not given by the design: whatever
 * the framing, it compares the odds of exposure between cases and controls.
 */
export function oddsSentence(context: WordingContext): readonly PhrasePart[] {
  const { book, claim, style } = context;
  const pooled = claim.scope.kind === 'pooled';
  const ratio = ratioWords(context, 'oddsRatio');
  const parts = {
    opening: openingOf(context),
    shares: sharesOf(context),
    claim: ratio ? oddsClaim(context, ratio) : oddsMissing(context),
  };
  if (ratio?.isUnclear) {
    return fillPattern(book, pooled ? 'odds.pooledUnclear' : 'odds.unclear', {
      ...parts,
      interval: intervalLabel(claim.level, style),
      limits: ratio.compatible,
    });
  }
  return fillPattern(book, pooled ? 'odds.pooled' : 'odds.crude', parts);
}

/** Cases and controls at the index level, of those at the index or the reference level. */
function sharesOf(context: WordingContext): readonly PhrasePart[] {
  const { claim, book } = context;
  const { index, reference } = claim;
  const cases = { events: index.count.events, total: index.count.events + reference.count.events };
  const controls = {
    events: controlsOf(index.count),
    total: controlsOf(index.count) + controlsOf(reference.count),
  };
  const ofCases = ['events', 'comparedCases', 'shareOfComparedCases'] as const;
  const ofControls = ['controls', 'comparedControls', 'shareOfComparedControls'] as const;
  return fillPattern(book, claim.levelCount > 2 ? 'odds.sharesOfTwo' : 'odds.shares', {
    index: groupPart(context, index, 'full'),
    reference: groupPart(context, reference, 'those'),
    outcome: claim.outcome.noun,
    ...named('cases', context, cases, ofCases),
    ...named('controls', context, controls, ofControls),
  });
}

function controlsOf({ events, total }: GroupCount): number {
  return total - events;
}

type Quantities = readonly [AddressedQuantity, AddressedQuantity, AddressedQuantity];

function named<Name extends 'cases' | 'controls'>(
  name: Name,
  context: WordingContext,
  count: GroupCount,
  [part, whole, ratio]: Quantities,
): Record<Name | `${Name}Share`, SlotFilling> {
  const at = (quantity: AddressedQuantity): ValueAddress =>
    countAddress(context, quantity, context.claim.index.level.id);
  const share = shareOf(context, count, at(ratio));
  return {
    [name]: countOf(context, count, { events: at(part), total: at(whole) }),
    [`${name}Share`]: share ? fillPattern(context.book, 'odds.share', { share }) : '',
  } as Record<Name | `${Name}Share`, SlotFilling>;
}

function oddsClaim(context: WordingContext, ratio: RatioWords): readonly PhrasePart[] {
  const { book } = context;
  const test = testDetail(context);
  const interval = ratio.isUnclear ? [] : ratio.interval;
  if (ratio.form === 'named') {
    const name = measureName(context, 'oddsRatio');
    const detail = bracketed(context, [interval, test]);
    return fillPattern(book, 'estimate.named', { name, size: ratio.value, detail });
  }
  const namedRatio = ratio.form === 'percent' ? ratio.named : [];
  return fillPattern(book, `odds.${ratio.form}`, {
    subject: subjectOf(context),
    change: ratio.change,
    detail: bracketed(context, [namedRatio, interval, test]),
  });
}

/** After the shares "the first group" is plain; a pooled claim says the groups before them. */
function subjectOf(context: WordingContext): readonly PhrasePart[] {
  const { claim, book } = context;
  return claim.scope.kind === 'pooled'
    ? fillPattern(book, 'odds.pooledSubject', {
        index: groupPart(context, claim.index, 'full'),
        reference: groupPart(context, claim.reference, 'those'),
      })
    : fillPattern(book, 'odds.crudeSubject', {});
}

function oddsMissing(context: WordingContext): readonly PhrasePart[] {
  return fillPattern(context.book, 'odds.notEstimable', {
    ratio: measureName(context, 'oddsRatio'),
    reason: reasonOf(context, 'oddsRatio'),
  });
}
