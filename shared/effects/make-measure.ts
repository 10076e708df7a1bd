import { failure, success } from '#shared/core';
import type { Result } from '#shared/core';
import { partStrata } from '#shared/stats';
import type { Estimate, EstimationIssue, FourfoldTable, IntervalMethod } from '#shared/stats';
import type { EffectMeasure, EffectScale, ExactFraction } from './effect-measure';

/** What a measure's file states; the rest follows from its scale and its registers. */
export interface MeasureParts extends Omit<
  EffectMeasure,
  'nullValue' | 'estimate' | 'fraction' | 'reverse' | 'pooled' | 'uninformative' | 'homogeneity'
> {
  readonly valueOf: (table: FourfoldTable) => number;
  readonly fractionOf: (table: FourfoldTable) => ExactFraction;
}

/** Makes a measure of its parts. */
export function makeMeasure(parts: MeasureParts): EffectMeasure {
  const { valueOf, fractionOf, ...stated } = parts;
  const { intervals, poolings, homogeneities, id } = parts;
  return {
    ...stated,
    nullValue: NULL_VALUES[parts.scale],
    estimate: (table, intervalId, level) =>
      estimateBy(memberOf(intervals, intervalId, id), valueOf, table, level),
    fraction: (table, intervalId) =>
      intervals[intervalId ?? '']?.pointOf ? null : safeFraction(fractionOf(table)),
    pooled: (strata, level, poolingId = parts.defaultPoolingId) =>
      memberOf(poolings, poolingId, id).pooled(strata, level),
    uninformative: (strata, poolingId = parts.defaultPoolingId) => {
      const pooling = memberOf(poolings, poolingId, id);
      return partStrata(strata, (table) => pooling.issueOfStratum(table)).leftOut;
    },
    homogeneity: (strata, homogeneityId = parts.defaultHomogeneityId) =>
      memberOf(homogeneities, homogeneityId, id).test(strata),
    reverse: REVERSES[parts.scale],
  };
}

const NULL_VALUES: Readonly<Record<EffectScale, number>> = { difference: 0, ratio: 1 };

function memberOf<Method>(
  register: Readonly<Record<string, Method>>,
  methodId: string,
  measureId: string,
): Method {
  const method = Object.hasOwn(register, methodId) ? register[methodId] : undefined;
  if (method === undefined) {
    throw new Error(`No method ${methodId} for ${measureId}`);
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
