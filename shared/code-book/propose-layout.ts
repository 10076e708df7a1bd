import { COUNTED_OUTCOME_COLUMN_ID, type CodeBookColumn, type CountLayout } from './code-book';
import { BLANK_REASON } from './missing-words';
import type { ProfiledColumn } from './profile';

/**
 * How the rows of a file seem to count: by one count column, by two, or as single records.
 *
 * Files with an identifier hold one record a row, whatever else they count.
 */
export function proposeLayout(columns: readonly ProfiledColumn[]): CountLayout {
  const counts = columns.filter(({ guessedKind }) => guessedKind === 'count');
  const [first] = counts;
  if (first === undefined || columns.some(({ guessedKind }) => guessedKind === 'identifier')) {
    return { kind: 'records' };
  }
  return casesAndControls(counts) ?? eventsAndTotal(counts) ?? oneCount(counts, first);
}

function casesAndControls(counts: readonly ProfiledColumn[]): CountLayout | null {
  const cases = counts.find(({ name }) => /case/i.test(name));
  const controls = counts.find(({ name }) => /control/i.test(name));
  if (cases === undefined || controls === undefined || cases === controls) return null;
  return {
    kind: 'casesAndControls',
    casesColumnId: cases.columnId,
    controlsColumnId: controls.columnId,
  };
}

function eventsAndTotal(counts: readonly ProfiledColumn[]): CountLayout | null {
  const events = counts.find(({ name }) => /event|death|case/i.test(name));
  const total = counts.find(({ name }) => /total|^n$|denominator|persons|people|risk/i.test(name));
  if (events === undefined || total === undefined || events === total) return null;
  if ((events.sum ?? 0) > (total.sum ?? 0)) return null;
  return { kind: 'eventsAndTotal', eventsColumnId: events.columnId, totalColumnId: total.columnId };
}

function oneCount(counts: readonly ProfiledColumn[], first: ProfiledColumn): CountLayout {
  const named = counts.find(({ name }) => /^(n|counts?|freq(uency)?)$/i.test(name.trim()));
  return { kind: 'count', columnId: (named ?? first).columnId };
}

/** Ids of the columns that a layout counts by. */
export function countColumnIds(layout: CountLayout): readonly string[] {
  switch (layout.kind) {
    case 'records':
      return [];
    case 'count':
      return [layout.columnId];
    case 'eventsAndTotal':
      return [layout.eventsColumnId, layout.totalColumnId];
    case 'casesAndControls':
      return [layout.casesColumnId, layout.controlsColumnId];
  }
}

/** Level ids of the outcome that two count columns stand for. */
export const COUNTED_OUTCOME_LEVEL_IDS = ['event', 'non-event'] as const;

const OUTCOME_WORDS = {
  eventsAndTotal: { label: 'Outcome', event: 'Event', nonEvent: 'No event' },
  casesAndControls: { label: 'Case status', event: 'Case', nonEvent: 'Control' },
} as const;

/** The outcome column that a layout with two counts stands for; null for other layouts. */
export function countedOutcomeColumn(layout: CountLayout): CodeBookColumn | null {
  if (layout.kind === 'records' || layout.kind === 'count') return null;
  const words = OUTCOME_WORDS[layout.kind];
  const [eventId, nonEventId] = COUNTED_OUTCOME_LEVEL_IDS;
  return {
    id: COUNTED_OUTCOME_COLUMN_ID,
    name: '',
    kind: 'category',
    label: words.label,
    sentenceLabel: words.label.toLowerCase(),
    unit: null,
    levels: [outcomeLevel(eventId, words.event), outcomeLevel(nonEventId, words.nonEvent)],
    bands: [],
    missingCodes: [{ code: '', reason: BLANK_REASON }],
    referenceLevelId: nonEventId,
  };
}

function outcomeLevel(id: string, label: string): CodeBookColumn['levels'][number] {
  return { id, codes: [], label, sentenceLabel: label.toLowerCase() };
}
