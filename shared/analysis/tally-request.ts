import type { TallyRequest } from '#shared/tally';
import type { AnalysisSpecification } from './specification';

/**
 * What an analysis needs counted: outcome, exposure, then the stratifying columns in their order,
 * under the analysis' restrictions. The same specification but for reference, methods or words asks
 * for the same tally.
 */
export function tallyRequestOf(specification: AnalysisSpecification): TallyRequest {
  const { outcome, exposure, stratumColumnIds, restrictions } = specification;
  return { columnIds: [outcome.columnId, exposure.columnId, ...stratumColumnIds], restrictions };
}
