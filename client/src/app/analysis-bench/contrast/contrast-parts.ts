import { keptLevels } from '#shared/analysis';
import type { OutcomeWords } from '#shared/analysis';
import type { CodeBook } from '#shared/code-book';
import { type ContrastPart, type ContrastSlot, fillWords, type Phrasebook } from '#shared/wording';
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
  const time = source.outcome?.timeFrame ?? null;
  const words = slotWords(source, book);
  return fillWords(book, 'contrast.sentence', {
    outcome: '{outcome}',
    time: time === null ? '' : fillWords(book, 'contrast.time', { time }),
    exposure: '{exposure}',
    reference: '{reference}',
    strata: '{strata}',
  })
    .split(/(\{\w+\})/)
    .filter((piece) => piece !== '')
    .map((piece) => partOf(piece, words));
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

function slotWords(
  { draft, codeBook, outcome }: ContrastSource,
  book: Phrasebook,
): Readonly<Record<ContrastSlot, string>> {
  const exposure = columnById(codeBook, draft.exposure.columnId);
  const levels = exposure === null ? [] : keptLevels(exposure, draft.restrictions);
  const reference = levels.find(({ id }) => id === draft.exposure.referenceLevelId);
  const strata = draft.stratumColumnIds
    .map((id) => columnById(codeBook, id)?.sentenceLabel ?? id)
    .join(' and ');
  return {
    outcome: capitalised(outcome?.noun ?? 'pick an outcome'),
    exposure: exposure?.sentenceLabel ?? 'pick an exposure',
    reference: reference?.sentenceLabel ?? 'pick a level',
    strata:
      strata === ''
        ? fillWords(book, 'contrast.noStrata', {})
        : fillWords(book, 'contrast.within', { strata }),
  };
}

function partOf(piece: string, words: Readonly<Record<ContrastSlot, string>>): ContrastPart {
  const slot = piece.slice(1, -1);
  return piece.startsWith('{') && Object.hasOwn(words, slot)
    ? { kind: 'picker', slot: slot as ContrastSlot, text: words[slot as ContrastSlot] }
    : { kind: 'text', text: piece };
}

function capitalised(words: string): string {
  return words.charAt(0).toUpperCase() + words.slice(1);
}
