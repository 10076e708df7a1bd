import { failure, success } from '#shared/core';
import type { Result } from '#shared/core';
import { partStrata } from '#shared/stats';
import type { Estimate, EstimationIssue, FourfoldTable, IntervalMethod } from '#shared/stats';
import type { EffectMeasure, EffectScale, ExactFraction } from './effect-measure';

/** What a measure's file states; the rest follows from its scale. */
export interface MeasureParts extends Omit<
  EffectMeasure,
  'nullValue' | 'estimate' | 'fraction' | 'reverse' | 'uninformative'
> {
  readonly valueOf: (table: FourfoldTable) => number;
  readonly fractionOf: (table: FourfoldTable) => ExactFraction;
  /** Why a stratum tells nothing about the pooled estimate, or null. */
  readonly issueOfStratum: (table: FourfoldTable) => EstimationIssue | null;
}

/** Makes a measure of its parts. */
export function makeMeasure(parts: MeasureParts): EffectMeasure {
  const { valueOf, fractionOf, issueOfStratum, ...stated } = parts;
  return {
    ...stated,
    nullValue: NULL_VALUES[parts.scale],
    estimate: (table, intervalId, level) =>
      estimateBy(methodOf(parts, intervalId), valueOf, table, level),
    fraction: (table, intervalId) =>
      parts.intervals[intervalId ?? '']?.pointOf ? null : safeFraction(fractionOf(table)),
    uninformative: (strata) => partStrata(strata, issueOfStratum).leftOut,
    reverse: REVERSES[parts.scale],
  };
}

const NULL_VALUES: Readonly<Record<EffectScale, number>> = { difference: 0, ratio: 1 };

function methodOf(parts: MeasureParts, intervalId: string): IntervalMethod<FourfoldTable> {
  const method = Object.hasOwn(parts.intervals, intervalId) ? parts.intervals[intervalId] : null;
  if (!method) {
    throw new Error(`No interval method ${intervalId} for ${parts.id}`);
  }
  return method;
}

function estimateBy(
  method: IntervalMethod<FourfoldTable>,
  valueOf: (table: FourfoldTable) => number,
  table: FourfoldTable,
  level: number,
): Result<Estimate, EstimationIssue> {
  const interval = method.interval(table, level);
  const pointOf = method.pointOf ?? valueOf;
  return interval.ok ? success({ value: pointOf(table), interval: interval.value }) : interval;
}

function safeFraction({ numerator, denominator }: ExactFraction): ExactFraction | null {
  const safe = Number.isSafeInteger(numerator) && Number.isSafeInteger(denominator);
  return safe && denominator > 0 ? { numerator, denominator } : null;
}

const REVERSES: Readonly<
  Record<EffectScale, (estimate: Estimate) => Result<Estimate, EstimationIssue>>
> = {
  difference: ({ value, interval }) =>
    success({
      value: 0 - value,
      interval: { ...interval, lower: 0 - interval.upper, upper: 0 - interval.lower },
    }),
  ratio: ({ value, interval }) =>
    interval.lower > 0
      ? success({
          value: 1 / value,
          interval: { ...interval, lower: 1 / interval.upper, upper: 1 / interval.lower },
        })
      : failure({ code: 'zeroCell' }),
};
