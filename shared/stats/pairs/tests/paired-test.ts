import { failure, success } from '#shared/core';
import type { Result } from '#shared/core';
import type { EstimationIssue, TestOutcome } from '../../estimate';
import type { MethodWords } from '../../intervals/interval-method';
import type { PairedTable } from '../paired-table';
import { issueOfDiscordance } from '../paired-table';

/**
 * A test of whether the event is as frequent in the first members of pairs as in the second; a
 * member of PAIRED_TESTS.
 *
 * `test` takes the pairs' counts; gives two-sided p. No pair whose members differ gives
 * `noDiscordantPairs`, no pairs `emptyGroup`.
 */
export interface PairedTest extends MethodWords {
  test(table: PairedTable): Result<TestOutcome, EstimationIssue>;
}

/** What a test's file states; `outcome` is asked for at least one discordant pair. */
export interface PairedTestParts<Id extends string> extends MethodWords {
  readonly id: Id;
  readonly outcome: (table: PairedTable) => Omit<TestOutcome, 'method'>;
}

/** Makes a test of its parts. */
export function pairedTest<Id extends string>({
  outcome,
  ...words
}: PairedTestParts<Id>): PairedTest & { readonly id: Id } {
  return {
    ...words,
    test(table) {
      const issue = issueOfDiscordance(table);
      return issue ? failure(issue) : success({ method: words.id, ...outcome(table) });
    },
  };
}
