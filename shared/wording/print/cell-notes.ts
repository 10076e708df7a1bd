import type { LayerResult } from '#shared/analysis';
import type { Result } from '#shared/core';
import type { EffectMeasureId } from '#shared/effects';
import {
  countsOnlyMark,
  formatCount,
  percentIsShown,
  rationalOf,
  roundRational,
  type Decimal,
} from '#shared/format';
import type { Estimate, EstimationIssue, GroupCount } from '#shared/stats';
import { contrastTable } from '#shared/analysis';
import { EFFECT_MEASURES } from '#shared/effects';
import { fillPattern, fillWords } from '../phrasebook/fill-pattern';
import { issueWords } from '../issue-words';
import type { Phrase } from '../phrase';
import type { PrintContext } from './print-context';
import type { TableContents } from './table-notes';

/** Notes on what single cells print: rounded differences, small groups, cells without a value. */
export function cellNotes(
  context: PrintContext,
  contents: TableContents,
  measures: readonly EffectMeasureId[],
): readonly Phrase[] {
  const layers = shownLayers(context, contents);
  const { style, book } = context;
  const rounded =
    measures.includes('riskDifference') && layers.some((layer) => hidesRounding(context, layer));
  const small = contents.risk && layers.some((layer) => showsCountsOnly(context, layer));
  const limit = formatCount(style.percent.countsOnlyBelow, style).text;
  return [
    ...(rounded ? [{ parts: fillPattern(book, 'note.rounding', {}) }] : []),
    ...(small
      ? [{ parts: fillPattern(book, 'note.countsOnly', { limit, mark: countsOnlyMark(style) }) }]
      : []),
    ...missingCellNotes(context, contents, measures),
  ];
}

function shownLayers({ result }: PrintContext, { crude }: TableContents): readonly LayerResult[] {
  return result.strata.length === 0 || crude ? [result.crude, ...result.strata] : result.strata;
}

/** Whether a printed difference is not the difference of the printed shares. */
function hidesRounding(context: PrintContext, layer: LayerResult): boolean {
  const { style, decimals } = context;
  const inPoints = ['percentagePoints', 'per100'].includes(style.difference.unit);
  return (
    inPoints &&
    layer.contrasts.some(({ indexLevelId, measures }) => {
      const table = contrastTable(layer, indexLevelId);
      const fraction = table ? EFFECT_MEASURES.riskDifference.fraction(table) : null;
      if (!table || !fraction || !measures.riskDifference.ok) {
        return false;
      }
      const printed = rounded(context, fraction, decimals.riskDifference);
      const shares = [table.index, table.reference].map((group) => printedShare(context, group));
      const [index, reference] = shares;
      return (
        index !== undefined && reference !== undefined && !isDifference(printed, index, reference)
      );
    })
  );
}

function printedShare(context: PrintContext, { events, total }: GroupCount): Decimal {
  return rounded(context, { numerator: events, denominator: total }, context.decimals.percent);
}

function rounded(
  { style }: PrintContext,
  fraction: { readonly numerator: number; readonly denominator: number },
  decimals: number,
): Decimal {
  const value = rationalOf({ kind: 'fraction', ...fraction });
  return roundRational(value, 100, decimals, style.numbers.rounding);
}

function isDifference(printed: Decimal, index: Decimal, reference: Decimal): boolean {
  const scale = 10n ** BigInt(printed.decimals);
  const shareScale = 10n ** BigInt(index.decimals);
  return printed.units * shareScale === (index.units - reference.units) * scale;
}

function showsCountsOnly({ style, result }: PrintContext, layer: LayerResult): boolean {
  const isSmall = (total: number): boolean => total > 0 && !percentIsShown(total, style.percent);
  const { events, total } = layer.total;
  return result.frame.design === 'caseControl'
    ? isSmall(events) || isSmall(total - events)
    : layer.levels.some(({ count }) => isSmall(count.total));
}

/** Why cells print a mark in place of a value: every reason that occurs, once. */
function missingCellNotes(
  context: PrintContext,
  contents: TableContents,
  measures: readonly EffectMeasureId[],
): readonly Phrase[] {
  const { style, book, result } = context;
  const shown = shownLayers(context, contents).flatMap((layer) => layer.contrasts);
  const pooled = contents.pooled ? result.pooled : [];
  const estimates = [...shown, ...pooled].flatMap((contrast) =>
    measures.map((id) => contrast.measures[id]),
  );
  const shares =
    contents.risk && result.frame.design !== 'caseControl'
      ? shownLayers(context, contents).flatMap(({ levels }) => levels.map(({ risk }) => risk))
      : [];
  const reasons = [...new Set([...estimates, ...shares].flatMap((one) => reasonsOf(one, context)))];
  const { mark, meaning } = style.table.missingCell;
  const joined = reasons.join(fillWords(book, 'list.or', {}));
  const key = mark === meaning ? 'note.missingWords' : 'note.missingCell';
  return reasons.length === 0
    ? []
    : [{ parts: fillPattern(book, key, { mark, meaning, reasons: joined }) }];
}

function reasonsOf(
  estimate: Result<Estimate, EstimationIssue>,
  { book }: PrintContext,
): readonly string[] {
  return estimate.ok ? [] : [issueWords(estimate.issue, book)];
}
