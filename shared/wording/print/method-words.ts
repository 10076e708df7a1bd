import type { AnalysisResult } from '#shared/analysis';
import type { EffectMeasureId } from '#shared/effects';
import { EFFECT_MEASURES } from '#shared/effects';
import { POOLING_METHODS, RISK_INTERVALS, TEST_METHODS, type MethodWords } from '#shared/stats';
import { fillWords } from '../phrasebook/fill-pattern';
import { termsOf, type PrintContext } from './print-context';

/** The name of the interval method of the shares: "Wilson score". */
export function shareMethod({ specification }: AnalysisResult): string {
  return labelIn(RISK_INTERVALS, specification.methods.risk);
}

/** "Newcombe hybrid score for the risk difference; Katz log for the risk ratio". */
export function intervalMethodsWords(
  context: PrintContext,
  measures: readonly EffectMeasureId[],
): string {
  const methods = measures.map((id) => ({
    id,
    method: labelIn(EFFECT_MEASURES[id].intervals, context.result.specification.methods[id]),
  }));
  return methodsForMeasures(context, methods);
}

/** "Mantel–Haenszel (Sato) for the risk difference; …", for the measures that could be pooled. */
export function poolingMethodsWords(
  context: PrintContext,
  measures: readonly EffectMeasureId[],
): string {
  const { result } = context;
  const methods = measures.map((id) => {
    const estimate = result.pooled.map((contrast) => contrast.measures[id]).find(({ ok }) => ok);
    const method = estimate?.ok ? estimate.value.interval.method : null;
    return { id, method: method && nameIn(POOLING_METHODS, method, 'shortLabel') };
  });
  return methodsForMeasures(context, methods);
}

/** "… test of homogeneity for the risk difference and the risk ratio; …". */
export function homogeneityMethodsWords(
  context: PrintContext,
  measures: readonly EffectMeasureId[],
): string {
  const methods = measures.map((id) => ({ id, method: homogeneityMethod(context, id) }));
  return methodsForMeasures(context, methods);
}

/** The name of a test. */
export function testMethod(id: string): string {
  return labelIn(TEST_METHODS, id);
}

/** The name of the test of homogeneity of a measure; null where no contrast has it. */
export function homogeneityMethod(
  { result }: PrintContext,
  measure: EffectMeasureId,
): string | null {
  const tested = result.pooled
    .map(({ homogeneity }) => homogeneity[measure])
    .find((outcome) => outcome.ok);
  return tested?.ok ? testMethod(tested.value.method) : null;
}

/** Fewer levels have no trend to speak of. */
export const FEWEST_LEVELS_OF_A_TREND = 3;

/** The scores of the levels, in their order: "1, 2, 3". */
export function scoresWords({ result, book }: PrintContext): string {
  const { trendScores } = result.specification;
  const scores = result.frame.exposure.levels.map(
    ({ id }, place) => trendScores?.[id] ?? place + 1,
  );
  return scores.map(String).join(fillWords(book, 'list.comma', {}));
}

interface MeasureMethod {
  readonly id: EffectMeasureId;
  /** Null where the measure has none. */
  readonly method: string | null;
}

/** Each method once, with the measures that it serves. */
function methodsForMeasures(context: PrintContext, measures: readonly MeasureMethod[]): string {
  const { book } = context;
  const methods = [...new Set(measures.flatMap(({ method }) => method ?? []))];
  const said = methods.map((method) => {
    const served = measures.filter((measure) => measure.method === method);
    const names = served.map(({ id }) => termsOf(context).measures[id].name);
    return fillWords(book, 'note.method', {
      method,
      measure: names.join(fillWords(book, 'list.andThe', {})),
    });
  });
  return said.join(fillWords(book, 'list.semicolon', {}));
}

function labelIn(register: Readonly<Record<string, MethodWords>>, id: string): string {
  return nameIn(register, id, 'label');
}

function nameIn(
  register: Readonly<Record<string, MethodWords>>,
  id: string,
  name: 'label' | 'shortLabel',
): string {
  return Object.hasOwn(register, id) ? (register[id]?.[name] ?? id) : id;
}
