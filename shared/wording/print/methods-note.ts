import { contrastTestId } from '#shared/analysis';
import { EFFECT_MEASURES, EFFECT_MEASURE_IDS, type EffectMeasureId } from '#shared/effects';
import { formatCount, levelPercent } from '#shared/format';
import type { HouseStyle } from '#shared/house-style';
import { TEST_METHODS } from '#shared/stats';
import { fillPattern, fillWords } from '../phrasebook/fill-pattern';
import { groupAt } from './group-at';
import type { Phrasebook } from '../phrasebook/phrasebook';
import type { Phrase, PhrasePart } from '../phrase';
import {
  FEWEST_LEVELS_OF_A_TREND,
  homogeneityMethodsWords,
  intervalMethodsWords,
  poolingMethodsWords,
  scoresWords,
  shareMethod,
  testMethod,
} from './method-words';
import {
  occurrenceWords,
  printAddress,
  printContext,
  strataWords,
  termsOf,
  WHOLE,
  type PrintContext,
  type PrintedAnalysis,
} from './print-context';

/**
 * What was done, one sentence each: the comparison, intervals, tests, pooling, homogeneity, trend,
 * missing records, rounding, and whether the analysis was planned. Written from the methods that
 * the result really used, for the measures that are printed and that the design gives.
 */
export function methodsNoteOf(
  analysis: PrintedAnalysis,
  style: HouseStyle,
  book: Phrasebook,
  printed: readonly EffectMeasureId[] = EFFECT_MEASURE_IDS,
): readonly Phrase[] {
  const context = printContext(analysis, style, book);
  const measures = printed.filter((id) => EFFECT_MEASURES[id].givenBy(context.result.frame.design));
  const sentences = [
    comparison(context),
    intervals(context, measures),
    ...tests(context),
    ...pooling(context, measures),
    ...trend(context),
    ...missing(context),
    givesRisks(context) ? fillPattern(book, 'methods.rounding', {}) : [],
    ...standing(context),
  ];
  return sentences.filter((parts) => parts.length > 0).map((parts) => ({ parts }));
}

type Parts = readonly PhrasePart[];

function givesRisks({ result }: PrintContext): boolean {
  return result.frame.design !== 'caseControl';
}

function comparison(context: PrintContext): Parts {
  const { result, book } = context;
  const { exposure, outcome } = result.frame;
  const shared = {
    exposure: exposure.sentenceLabel,
    reference: groupAt(context, exposure.referenceLevelId),
  };
  return givesRisks(context)
    ? fillPattern(book, 'methods.compared', { ...shared, outcome: occurrenceWords(context) })
    : fillPattern(book, 'methods.comparedOdds', { ...shared, outcome: outcome.noun });
}

function intervals(context: PrintContext, measures: readonly EffectMeasureId[]): Parts {
  const { result, style, book } = context;
  const level = levelPercent(result.specification.level, style);
  const shares = fillWords(book, 'note.method', {
    measure: termsOf(context).noun,
    method: shareMethod(result),
  });
  const effects = intervalMethodsWords(context, measures);
  const said = [...(givesRisks(context) ? [shares] : []), ...(effects === '' ? [] : [effects])];
  const methods = said.join(fillWords(book, 'list.semicolon', {}));
  return fillPattern(book, 'methods.intervals', { level, methods });
}

function tests({ result, style, book }: PrintContext): readonly Parts[] {
  const chosen = contrastTestId(result.specification);
  if (chosen !== null) {
    return [fillPattern(book, 'methods.testChosen', { method: testMethod(chosen) })];
  }
  return style.sentence.pValue === 'omitted'
    ? []
    : [
        fillPattern(book, 'methods.tests', {
          pearson: TEST_METHODS.pearsonChiSquare.label,
          fisher: TEST_METHODS.fisherExact.label,
        }),
      ];
}

function pooling(context: PrintContext, measures: readonly EffectMeasureId[]): readonly Parts[] {
  const { result, book } = context;
  if (result.pooled.length === 0) {
    return [];
  }
  const independence = result.pooled
    .map((contrast) => contrast.conditionalIndependence)
    .find((outcome) => outcome.ok);
  return [
    fillPattern(book, 'methods.pooled', {
      strata: strataWords(context) ?? '',
      methods: poolingMethodsWords(context, measures),
    }),
    independence?.ok
      ? fillPattern(book, 'methods.independence', { method: testMethod(independence.value.method) })
      : [],
    homogeneity(context, measures),
  ];
}

function homogeneity(context: PrintContext, measures: readonly EffectMeasureId[]): Parts {
  const methods = homogeneityMethodsWords(context, measures);
  return methods === '' ? [] : fillPattern(context.book, 'methods.homogeneity', { methods });
}

function trend(context: PrintContext): readonly Parts[] {
  const { result, book } = context;
  const tested = [result.crude, ...result.strata]
    .map((layer) => layer.trend)
    .find((outcome) => outcome.ok);
  const levels = result.frame.exposure.levels.length;
  return tested?.ok && levels >= FEWEST_LEVELS_OF_A_TREND
    ? [
        fillPattern(book, 'methods.trend', {
          method: testMethod(tested.value.method),
          scores: scoresWords(context),
        }),
      ]
    : [];
}

function missing(context: PrintContext): readonly Parts[] {
  const { result, style, book } = context;
  const total = result.leftOut.reduce((sum, { count }) => sum + count, 0);
  const count: PhrasePart = {
    kind: 'value',
    text: formatCount(total, style).text,
    address: printAddress(context, 'leftOut', WHOLE),
  };
  const key = total === 1 ? 'methods.missingOne' : 'methods.missing';
  return total === 0 ? [] : [fillPattern(book, key, { count })];
}

function standing({ result, book }: PrintContext): readonly Parts[] {
  const { planned, importance, analysisSet } = result.specification.standing;
  const words = fillWords(book, `methods.${importance}`, {});
  const set = analysisSet.trim();
  return [
    fillPattern(book, `methods.${planned}`, { importance: words }),
    set === '' ? [] : fillPattern(book, 'methods.analysisSet', { set }),
  ];
}
