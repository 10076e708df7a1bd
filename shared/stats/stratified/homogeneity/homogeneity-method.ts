import { failure, success } from '#shared/core';
import type { Result } from '#shared/core';
import { chiSquareOutcome } from '../../chi-square-outcome';
import type { EstimationIssue, TestOutcome } from '../../estimate';
import type { FourfoldTable, StratifiedTable } from '../../fourfold-table';
import type { MethodWords } from '../../intervals/interval-method';
import type { UnusedStratum } from '../strata-used';
import { invalidStratum, partStrata } from '../strata-used';

/** A test over strata with the strata that it could not use. */
export interface HomogeneityTest {
  readonly outcome: Result<TestOutcome, EstimationIssue>;
  readonly leftOut: readonly UnusedStratum[];
}

/**
 * A test of whether one measure is the same in all strata; a member of one of the registers.
 *
 * `test` takes events and totals by stratum; gives a chi-square statistic with one degree of
 * freedom less than strata used, or `fewerThanTwoStrata`, and names the strata left out.
 */
export interface HomogeneityMethod extends MethodWords {
  test(strata: StratifiedTable): HomogeneityTest;
}

/** What a method's file states; `statistic` is asked for two or more strata without issue. */
export interface HomogeneityParts<Id extends string> extends MethodWords {
  readonly id: Id;
  readonly issueOfStratum: (table: FourfoldTable) => EstimationIssue | null;
  readonly statistic: (used: StratifiedTable) => Result<number, EstimationIssue>;
}

/** Makes a method of its parts: what is left out, the degrees of freedom, the p-value. */
export function homogeneityMethod<Id extends string>(
  parts: HomogeneityParts<Id>,
): HomogeneityMethod & { readonly id: Id } {
  const { id, label, shortLabel, citation } = parts;
  return {
    id,
    label,
    shortLabel,
    citation,
    test(strata) {
      const { used, leftOut } = partStrata(strata, parts.issueOfStratum);
      const invalid = invalidStratum({ used, leftOut });
      return { outcome: invalid ? failure(invalid) : outcomeOf(parts, used), leftOut };
    },
  };
}

function outcomeOf(
  { id, statistic }: HomogeneityParts<string>,
  used: StratifiedTable,
): Result<TestOutcome, EstimationIssue> {
  if (used.length < 2) {
    return failure({ code: 'fewerThanTwoStrata', facts: { strata: used.length } });
  }
  const found = statistic(used);
  if (!found.ok) {
    return found;
  }
  return success(chiSquareOutcome(id, Math.max(0, found.value), used.length - 1));
}
