import { type CodeBookColumn, factorLevels } from '#shared/code-book';

/** Ways to name the people at a level, to pick from. */
export const GROUP_PATTERNS = [
  '{people} with {level}',
  '{people} who {level}',
  '{people} aged {level}',
  '{level} {people}',
  '{level}',
] as const;

/** Ways to name a stratum, to pick from. */
export const WITHIN_PATTERNS = [
  'in {level}',
  'among {level}',
  'at {level}',
  'aged {level}',
] as const;

/** What is wrong with a pattern; null when it can be used or is left out. */
export function patternProblem(pattern: string | null | undefined): string | null {
  const words = pattern?.trim() ?? '';
  return words === '' || words.includes('{level}')
    ? null
    : 'Write {level} where the level’s words go.';
}

/** A pattern that names its level; null where there is none that can be used. */
export function usablePattern(pattern: string | null | undefined): string | null {
  return pattern?.includes('{level}') === true ? pattern : null;
}

/** A pattern with its slots filled. */
export function filledPattern(pattern: string, level: string, people: string): string {
  return pattern.replaceAll('{people}', people).replaceAll('{level}', level);
}

/** The two levels that show best how a column reads: the last, and the reference or the first. */
export function shownLevels(column: CodeBookColumn): readonly string[] {
  const levels = factorLevels(column);
  const reference = levels.find(({ id }) => id === column.referenceLevelId) ?? levels[0];
  const others = levels.filter((level) => level !== reference);
  return [others.at(-1), reference].flatMap((level) =>
    level === undefined ? [] : [level.sentenceLabel],
  );
}
