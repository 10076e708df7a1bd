import { failure, success } from '#shared/core';
import type { CodeBookColumn } from './code-book';
import type { EditedColumn } from './edit-levels';
import { levelsOfCodes } from './propose-column';

/**
 * The column with a code marked as no answer, for a reason in words.
 *
 * The code leaves its level; a level without codes goes, and a reference to it with it. Marking
 * again changes the reason.
 */
export function markMissing(column: CodeBookColumn, code: string, reason: string): EditedColumn {
  const words = reason.trim();
  if (words === '') return failure({ code: 'reasonNeeded', facts: { code } });
  const others = column.missingCodes.filter((missing) => missing.code !== code);
  return success(
    withoutLostReference({
      ...column,
      levels: withoutCode(column, code),
      missingCodes: [...others, { code, reason: words }],
    }),
  );
}

function withoutCode(column: CodeBookColumn, code: string): CodeBookColumn['levels'] {
  return column.levels.flatMap((level) => {
    if (!level.codes.includes(code)) return [level];
    const codes = level.codes.filter((other) => other !== code);
    return codes.length === 0 ? [] : [{ ...level, codes }];
  });
}

function withoutLostReference(column: CodeBookColumn): CodeBookColumn {
  const known = [...column.levels, ...column.bands].some(
    ({ id }) => id === column.referenceLevelId,
  );
  return known ? column : { ...column, referenceLevelId: null };
}

/** The column with a missing code made an ordinary level again, last in the print order. */
export function unmarkMissing(column: CodeBookColumn, code: string): EditedColumn {
  if (!column.missingCodes.some((missing) => missing.code === code)) {
    return failure({ code: 'unknownCode', facts: { code } });
  }
  const taken = [...column.levels, ...column.bands].map(({ id }) => id);
  return success({
    ...column,
    levels: [...column.levels, ...levelsOfCodes([code], taken)],
    missingCodes: column.missingCodes.filter((missing) => missing.code !== code),
  });
}
