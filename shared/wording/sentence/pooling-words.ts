import { designGivesRisk } from '#shared/effects';
import type { EffectMeasureId } from '#shared/effects';
import type { PoolingMethodId } from '#shared/stats';
import type { Claim } from '../claim';
import { fillWords } from '../phrasebook/fill-pattern';
import type { Phrasebook } from '../phrasebook/phrasebook';

type PoolingFamily = 'mantelHaenszel' | 'conditional' | 'standardised';

/** What a sentence calls each way of pooling; notes give the variance and the population too. */
const FAMILIES: Readonly<Record<PoolingMethodId, PoolingFamily>> = {
  sato: 'mantelHaenszel',
  greenlandRobins: 'mantelHaenszel',
  robinsBreslowGreenland: 'mantelHaenszel',
  exactConditional: 'conditional',
  exactMidP: 'conditional',
  standardisedToAll: 'standardised',
  standardisedToIndex: 'standardised',
  standardisedToReference: 'standardised',
  standardisedToChosen: 'standardised',
};

/** "Mantel–Haenszel", or "direct standardisation; Mantel–Haenszel" where measures differ. */
export function poolingWords({ design, measures }: Claim, book: Phrasebook): string {
  const said: readonly EffectMeasureId[] = designGivesRisk(design)
    ? ['riskDifference', 'riskRatio']
    : ['oddsRatio'];
  const families = said.flatMap((id) => {
    const estimate = measures[id];
    const method = estimate.ok ? estimate.value.interval.method : null;
    return method !== null && isPooling(method) ? [FAMILIES[method]] : [];
  });
  const known = families.length > 0 ? families : (['mantelHaenszel'] as const);
  const words = [...new Set<PoolingFamily>(known)].map((id) =>
    fillWords(book, `pooling.${id}`, {}),
  );
  return words.join(fillWords(book, 'list.semicolon', {}));
}

function isPooling(method: string): method is PoolingMethodId {
  return Object.hasOwn(FAMILIES, method);
}
