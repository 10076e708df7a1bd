import type { EffectMeasureId } from '#shared/effects';
import type { HouseStyle } from '#shared/house-style';
import { fillPattern, startSentence } from '../phrasebook/fill-pattern';
import type { Phrasebook } from '../phrasebook/phrasebook';
import type { Phrase } from '../phrase';
import { printContext, type PrintedAnalysis } from './print-context';
import { pValueParts } from './test-parts';

/**
 * What the test of homogeneity of a measure says for one level: that the strata differ, or that
 * there is no clear evidence of it. Null where the test is not defined.
 */
export function homogeneityWords(
  analysis: PrintedAnalysis,
  { measure, indexLevelId }: { readonly measure: EffectMeasureId; readonly indexLevelId: string },
  style: HouseStyle,
  book: Phrasebook,
): Phrase | null {
  const { pooled, specification } = analysis.result;
  const outcome = pooled.find((contrast) => contrast.indexLevelId === indexLevelId)?.homogeneity[
    measure
  ];
  if (!outcome?.ok) {
    return null;
  }
  const test = pValueParts(printContext(analysis, style, book), outcome.value, {
    quantity: `homogeneity:${measure}`,
    levelId: indexLevelId,
    scope: { kind: 'pooled' },
  });
  const differs = outcome.value.pValue < 1 - specification.level;
  const key = differs ? 'homogeneity.differs' : 'homogeneity.noEvidence';
  return { parts: startSentence(fillPattern(book, key, { test })) };
}
