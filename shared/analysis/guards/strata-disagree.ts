import { EFFECT_MEASURE_IDS } from '#shared/effects';
import type { PooledContrastResult } from '../analysis-result';
import type { Guard, GuardFact, GuardPoint } from './guard';

/** Tests of homogeneity have little power; 0.10 would cry wolf in every second report. */
const LARGEST_P_VALUE = 0.05;

/**
 * The effect differs between strata, so that one pooled number hides something. Facts: measureIds
 * (whose test of homogeneity is below the limit), for each of them `<measureId>PValue`, and limit.
 */
export const strataDisagree = {
  id: 'strataDisagree',
  severity: 'caution',
  source:
    'Breslow NE, Day NE. Statistical Methods in Cancer Research I: The Analysis of Case-Control ' +
    'Studies. IARC 1980, chapter 4.',
  find: (result) => result.pooled.flatMap(pointsOf),
} as const satisfies Guard<'strataDisagree'>;

function pointsOf({ indexLevelId, homogeneity }: PooledContrastResult): readonly GuardPoint[] {
  const small = EFFECT_MEASURE_IDS.flatMap((id) => {
    const test = homogeneity[id];
    return test.ok && test.value.pValue < LARGEST_P_VALUE
      ? [{ id, pValue: test.value.pValue }]
      : [];
  });
  if (small.length === 0) {
    return [];
  }
  const facts: Record<string, GuardFact> = {
    measureIds: small.map(({ id }) => id),
    limit: LARGEST_P_VALUE,
  };
  for (const { id, pValue } of small) {
    facts[`${id}PValue`] = pValue;
  }
  return [{ place: { scope: { kind: 'pooled' }, levelId: indexLevelId }, facts }];
}
