import {
  type CodeBookColumn,
  COUNTED_OUTCOME_COLUMN_ID,
  type FactorLevel,
} from '#shared/code-book';

const EVENT_WORDS = /^(yes|y|true|1|case|cases|event|died|dead|positive|ill|infected)$/i;

/**
 * The levels that plainly count as the event: the only one with a word for it, or the only one that
 * is not the reference level. None where a person has to say it.
 */
export function likelyEventLevels(
  levels: readonly FactorLevel[],
  column: CodeBookColumn,
): readonly string[] {
  if (column.id === COUNTED_OUTCOME_COLUMN_ID) return levels.slice(0, 1).map(({ id }) => id);
  const worded = levels.filter((level) => isEventWord(level, column));
  if (worded.length === 1) return worded.map(({ id }) => id);
  const others = levels.filter(({ id }) => id !== column.referenceLevelId);
  return others.length === 1 && levels.length === 2 ? others.map(({ id }) => id) : [];
}

function isEventWord(level: FactorLevel, column: CodeBookColumn): boolean {
  const codes = column.levels.find(({ id }) => id === level.id)?.codes ?? [];
  return [level.label, ...codes].some((word) => EVENT_WORDS.test(word.trim()));
}
