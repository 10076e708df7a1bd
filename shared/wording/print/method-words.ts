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
  const { result, book } = context;
  const said = measures.map((id) =>
    fillWords(book, 'note.method', {
      measure: termsOf(context).measures[id].name,
      method: labelIn(EFFECT_MEASURES[id].intervals, result.specification.methods[id]),
    }),
  );
  return said.join(fillWords(book, 'list.semicolon', {}));
}

/** The names of the pooled estimates: each measure's method once. */
export function poolingMethodsWords(
  { result, book }: PrintContext,
  measures: readonly EffectMeasureId[],
): string {
  const ids = measures.flatMap((id) =>
    result.pooled.flatMap((contrast) => {
      const estimate = contrast.measures[id];
      return estimate.ok ? [estimate.value.interval.method] : [];
    }),
  );
  const labels = [...new Set(ids)].map((id) => labelIn(POOLING_METHODS, id));
  return labels.join(fillWords(book, 'list.semicolon', {}));
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

/** The scores of the levels, in their order: "1, 2, 3". */
export function scoresWords({ result, book }: PrintContext): string {
  const { trendScores } = result.specification;
  const scores = result.frame.exposure.levels.map(
    ({ id }, place) => trendScores?.[id] ?? place + 1,
  );
  return scores.map(String).join(fillWords(book, 'list.comma', {}));
}

function labelIn(register: Readonly<Record<string, MethodWords>>, id: string): string {
  return Object.hasOwn(register, id) ? (register[id]?.label ?? id) : id;
}
