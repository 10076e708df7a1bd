import { setLayout, type CodeBook } from '#shared/code-book';

/** The code book of a file whose rows count events and totals. */
export function withEventsAndTotal(
  codeBook: CodeBook,
  eventsColumnId: string,
  totalColumnId: string,
): CodeBook {
  return setLayout(codeBook, { kind: 'eventsAndTotal', eventsColumnId, totalColumnId });
}
