import { EFFECT_MEASURES, designGivesRisk } from '#shared/effects';
import type { AnalysisResult, PooledContrastResult } from '../analysis-result';
import type { Guard, GuardPoint } from './guard';

/**
 * The pooled effect points the other way than the crude one: the strata are mixed differently in
 * the two groups. Facts: measureId (risk difference, or odds ratio where the design gives no risk),
 * crude, pooled.
 */
export const turnedRound = {
  id: 'turnedRound',
  severity: 'caution',
  source:
    "Bickel PJ, Hammel EA, O'Connell JW. Sex bias in graduate admissions: data from Berkeley. " +
    'Science 1975;187:398-404.',
  find: (result) => result.pooled.flatMap((contrast) => pointsOf(result, contrast)),
} as const satisfies Guard<'turnedRound'>;

function pointsOf(
  { crude, frame }: AnalysisResult,
  { indexLevelId, measures }: PooledContrastResult,
): readonly GuardPoint[] {
  const measureId = designGivesRisk(frame.design) ? 'riskDifference' : 'oddsRatio';
  const { nullValue } = EFFECT_MEASURES[measureId];
  const contrast = crude.contrasts.find((candidate) => candidate.indexLevelId === indexLevelId);
  const over = contrast?.measures[measureId];
  const within = measures[measureId];
  if (!over?.ok || !within.ok) {
    return [];
  }
  const facts = { measureId, crude: over.value.value, pooled: within.value.value };
  const opposite = (facts.crude - nullValue) * (facts.pooled - nullValue) < 0;
  const place = { scope: { kind: 'pooled' }, levelId: indexLevelId } as const;
  return opposite ? [{ place, facts }] : [];
}
