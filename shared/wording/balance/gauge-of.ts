import { DIFFERENCE_SCALES, formatNumber } from '#shared/format';
import type { Estimate } from '#shared/stats';
import { fillWords } from '../phrasebook/fill-pattern';
import type { WordingContext } from '../sentence/wording-context';
import type { BalanceGauge, GaugeEdge } from './balance';

/** What the gauge of a claim draws; null where the claim has no number to draw. */
export function gaugeOf(context: WordingContext): BalanceGauge | null {
  const { claim } = context;
  const { riskDifference, riskRatio, oddsRatio } = claim.measures;
  if (claim.design === 'caseControl') {
    return oddsRatio.ok ? { kind: 'ratio', relative: edge(oddsRatio.value, (one) => one) } : null;
  }
  const { events, total } = claim.reference.count;
  if (total === 0) {
    return null;
  }
  const referenceRisk = events / total;
  const absolute = riskDifference.ok
    ? edge(riskDifference.value, (difference) => referenceRisk + difference)
    : null;
  const relative = riskRatio.ok ? edge(riskRatio.value, (ratio) => referenceRisk * ratio) : null;
  const gapText = gapWords(context, absolute, relative);
  return { kind: 'risks', referenceRisk, absolute, relative, gapText };
}

function edge({ value, interval }: Estimate, place: (value: number) => number): GaugeEdge {
  return { value: place(value), lower: place(interval.lower), upper: place(interval.upper) };
}

/** Pooled differences and pooled ratios need not end at the same risk. */
function gapWords(
  { claim, style, decimals, book }: WordingContext,
  absolute: GaugeEdge | null,
  relative: GaugeEdge | null,
): string | null {
  if (claim.scope.kind !== 'pooled' || !absolute || !relative) {
    return null;
  }
  const { unit } = style.difference;
  const gap = formatNumber(
    { kind: 'real', value: Math.abs(absolute.value - relative.value) },
    { scale: DIFFERENCE_SCALES[unit].scale, decimals: decimals.riskDifference, sign: 'none' },
    style,
  );
  return /[1-9]/.test(gap.text)
    ? fillWords(book, 'balance.pooledGap', {
        size: fillWords(book, `size.${unit}`, { size: gap.text }),
      })
    : null;
}
