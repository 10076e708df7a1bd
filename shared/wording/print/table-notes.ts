import type { EffectMeasureId } from '#shared/effects';
import { levelPercent } from '#shared/format';
import type { HouseStyle } from '#shared/house-style';
import { fillPattern, startSentence } from '../phrasebook/fill-pattern';
import type { Phrasebook } from '../phrasebook/phrasebook';
import type { Phrase, PhrasePart } from '../phrase';
import { cellNotes } from './cell-notes';
import { groupAt } from './group-at';
import { homogeneityNotes, trendNotes } from './test-notes';
import { leftOutNotes } from './left-out-notes';
import { intervalMethodsWords, poolingMethodsWords } from './method-words';
import { missingNotes } from './missing-notes';
import {
  printContext,
  strataWords,
  type PrintContext,
  type PrintedAnalysis,
} from './print-context';

/** What a table of an analysis shows. */
export interface TableContents {
  readonly risk: boolean;
  readonly riskDifference: boolean;
  readonly riskRatio: boolean;
  readonly oddsRatio: boolean;
  /** All strata together, unadjusted. */
  readonly crude: boolean;
  readonly pooled: boolean;
  readonly trend: boolean;
}

/**
 * The notes of a table, in order: reference, intervals, pooling, differences between strata, trend,
 * strata left out, rounding, missing records, small groups, cells without a value, standing.
 *
 * Each is one or two sentences with its numbers bound; only what the table shows is explained.
 */
export function tableNotes(
  analysis: PrintedAnalysis,
  contents: TableContents,
  style: HouseStyle,
  book: Phrasebook,
): readonly Phrase[] {
  const context = printContext(analysis, style, book);
  const measures = shownMeasures(context, contents);
  const pooled = contents.pooled && context.result.pooled.length > 0;
  return [
    ...referenceNotes(context, measures),
    ...intervalNotes(context, measures),
    ...(pooled ? poolingNotes(context, measures) : []),
    ...(pooled ? homogeneityNotes(context, measures) : []),
    ...(contents.trend ? trendNotes(context, contents) : []),
    ...(pooled ? leftOutNotes(context, measures) : []),
    ...cellNotes(context, contents, measures),
    ...missingNotes(context),
    ...standingNotes(context),
  ];
}

/** The measures that a table shows; a case–control study gives odds ratios only. */
export function shownMeasures(
  { result }: PrintContext,
  contents: TableContents,
): readonly EffectMeasureId[] {
  const given: readonly EffectMeasureId[] =
    result.frame.design === 'caseControl'
      ? ['oddsRatio']
      : ['riskDifference', 'riskRatio', 'oddsRatio'];
  return given.filter((id) => contents[id]);
}

/** That an analysis was not planned is said wherever it is printed. */
export function standingNotes({ result, book }: PrintContext): readonly Phrase[] {
  return result.specification.standing.planned === 'postHoc'
    ? [{ parts: fillPattern(book, 'note.postHoc', {}) }]
    : [];
}

function referenceNotes(
  context: PrintContext,
  measures: readonly EffectMeasureId[],
): readonly Phrase[] {
  if (measures.length === 0) {
    return [];
  }
  const reference = referenceGroup(context);
  return [{ parts: fillPattern(context.book, 'note.reference', { reference }) }];
}

/** The people that all others are compared with, as sentences name them. */
export function referenceGroup(context: PrintContext): PhrasePart {
  const { referenceLevelId } = context.result.frame.exposure;
  return {
    kind: 'group',
    text: groupAt(context, referenceLevelId),
    levelId: referenceLevelId,
  };
}

function intervalNotes(
  context: PrintContext,
  measures: readonly EffectMeasureId[],
): readonly Phrase[] {
  const { result, style, book } = context;
  if (measures.length === 0) {
    return [];
  }
  const level = levelPercent(result.specification.level, style);
  const methods = intervalMethodsWords(context, measures);
  return [{ parts: fillPattern(book, 'note.intervals', { level, methods }) }];
}

function poolingNotes(
  context: PrintContext,
  measures: readonly EffectMeasureId[],
): readonly Phrase[] {
  const methods = poolingMethodsWords(context, measures);
  const strata = strataWords(context) ?? '';
  return methods === ''
    ? []
    : [{ parts: startSentence(fillPattern(context.book, 'note.pooled', { strata, methods })) }];
}
