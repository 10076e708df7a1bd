import type { AnalysisResult } from '#shared/analysis';
import type { EffectMeasureId } from '#shared/effects';
import { fillWords } from '../phrasebook/fill-pattern';
import type { Phrasebook } from '../phrasebook/phrasebook';

/**
 * What the tests of homogeneity allow to be said of the strata, for the measures that are shown:
 * that they differ, that there is no clear evidence of it, or that it cannot be tested.
 */
export function homogeneityWords(
  { pooled, specification }: AnalysisResult,
  measures: readonly EffectMeasureId[],
  book: Phrasebook,
): string {
  const pValues = pooled.flatMap(({ homogeneity }) =>
    measures.flatMap((id) => {
      const test = homogeneity[id];
      return test.ok ? [test.value.pValue] : [];
    }),
  );
  if (pValues.length === 0) {
    return fillWords(book, 'homogeneity.notTested', {});
  }
  const threshold = 1 - specification.level;
  return pValues.some((pValue) => pValue < threshold)
    ? fillWords(book, 'homogeneity.differs', {})
    : fillWords(book, 'homogeneity.noEvidence', {});
}
