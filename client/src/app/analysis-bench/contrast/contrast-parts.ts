import { keptLevels } from '#shared/analysis';
import type { OutcomeWords } from '#shared/analysis';
import type { CodeBook } from '#shared/code-book';
import {
  type ContrastPart,
  contrastSentence,
  type ContrastSlot,
  type Phrasebook,
} from '#shared/wording';
import type { AnalysisDraft } from '../draft/analysis-draft';
import { columnById } from '../draft/column-choices';

/** What the contrast sentence is made of; parts may not be picked yet. */
export interface ContrastSource {
  readonly draft: AnalysisDraft;
  readonly codeBook: CodeBook | null;
  readonly outcome: OutcomeWords | null;
}

/**
 * The analysis as a sentence with pickers for words. What is not picked yet says what to pick; a
 * full contrast reads as it does everywhere else.
 */
export function contrastParts(source: ContrastSource, book: Phrasebook): readonly ContrastPart[] {
  const { draft, codeBook, outcome } = source;
  const exposure = columnById(codeBook, draft.exposure.columnId);
  const levels = exposure === null ? [] : keptLevels(exposure, draft.restrictions);
  const reference = levels.find(({ id }) => id === draft.exposure.referenceLevelId);
  const strata = draft.stratumColumnIds.map((id) => columnById(codeBook, id)?.sentenceLabel ?? id);
  const words = {
    outcome: outcome?.noun ?? 'pick an outcome',
    timeFrame: outcome?.timeFrame ?? null,
    exposure: exposure?.sentenceLabel ?? 'pick an exposure',
    reference: reference?.sentenceLabel ?? 'pick a level',
    strata: strata.length === 0 ? null : strata.join(' and '),
  };
  return contrastSentence(words, book);
}

/** Whether the words of a slot are only an invitation. */
export function isPicked({ draft, outcome }: ContrastSource, slot: ContrastSlot): boolean {
  switch (slot) {
    case 'outcome':
      return outcome !== null && draft.outcome.eventLevelIds.length > 0;
    case 'exposure':
      return draft.exposure.columnId !== null;
    case 'reference':
      return draft.exposure.referenceLevelId !== null;
    case 'strata':
      return draft.stratumColumnIds.length > 0;
  }
}
