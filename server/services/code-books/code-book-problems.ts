import type { CodeBookFinding } from '#shared/code-book';
import type { FieldProblem } from '../../errors/server-issue';

const MOST_PROBLEMS = 50;

/** What keeps a code book from being used, by field of a request; cautions do not. */
export function codeBookProblems(
  findings: readonly CodeBookFinding[],
  field: string,
): readonly FieldProblem[] {
  return findings
    .filter(({ severity }) => severity === 'refusal')
    .slice(0, MOST_PROBLEMS)
    .map(({ path, message }) => ({ path: `${field}.${path}`, message }));
}
