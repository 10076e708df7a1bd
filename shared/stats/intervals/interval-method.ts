import { failure, success } from '#shared/core';
import type { Result } from '#shared/core';
import { issueOfLevel } from '../check-counts';
import { criticalValue } from '../distributions';
import type { EstimationIssue, Interval } from '../estimate';
import type { MethodEffort } from '../method-effort';

/** Lower and upper limit on the scale of the estimand; a ratio's upper one may be infinite. */
export type Limits = readonly [lower: number, upper: number];

/** A method's words: how lists, tables and the methods note name it. */
export interface MethodWords {
  readonly id: string;
  /** Full name, for lists and the methods note: "Newcombe hybrid score". */
  readonly label: string;
  /** Name for table heads and notes: "Newcombe". */
  readonly shortLabel: string;
  readonly citation: string;
}

/**
 * A way to put an interval around an estimand, a member of one of the registers.
 *
 * `interval` takes counts and a level (0.95) and gives finite limits, lower first, that hold the
 * estimate; or the issue that says why the method is not defined for these counts. A ratio whose
 * upper limit is infinite gives `zeroCell`, with the fact `atLeast` where the method has a lower
 * limit above 0.
 */
export interface IntervalMethod<Counts> extends MethodWords {
  readonly effort: MethodEffort;
  /** The largest group that the method accepts; null where any size will do. */
  readonly groupCap: number | null;
  interval(counts: Counts, level: number): Result<Interval, EstimationIssue>;
  /**
   * The method's own point estimate, of a method that does not go with the sample's value; from 0
   * to infinity, NaN where the counts tell nothing.
   */
  readonly pointOf?: (counts: Counts) => number;
}

/** What a method's file states; `limits` is asked for counts that passed `issueOf` only. */
export interface IntervalMethodParts<Counts, Id extends string> extends MethodWords {
  readonly id: Id;
  /** Light where nothing is said. */
  readonly effort?: MethodEffort;
  /** No cap where nothing is said; the check itself belongs to `issueOf`. */
  readonly groupCap?: number;
  readonly pointOf?: (counts: Counts) => number;
  limits(counts: Counts, z: number, level: number): Limits;
}

/**
 * Makes a method of its parts: the checks that every method of an estimand shares, the normal
 * quantile, and finite limits only.
 */
export function intervalMethod<Counts, Id extends string>(
  issueOf: (counts: Counts) => EstimationIssue | null,
  parts: IntervalMethodParts<Counts, Id>,
): IntervalMethod<Counts> & { readonly id: Id } {
  const { id, label, shortLabel, citation, effort = 'light', groupCap = null, pointOf } = parts;
  return {
    id,
    label,
    shortLabel,
    citation,
    effort,
    groupCap,
    ...(pointOf && { pointOf }),
    interval(counts, level) {
      const issue = issueOfLevel(level) ?? issueOf(counts);
      if (issue) {
        return failure(issue);
      }
      const [lower, upper] = parts.limits(counts, criticalValue(level), level);
      const finite = Number.isFinite(lower) && Number.isFinite(upper);
      return finite ? success({ lower, upper, level, method: id }) : failure(unboundedIssue(lower));
    },
  };
}

/** Limits that JSON cannot hold: no interval, but what is known from below is kept. */
function unboundedIssue(lower: number): EstimationIssue {
  return Number.isFinite(lower) && lower > 0
    ? { code: 'zeroCell', facts: { atLeast: lower } }
    : { code: 'zeroCell' };
}
