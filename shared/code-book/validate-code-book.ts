import type { CodeBook } from './code-book';
import { refusal, repeated, type CodeBookFinding } from './finding';
import { validateAgainstData, type DataValues } from './validate-against-data';
import { validateColumn } from './validate-column';
import { validateLayout } from './validate-layout';

/**
 * What is wrong or odd in a code book, refusals first, in plain words; empty when all is well.
 *
 * With the values of a data cut it also says which columns, levels and values do not meet, and
 * whether the counts can be counts.
 */
export function validateCodeBook(
  codeBook: CodeBook,
  data?: DataValues,
): readonly CodeBookFinding[] {
  const findings = [
    ...validateIdentity(codeBook),
    ...validateLayout(codeBook),
    ...codeBook.columns.flatMap((column, index) =>
      validateColumn(column, `columns.${String(index)}`),
    ),
    ...(data === undefined ? [] : validateAgainstData(codeBook, data)),
  ];
  return [...bySeverity(findings, 'refusal'), ...bySeverity(findings, 'caution')];
}

function bySeverity(
  findings: readonly CodeBookFinding[],
  severity: CodeBookFinding['severity'],
): readonly CodeBookFinding[] {
  return findings.filter((finding) => finding.severity === severity);
}

function validateIdentity({ columns }: CodeBook): readonly CodeBookFinding[] {
  const ids = repeated(columns, ({ id }) => id).map(({ member, index }) =>
    refusal('columnIdTwice', `Two columns have the id "${member.id}".`, {
      path: `columns.${String(index)}.id`,
      columnId: member.id,
    }),
  );
  const names = repeated(columns, ({ name }) => name).map(({ member, index }) =>
    refusal('columnNameTwice', `Two columns stand for "${member.name}" of the file.`, {
      path: `columns.${String(index)}.name`,
      columnId: member.id,
    }),
  );
  return [...ids, ...names];
}
