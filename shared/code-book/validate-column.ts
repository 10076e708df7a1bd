import { COUNTED_OUTCOME_COLUMN_ID, type CodeBookColumn } from './code-book';
import { FACTOR_SOURCE, factorLevels } from './factor-levels';
import { caution, refusal, repeated, type CodeBookFinding } from './finding';
import { validateBands } from './validate-bands';

/** What is wrong or odd within one column; `path` leads to the column. */
export function validateColumn(column: CodeBookColumn, path: string): readonly CodeBookFinding[] {
  return [
    ...validateIds(column, path),
    ...validateCodes(column, path),
    ...validateMissingCodes(column, path),
    ...validateBands(column, path),
    ...validateReference(column, path),
    ...validateLevels(column, path),
  ];
}

function validateIds(column: CodeBookColumn, path: string): readonly CodeBookFinding[] {
  return repeated([...column.levels, ...column.bands], ({ id }) => id).map(({ member }) =>
    refusal('levelIdTwice', `Two levels of "${column.label}" have the id "${member.id}".`, {
      path,
      columnId: column.id,
      levelId: member.id,
    }),
  );
}

function validateCodes(column: CodeBookColumn, path: string): readonly CodeBookFinding[] {
  const codes = column.levels.flatMap((level, index) =>
    level.codes.map((code) => ({ code, level, index })),
  );
  return repeated(codes, ({ code }) => code).map(({ member: { code, level, index } }) =>
    refusal(
      'codeInTwoLevels',
      `${shown(code)} stands for two levels of "${column.label}", "${level.label}" among them.`,
      {
        path: `${path}.levels.${String(index)}.codes`,
        columnId: column.id,
        levelId: level.id,
        value: code,
      },
    ),
  );
}

function validateMissingCodes(column: CodeBookColumn, path: string): readonly CodeBookFinding[] {
  const place = { path: `${path}.missingCodes`, columnId: column.id };
  const twice = repeated(column.missingCodes, ({ code }) => code).map(({ member: { code } }) =>
    refusal('missingCodeTwice', `${shown(code)} is marked missing twice in "${column.label}".`, {
      ...place,
      value: code,
    }),
  );
  const levelCodes = new Set(column.levels.flatMap(({ codes }) => codes));
  const both = column.missingCodes
    .filter(({ code }) => levelCodes.has(code))
    .map(({ code }) =>
      refusal(
        'codeBothLevelAndMissing',
        `${shown(code)} is marked missing in "${column.label}" and stands for a level too.`,
        { ...place, value: code },
      ),
    );
  return [...twice, ...both];
}

function validateReference(column: CodeBookColumn, path: string): readonly CodeBookFinding[] {
  const reference = column.referenceLevelId;
  const levels = [...column.levels, ...column.bands];
  if (reference === null || levels.some(({ id }) => id === reference)) return [];
  const message = `The reference of "${column.label}" is not one of its levels.`;
  return [
    refusal('referenceUnknown', message, {
      path: `${path}.referenceLevelId`,
      columnId: column.id,
      levelId: reference,
    }),
  ];
}

function validateLevels(column: CodeBookColumn, path: string): readonly CodeBookFinding[] {
  const place = { path: `${path}.levels`, columnId: column.id };
  const levels = factorLevels(column);
  if (FACTOR_SOURCE[column.kind] === 'levels' && levels.length === 0) {
    return [caution('noLevels', `"${column.label}" is a category without levels.`, place)];
  }
  return [...validateLabels(column, place.path), ...levelsWithoutCodes(column, place.path)];
}

function validateLabels(column: CodeBookColumn, path: string): readonly CodeBookFinding[] {
  return repeated(factorLevels(column), ({ label }) => label).map(({ member: { id, label } }) =>
    caution('labelTwice', `Two levels of "${column.label}" are both called "${label}".`, {
      path,
      columnId: column.id,
      levelId: id,
    }),
  );
}

function levelsWithoutCodes(column: CodeBookColumn, path: string): readonly CodeBookFinding[] {
  if (column.id === COUNTED_OUTCOME_COLUMN_ID) return [];
  return column.levels
    .filter(({ codes }) => codes.length === 0)
    .map(({ id, label }) =>
      caution(
        'levelWithoutCodes',
        `The level "${label}" of "${column.label}" stands for no value of the file.`,
        { path, columnId: column.id, levelId: id },
      ),
    );
}

function shown(code: string): string {
  return code.trim() === '' ? 'The blank' : `"${code}"`;
}
