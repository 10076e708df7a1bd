import { type CodeBook, COUNTED_OUTCOME_COLUMN_ID } from '#shared/code-book';
import { type AnalysisDraft, withOutcomeColumn } from '../draft/analysis-draft';
import { columnById, factorColumns } from '../draft/column-choices';

/**
 * A draft without what a code book does not have. Two count columns stand for one outcome, so that
 * it is picked already.
 */
export function withoutGone(draft: AnalysisDraft, codeBook: CodeBook): AnalysisDraft {
  const known = new Set(factorColumns(codeBook).map(({ id }) => id));
  const stays = (columnId: string | null): boolean => columnId !== null && known.has(columnId);
  const kept: AnalysisDraft = {
    ...draft,
    outcome: stays(draft.outcome.columnId)
      ? draft.outcome
      : { ...draft.outcome, columnId: null, eventLevelIds: [] },
    exposure: stays(draft.exposure.columnId)
      ? draft.exposure
      : { columnId: null, referenceLevelId: null },
    stratumColumnIds: draft.stratumColumnIds.filter(stays),
    restrictions: draft.restrictions.filter(({ columnId }) => stays(columnId)),
  };
  const counted = columnById(codeBook, COUNTED_OUTCOME_COLUMN_ID);
  if (counted === null || kept.outcome.columnId !== null) return kept;
  return withOutcomeColumn(kept, counted);
}
