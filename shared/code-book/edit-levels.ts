import { failure, success, type Issue, type Result } from '#shared/core';
import type { CodeBookColumn, CodeBookLevel } from './code-book';
import { levelsOfCodes } from './propose-column';

/** Why an edit of the code book can't be made; `codeBookEditMessage` puts it into words. */
export type CodeBookEditIssue = Issue<
  | 'unknownLevel'
  | 'unknownCode'
  | 'unknownReference'
  | 'tooFewLevelsToMerge'
  | 'levelIsNotMerged'
  | 'cutPointsNeeded'
  | 'cutPointsNotAscending'
  | 'reasonNeeded'
>;

/** A column after an edit, or why the edit can't be made. */
export type EditedColumn = Result<CodeBookColumn, CodeBookEditIssue>;

/** The words of a level or band; what is left out stays. */
export interface LevelWords {
  readonly label?: string;
  readonly sentenceLabel?: string;
}

/** The column with other words for one of its levels or bands. */
export function renameLevel(
  column: CodeBookColumn,
  levelId: string,
  words: LevelWords,
): EditedColumn {
  const known = [...column.levels, ...column.bands].some(({ id }) => id === levelId);
  if (!known) return unknownLevel(column, levelId);
  return success({
    ...column,
    levels: column.levels.map((level) => (level.id === levelId ? { ...level, ...words } : level)),
    bands: column.bands.map((band) => (band.id === levelId ? { ...band, ...words } : band)),
  });
}

/** The column with a level moved to a place of the print order, counted from 0. */
export function moveLevel(column: CodeBookColumn, levelId: string, to: number): EditedColumn {
  const level = column.levels.find(({ id }) => id === levelId);
  if (level === undefined) return unknownLevel(column, levelId);
  const others = column.levels.filter((other) => other !== level);
  const place = Math.max(0, Math.min(to, others.length));
  return success({ ...column, levels: others.toSpliced(place, 0, level) });
}

/**
 * The column with several levels made one, which stands where the first of them stood.
 *
 * The merged level keeps the id of `levelIds[0]`, so that what refers to it still does; a
 * reference among the merged levels follows.
 */
export function mergeLevels(
  column: CodeBookColumn,
  levelIds: readonly string[],
  words: LevelWords,
): EditedColumn {
  const [keptId] = levelIds;
  if (keptId === undefined || new Set(levelIds).size < 2) return tooFewLevels();
  const unknown = levelIds.find((id) => !column.levels.some((level) => level.id === id));
  if (unknown !== undefined) return unknownLevel(column, unknown);
  const merged = column.levels.filter(({ id }) => levelIds.includes(id));
  const into = intoOne(merged, keptId, words);
  const place = column.levels.findIndex(({ id }) => levelIds.includes(id));
  const rest = column.levels.filter(({ id }) => !levelIds.includes(id));
  return success({
    ...column,
    levels: rest.toSpliced(place, 0, into),
    referenceLevelId: levelIds.includes(column.referenceLevelId ?? '')
      ? keptId
      : column.referenceLevelId,
  });
}

function tooFewLevels(): EditedColumn {
  return failure({ code: 'tooFewLevelsToMerge' });
}

function intoOne(
  merged: readonly CodeBookLevel[],
  keptId: string,
  words: LevelWords,
): CodeBookLevel {
  return {
    id: keptId,
    codes: merged.flatMap(({ codes }) => codes),
    label: words.label ?? joined(merged.map(({ label }) => label)),
    sentenceLabel: words.sentenceLabel ?? joined(merged.map(({ sentenceLabel }) => sentenceLabel)),
  };
}

function joined(labels: readonly string[]): string {
  const last = labels.at(-1) ?? '';
  return labels.length < 2 ? last : `${labels.slice(0, -1).join(', ')} or ${last}`;
}

/**
 * The column with a merged level taken apart, a level for each of its codes.
 *
 * The code that the level's id was made from keeps that id, else the first code does; the others
 * get the ids that their codes always get.
 */
export function splitLevel(column: CodeBookColumn, levelId: string): EditedColumn {
  const place = column.levels.findIndex(({ id }) => id === levelId);
  const level = column.levels[place];
  if (level === undefined) return unknownLevel(column, levelId);
  if (level.codes.length < 2) return failure({ code: 'levelIsNotMerged', facts: { levelId } });
  return success({
    ...column,
    levels: column.levels.toSpliced(place, 1, ...takenApart(column, level)),
  });
}

function takenApart(column: CodeBookColumn, level: CodeBookLevel): readonly CodeBookLevel[] {
  const fresh = levelsOfCodes(level.codes);
  const heir = Math.max(
    0,
    fresh.findIndex(({ id }) => id === level.id),
  );
  const taken = [...column.levels, ...column.bands].map(({ id }) => id);
  const others = levelsOfCodes(level.codes.toSpliced(heir, 1), taken);
  const kept = fresh.slice(heir, heir + 1).map((one) => ({ ...one, id: level.id }));
  return others.toSpliced(heir, 0, ...kept);
}

/** The column with another reference level or band, or with none (null). */
export function setReference(column: CodeBookColumn, levelId: string | null): EditedColumn {
  const known = [...column.levels, ...column.bands].some(({ id }) => id === levelId);
  if (levelId !== null && !known) return unknownReference(column, levelId);
  return success({ ...column, referenceLevelId: levelId });
}

function unknownLevel(column: CodeBookColumn, levelId: string): EditedColumn {
  return failure({ code: 'unknownLevel', facts: { column: column.label, levelId } });
}

function unknownReference(column: CodeBookColumn, levelId: string): EditedColumn {
  return failure({ code: 'unknownReference', facts: { column: column.label, levelId } });
}
