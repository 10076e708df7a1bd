import type { FactorLevel } from '#shared/code-book';
import type { EffectMeasureId } from '#shared/effects';
import { fillPattern, fillWords } from '../phrasebook/fill-pattern';
import type { Phrase } from '../phrase';
import { withinWords } from '../sentence/opening';
import {
  FEWEST_LEVELS_OF_A_TREND,
  homogeneityMethod,
  scoresWords,
  testMethod,
} from './method-words';
import { strataWords, termsOf, type PrintContext } from './print-context';
import { testList, type PlacedTest } from './test-parts';
import type { TableContents } from './table-notes';

/** Tests of difference between strata, one note a measure, level by level. */
export function homogeneityNotes(
  context: PrintContext,
  measures: readonly EffectMeasureId[],
): readonly Phrase[] {
  return measures.flatMap((measure) => {
    const method = homogeneityMethod(context, measure);
    const tests = testList(context, homogeneityTests(context, measure));
    return method === null || tests === null
      ? []
      : [
          {
            parts: fillPattern(context.book, 'note.homogeneity', {
              measure: termsOf(context).measures[measure].name,
              method,
              tests,
            }),
          },
        ];
  });
}

/** The trend test with its scores, over all records or stratum by stratum as the table shows. */
export function trendNotes(context: PrintContext, contents: TableContents): readonly Phrase[] {
  const placed = trendTests(context, contents);
  const tests = testList(context, placed);
  const tested = placed.map(({ outcome }) => outcome).find((outcome) => outcome.ok);
  const levels = context.result.frame.exposure.levels.length;
  return tests === null || !tested?.ok || levels < FEWEST_LEVELS_OF_A_TREND
    ? []
    : [
        {
          parts: fillPattern(context.book, 'note.trend', {
            method: testMethod(tested.value.method),
            scores: scoresWords(context),
            tests,
          }),
        },
      ];
}

function homogeneityTests(
  { result }: PrintContext,
  measure: EffectMeasureId,
): readonly PlacedTest[] {
  const { levels } = result.frame.exposure;
  return result.pooled.map(({ homogeneity, indexLevelId }) => ({
    outcome: homogeneity[measure],
    quantity: `homogeneity:${measure}`,
    levelId: indexLevelId,
    scope: { kind: 'pooled' },
    place: result.pooled.length > 1 ? levelPlace(levels, indexLevelId) : null,
  }));
}

function levelPlace(levels: readonly FactorLevel[], levelId: string): string {
  return levels.find(({ id }) => id === levelId)?.label ?? levelId;
}

function trendTests(context: PrintContext, contents: TableContents): readonly PlacedTest[] {
  const { result, book } = context;
  const { strata } = result.frame;
  const overall: PlacedTest = {
    outcome: result.crude.trend,
    quantity: 'trend',
    levelId: null,
    scope: { kind: 'crude' },
    place: strata.length > 0 ? fillWords(book, 'note.overall', {}) : null,
  };
  const within = result.strata.map(({ stratumId, trend }): PlacedTest => {
    const stratum = strata.find(({ id }) => id === stratumId);
    return {
      outcome: trend,
      quantity: 'trend',
      levelId: null,
      scope: { kind: 'stratum', stratumId: stratumId ?? '' },
      place: stratum ? withinWords(stratum, strataWords(context) ?? '', book) : null,
    };
  });
  return strata.length === 0 || contents.crude ? [...within, overall] : within;
}
