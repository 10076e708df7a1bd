import type { CodeBook } from '#shared/code-book';
import { refuse } from '../../errors/server-issue';
import type { CodeBookVersion } from '../../models/code-book/code-book-store';

/** Refuses a code book that was made from an older version, with both of them. */
export function refuseStaleCodeBook(
  { dataSetId, number, content }: CodeBookVersion,
  yours: CodeBook,
): ReturnType<typeof refuse> {
  return refuse('staleCodeBook', {
    facts: { number, yours, theirs: { dataSetId, number, content } },
  });
}
