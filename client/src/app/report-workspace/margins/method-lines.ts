import type { ValueAddress } from '#shared/analysis';
import type { EffectMeasureId } from '#shared/effects';
import type { PinnedAnalysis } from '#shared/report';
import {
  ODDS_RATIO_INTERVALS,
  POOLING_METHODS,
  RISK_DIFFERENCE_INTERVALS,
  RISK_INTERVALS,
  RISK_RATIO_INTERVALS,
} from '#shared/stats';

type Estimand = EffectMeasureId | 'risk';

/** What the intervals of an estimand are called in one word. */
const ESTIMANDS: Readonly<Record<Estimand, string>> = {
  riskDifference: 'Differences',
  riskRatio: 'Ratios',
  oddsRatio: 'Odds ratios',
  risk: 'Risks',
};

/** The interval methods behind the limits that a block prints: "Differences: Newcombe". */
export function methodLines(
  pin: PinnedAnalysis,
  addresses: readonly ValueAddress[],
): readonly string[] {
  const limits = addresses.filter(({ facet }) => facet === 'lower' || facet === 'upper');
  const estimands = (Object.keys(ESTIMANDS) as Estimand[]).filter((estimand) =>
    limits.some(({ quantity }) => quantity === estimand),
  );
  const pooledOnly = limits.every(({ scope }) => scope.kind === 'pooled');
  return estimands.flatMap((estimand) => {
    const name = methodName(pooledMethod(pin, estimand, pooledOnly) ?? chosenMethod(pin, estimand));
    return name === null ? [] : [`${ESTIMANDS[estimand]}: ${name}`];
  });
}

function chosenMethod({ result }: PinnedAnalysis, estimand: Estimand): string {
  return result.specification.methods[estimand];
}

function pooledMethod(
  { result }: PinnedAnalysis,
  estimand: Estimand,
  pooledOnly: boolean,
): string | null {
  if (!pooledOnly || estimand === 'risk') return null;
  const estimate = result.pooled[0]?.measures[estimand];
  return estimate?.ok === true ? estimate.value.interval.method : null;
}

const NAMES: Readonly<Record<string, { readonly shortLabel: string }>> = {
  ...RISK_INTERVALS,
  ...RISK_DIFFERENCE_INTERVALS,
  ...RISK_RATIO_INTERVALS,
  ...ODDS_RATIO_INTERVALS,
  ...POOLING_METHODS,
};

function methodName(id: string): string | null {
  return NAMES[id]?.shortLabel ?? null;
}
