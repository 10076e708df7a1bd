import type { AnalysisResult, ContrastResult } from '../analysis-result';
import { contrastTable } from '../result-places';
import type { Guard, GuardPoint } from './guard';

/** From here on an odds ratio must not be read as a risk ratio. */
const LARGEST_EXCESS = 0.1;

/**
 * The outcome is so common that the odds ratio lies well further from 1 than the risk ratio. Facts:
 * referenceRisk, oddsRatio, riskRatio, excess (|odds ratio / risk ratio - 1|, which is reference
 * risk times |odds ratio - 1|), limit.
 */
export const commonOutcome = {
  id: 'commonOutcome',
  severity: 'caution',
  source:
    'Davies HTO, Crombie IK, Tavakoli M. When can odds ratios mislead? ' + 'BMJ 1998;316:989-991.',
  find: (result) => result.crude.contrasts.flatMap((contrast) => pointsOf(result, contrast)),
} as const satisfies Guard<'commonOutcome'>;

function pointsOf(
  { crude }: AnalysisResult,
  { indexLevelId, measures }: ContrastResult,
): readonly GuardPoint[] {
  const { oddsRatio, riskRatio } = measures;
  const table = contrastTable(crude, indexLevelId);
  if (!oddsRatio.ok || !riskRatio.ok || !table) {
    return [];
  }
  const referenceRisk = table.reference.events / table.reference.total;
  const facts = {
    referenceRisk,
    oddsRatio: oddsRatio.value.value,
    riskRatio: riskRatio.value.value,
    excess: referenceRisk * Math.abs(oddsRatio.value.value - 1),
    limit: LARGEST_EXCESS,
  };
  const place = { scope: { kind: 'crude' }, levelId: indexLevelId } as const;
  return facts.excess > LARGEST_EXCESS ? [{ place, facts }] : [];
}
