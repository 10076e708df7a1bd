import type { ResultScope } from '#shared/analysis';
import { layerAt } from '#shared/analysis';
import { EFFECT_MEASURES, type EffectMeasureId } from '#shared/effects';
import { DIFFERENCE_SCALES, formatShareLimit, joinLimits } from '#shared/format';
import { type IntervalMethod, type Interval, RISK_INTERVALS } from '#shared/stats';
import type { Estimand } from '../draft/analysis-draft';
import { type IntervalAxis, linearAxis, logarithmicAxis } from '../interval-methods/interval-axis';
import { type BenchPrint, estimateText, notEstimable } from './bench-print';
import { tableAt } from './estimate-rows';

/** One interval method for the contrast in view. */
export interface MethodRow {
  readonly methodId: string;
  readonly name: string;
  readonly citation: string;
  readonly isChosen: boolean;
  /** Where limits and estimate lie on the axis, 0..1; null where the method gives none. */
  readonly drawn: { readonly from: number; readonly at: number; readonly to: number } | null;
  /** The printed limits, or why there are none. */
  readonly limits: string;
}

/** The methods for one estimand beside each other on one axis. */
export interface MethodGroup {
  readonly estimand: Estimand;
  readonly scale: 'difference' | 'ratio' | 'share';
  readonly value: string;
  readonly axis: IntervalAxis;
  readonly rows: readonly MethodRow[];
}

/** The methods for the measures of a contrast; null where there is no contrast. */
export function measureGroups(
  print: BenchPrint,
  measures: readonly EffectMeasureId[],
  scope: ResultScope,
  levelId: string | null,
): readonly MethodGroup[] {
  return measures.flatMap((id) => {
    const group = measureGroup(print, id, scope, levelId);
    return group === null ? [] : [group];
  });
}

function measureGroup(
  print: BenchPrint,
  measure: EffectMeasureId,
  scope: ResultScope,
  levelId: string | null,
): MethodGroup | null {
  const table = tableAt(print, scope, levelId);
  const estimate = layerAt(print.result, scope)?.contrasts.find(
    ({ indexLevelId }) => indexLevelId === levelId,
  )?.measures[measure];
  if (table === undefined || estimate === undefined) return null;
  const { level, methods } = print.result.specification;
  const scale = measureScale(print, measure);
  const value = estimate.ok ? estimate.value.value : null;
  return group(print, {
    estimand: measure,
    scale: EFFECT_MEASURES[measure].scale,
    factor: scale,
    value,
    methods: Object.values(EFFECT_MEASURES[measure].intervals),
    chosenId: methods[measure],
    intervalOf: (method) => method.interval(table, level),
    printed: (interval) => {
      const text = estimateText(print, measure, { value: value ?? 0, interval }, table);
      return {
        value: text.value.text,
        limits: joinLimits(text.lower.text, text.upper.text, print.style),
      };
    },
  });
}

/** The methods for the risk of the level in view. */
export function riskGroup(
  print: BenchPrint,
  scope: ResultScope,
  levelId: string | null,
): MethodGroup | null {
  const level = layerAt(print.result, scope)?.levels.find((each) => each.levelId === levelId);
  if (level === undefined || level.count.total === 0) return null;
  const { specification } = print.result;
  const { percent } = print.decimals;
  const share = (value: number): string => formatShareLimit(value, percent, print.style).text;
  const value = level.count.events / level.count.total;
  return group(print, {
    estimand: 'risk',
    scale: 'share',
    factor: 100,
    value,
    methods: Object.values(RISK_INTERVALS),
    chosenId: specification.methods.risk,
    intervalOf: (method) => method.interval(level.count, specification.level),
    printed: ({ lower, upper }) => ({
      value: share(value),
      limits: joinLimits(share(lower), share(upper), print.style),
    }),
  });
}

interface GroupParts<Counts> {
  readonly estimand: Estimand;
  readonly scale: MethodGroup['scale'];
  /** Axis units in one unit of the estimand: 100 for percentage points. */
  readonly factor: number;
  readonly value: number | null;
  readonly methods: readonly IntervalMethod<Counts>[];
  readonly chosenId: string;
  readonly intervalOf: (
    method: IntervalMethod<Counts>,
  ) => ReturnType<IntervalMethod<Counts>['interval']>;
  readonly printed: (interval: Interval) => { readonly value: string; readonly limits: string };
}

function group<Counts>(print: BenchPrint, parts: GroupParts<Counts>): MethodGroup {
  const intervals = parts.methods.map((method) => ({ method, interval: parts.intervalOf(method) }));
  const found = intervals.flatMap(({ interval }) => (interval.ok ? [interval.value] : []));
  const axis = axisFor(parts, found);
  const place = (value: number): number => axis.at(value * parts.factor);
  const [first] = found;
  return {
    estimand: parts.estimand,
    scale: parts.scale,
    value: first === undefined || parts.value === null ? '' : parts.printed(first).value,
    axis,
    rows: intervals.map(({ method, interval }) => ({
      methodId: method.id,
      name: method.label,
      citation: method.citation,
      isChosen: method.id === parts.chosenId,
      drawn:
        interval.ok && parts.value !== null
          ? {
              from: place(interval.value.lower),
              at: place(parts.value),
              to: place(interval.value.upper),
            }
          : null,
      limits: interval.ok
        ? parts.printed(interval.value).limits
        : notEstimable(print, interval.issue),
    })),
  };
}

function axisFor<Counts>(
  { scale, factor, value }: GroupParts<Counts>,
  intervals: readonly Interval[],
): IntervalAxis {
  const values = [
    ...intervals.flatMap(({ lower, upper }) => [lower, upper]),
    ...(value === null ? [] : [value]),
  ].map((each) => each * factor);
  return scale === 'ratio'
    ? logarithmicAxis(values.filter((each) => each > 0))
    : linearAxis(values);
}

function measureScale({ style }: BenchPrint, measure: EffectMeasureId): number {
  return measure === 'riskDifference' ? DIFFERENCE_SCALES[style.difference.unit].scale : 1;
}
