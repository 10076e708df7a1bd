import type { Result } from '#shared/core';
import type { Estimate, EstimationIssue, MethodWords } from '#shared/stats';
import type { Estimand } from '../draft/analysis-draft';
import { type IntervalAxis, linearAxis, logarithmicAxis } from '../interval-methods/interval-axis';
import { type BenchPrint, notEstimable } from '../print/bench-print';
import type { MethodQuestion } from './method-question';

/** One method for the contrast in view. */
export interface MethodRow {
  readonly methodId: string;
  readonly name: string;
  readonly citation: string;
  readonly isChosen: boolean;
  /** Where limits and estimate lie on the axis, 0..1; null where the method gives none. */
  readonly drawn: { readonly from: number; readonly at: number; readonly to: number } | null;
  /** The printed limits, or why there are none; null while they are not computed. */
  readonly limits: string | null;
  /** What to ask for, of a method that takes its time and was not computed yet. */
  readonly question: MethodQuestion | null;
}

/** The methods for one estimand beside each other on one axis. */
export interface MethodGroup {
  readonly estimand: Estimand;
  readonly scale: 'difference' | 'ratio' | 'share';
  readonly value: string;
  readonly axis: IntervalAxis;
  readonly rows: readonly MethodRow[];
}

/** What a method gave, or what to ask for where it has not been computed. */
export type MethodAnswer =
  | { readonly kind: 'computed'; readonly estimate: Result<Estimate, EstimationIssue> }
  | { readonly kind: 'open'; readonly question: MethodQuestion };

/** What a group is made of. */
export interface GroupParts<Method extends MethodWords> {
  readonly estimand: Estimand;
  readonly scale: MethodGroup['scale'];
  /** Axis units in one unit of the estimand: 100 for percentage points. */
  readonly factor: number;
  readonly methods: readonly Method[];
  /** How a row names its method; its label where nothing is said. */
  readonly nameOf?: (method: Method) => string;
  readonly chosenId: string;
  readonly answerOf: (method: Method) => MethodAnswer;
  readonly printed: (estimate: Estimate) => { readonly value: string; readonly limits: string };
}

/** Lays methods beside each other; the group's value is the chosen method's. */
export function methodGroup<Method extends MethodWords>(
  print: BenchPrint,
  parts: GroupParts<Method>,
): MethodGroup {
  const answers = parts.methods.map((method) => ({ method, answer: parts.answerOf(method) }));
  const axis = axisFor(
    parts,
    answers.flatMap(({ answer }) => computedOf(answer)),
  );
  const chosen = answers.find(({ method }) => method.id === parts.chosenId)?.answer;
  const [value] = chosen === undefined ? [] : computedOf(chosen);
  return {
    estimand: parts.estimand,
    scale: parts.scale,
    value: value === undefined ? '' : parts.printed(value).value,
    axis,
    rows: answers.map(({ method, answer }) => ({
      methodId: method.id,
      name: (parts.nameOf ?? labelOf)(method),
      citation: method.citation,
      isChosen: method.id === parts.chosenId,
      drawn: drawnOn(axis, parts.factor, answer),
      limits: limitsWords(print, parts, answer),
      question: answer.kind === 'open' ? answer.question : null,
    })),
  };
}

function labelOf({ label }: MethodWords): string {
  return label;
}

function computedOf(answer: MethodAnswer): readonly Estimate[] {
  return answer.kind === 'computed' && answer.estimate.ok ? [answer.estimate.value] : [];
}

function drawnOn(axis: IntervalAxis, factor: number, answer: MethodAnswer): MethodRow['drawn'] {
  const [estimate] = computedOf(answer);
  if (estimate === undefined) return null;
  const { value, interval } = estimate;
  const place = (each: number): number => axis.at(each * factor);
  return { from: place(interval.lower), at: place(value), to: place(interval.upper) };
}

function limitsWords<Method extends MethodWords>(
  print: BenchPrint,
  { printed }: GroupParts<Method>,
  answer: MethodAnswer,
): string | null {
  if (answer.kind === 'open') return null;
  const { estimate } = answer;
  return estimate.ok ? printed(estimate.value).limits : notEstimable(print, estimate.issue);
}

function axisFor<Method extends MethodWords>(
  { scale, factor }: GroupParts<Method>,
  estimates: readonly Estimate[],
): IntervalAxis {
  const values = estimates
    .flatMap(({ value, interval }) => [value, interval.lower, interval.upper])
    .map((each) => each * factor);
  return scale === 'ratio'
    ? logarithmicAxis(values.filter((each) => each > 0))
    : linearAxis(values);
}
