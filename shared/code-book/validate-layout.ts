import {
  COUNTED_OUTCOME_COLUMN_ID,
  type CodeBook,
  type CodeBookColumn,
  type CountLayout,
} from './code-book';
import { refusal, type CodeBookFinding } from './finding';
import { countColumnIds, COUNTED_OUTCOME_LEVEL_IDS } from './propose-layout';

/** What is wrong in the columns that rows are counted by. */
export function validateLayout(codeBook: CodeBook): readonly CodeBookFinding[] {
  return [
    ...countColumnIds(codeBook.layout).flatMap((id) => validateCounted(codeBook, id)),
    ...validateDistinct(codeBook.layout),
    ...validateOutcome(codeBook),
  ];
}

function validateCounted(codeBook: CodeBook, id: string): readonly CodeBookFinding[] {
  const column = codeBook.columns.find((one) => one.id === id);
  const place = { path: 'layout', columnId: id };
  if (column === undefined || id === COUNTED_OUTCOME_COLUMN_ID) {
    const message = 'The column that the rows are counted by is not among the columns.';
    return [refusal('layoutColumnUnknown', message, place)];
  }
  if (column.kind === 'count') return [];
  const message = `The rows are counted by "${column.label}", so its kind has to be a count.`;
  return [refusal('layoutColumnNotCount', message, place)];
}

function validateDistinct(layout: CountLayout): readonly CodeBookFinding[] {
  const [first, second] = countColumnIds(layout);
  if (first === undefined || first !== second) return [];
  const message = 'Choose two different columns for the two counts.';
  return [refusal('layoutColumnTwice', message, { path: 'layout', columnId: first })];
}

function validateOutcome(codeBook: CodeBook): readonly CodeBookFinding[] {
  const index = codeBook.columns.findIndex(({ id }) => id === COUNTED_OUTCOME_COLUMN_ID);
  const outcome = codeBook.columns[index];
  const called = countColumnIds(codeBook.layout).length === 2;
  const place = { path: `columns.${String(index)}`, columnId: COUNTED_OUTCOME_COLUMN_ID };
  if (outcome === undefined) return called ? [missingOutcome()] : [];
  if (called) return validateOutcomeLevels(outcome, place.path);
  const message = `The column "${outcome.label}" is for two count columns only. Remove it.`;
  return [refusal('outcomeColumnUncalledFor', message, place)];
}

function missingOutcome(): CodeBookFinding {
  const message = 'Two count columns need the outcome column that they stand for.';
  return refusal('outcomeColumnMissing', message, { path: 'columns' });
}

function validateOutcomeLevels(outcome: CodeBookColumn, path: string): readonly CodeBookFinding[] {
  const ids = outcome.levels.map(({ id }) => id).sort();
  const right = ids.length === 2 && COUNTED_OUTCOME_LEVEL_IDS.every((id) => ids.includes(id));
  if (right && outcome.kind === 'category') return [];
  const message =
    'The outcome that two count columns stand for is a category with exactly two levels, ' +
    'the event and its absence.';
  return [refusal('outcomeLevelsChanged', message, { path, columnId: outcome.id })];
}
