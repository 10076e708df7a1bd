import { designGivesRisk } from '#shared/effects';
import type { EffectMeasureId } from '#shared/effects';
import type { Result } from '#shared/core';
import { DIFFERENCES_OF_DIFFERENCES, excessRisk, ratioOfRatios } from '#shared/stats';
import type { EstimationIssue, FourfoldTable, Interaction, StratifiedTable } from '#shared/stats';
import type { PooledContrastResult, ResultFrame } from './analysis-result';
import { byMeasure, ifGiven } from './compute-layer';

/**
 * How a contrast differs between two strata, the second against the first, on each scale; with the
 * relative excess risk where the exposure has two levels as well. Nothing for more strata.
 */
export function computeInteraction(
  strata: StratifiedTable,
  frame: ResultFrame,
  level: number,
): Pick<PooledContrastResult, 'interaction' | 'excessRisk'> {
  const [first, second, ...others] = strata.map(({ table }) => table);
  if (!first || !second || others.length > 0) {
    return {};
  }
  const interaction = byMeasure((id) =>
    ifGiven(id, frame, () => INTERACTIONS[id](second, first, level)),
  );
  return frame.exposure.levels.length === 2
    ? { interaction, excessRisk: excessOf(first, second, frame, level) }
    : { interaction };
}

const INTERACTIONS: Readonly<
  Record<
    EffectMeasureId,
    (
      one: FourfoldTable,
      other: FourfoldTable,
      level: number,
    ) => Result<Interaction, EstimationIssue>
  >
> = {
  riskDifference: (one, other, level) =>
    DIFFERENCES_OF_DIFFERENCES.squareAndAddContrast.contrast(one, other, level),
  riskRatio: (one, other, level) => ratioOfRatios(one, other, 'riskRatio', level),
  oddsRatio: (one, other, level) => ratioOfRatios(one, other, 'oddsRatio', level),
};

/** Cases and controls give odds ratios only, which then stand for risk ratios. */
function excessOf(
  first: FourfoldTable,
  second: FourfoldTable,
  { design }: ResultFrame,
  level: number,
): Result<Interaction, EstimationIssue> {
  const counts = {
    both: second.index,
    firstOnly: first.index,
    secondOnly: second.reference,
    neither: first.reference,
  };
  return excessRisk(counts, designGivesRisk(design) ? 'riskRatios' : 'oddsRatios', level);
}
