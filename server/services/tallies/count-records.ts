import type { CodeBook } from '#shared/code-book';
import { tallyIssueMessage, type Tally, type TallyRequest } from '#shared/tally';
import type { Dependencies } from '../../dependencies';
import { refuse, type Outcome } from '../../errors/server-issue';

/**
 * Counts a ready cut under a code book; where that can't be done, `countsNotUsable` says why.
 *
 * Call it outside a unit of work, since fresh counts are stored.
 */
export async function countRecords(
  { counting }: Dependencies,
  cutId: string,
  codeBook: CodeBook,
  request: TallyRequest,
): Promise<Outcome<Tally>> {
  const tally = await counting.count(cutId, codeBook, request);
  if (tally.ok) return tally;
  const { code, facts } = tally.issue;
  const detail = tallyIssueMessage(tally.issue);
  return refuse('countsNotUsable', { detail, facts: { ...facts, issue: code } });
}
