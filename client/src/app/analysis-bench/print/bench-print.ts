import type { AnalysisResult } from '#shared/analysis';
import {
  decimalsOf,
  type EstimateText,
  formatEstimate,
  formatPValue,
  joinLimits,
  limitBrackets,
  type PrintedDecimals,
} from '#shared/format';
import { EFFECT_MEASURES, type EffectMeasureId } from '#shared/effects';
import type { HouseStyle } from '#shared/house-style';
import type { Result } from '#shared/core';
import type { Estimate, EstimationIssue, FourfoldTable, TestOutcome } from '#shared/stats';
import { capitalised, issueWords, type Phrasebook } from '#shared/wording';

/** What a result is printed with on the bench: the same as in a report. */
export interface BenchPrint {
  readonly result: AnalysisResult;
  readonly style: HouseStyle;
  readonly book: Phrasebook;
  readonly decimals: PrintedDecimals;
}

/** An estimate with its limits in brackets, or why there is none. */
export type PrintedEstimate =
  | { readonly ok: true; readonly value: string; readonly limits: string }
  | { readonly ok: false; readonly reason: string };

/** Gathers what a result is printed with. */
export function benchPrint(
  result: AnalysisResult,
  style: HouseStyle,
  book: Phrasebook,
): BenchPrint {
  return { result, style, book, decimals: decimalsOf(result, style) };
}

/** An estimate as its table cell prints it; `table` gives the exact value where counts make it. */
export function printedEstimate(
  print: BenchPrint,
  measure: EffectMeasureId,
  estimate: Result<Estimate, EstimationIssue>,
  table: FourfoldTable | undefined,
): PrintedEstimate {
  if (!estimate.ok) return { ok: false, reason: notEstimable(print, estimate.issue) };
  const text = estimateText(print, measure, estimate.value, table);
  const { open, close } = limitBrackets('table', print.style);
  const limits = joinLimits(text.lower.text, text.upper.text, print.style);
  return { ok: true, value: text.value.text, limits: `${open}${limits}${close}` };
}

/** The digits of an estimate and its limits. */
export function estimateText(
  { style, decimals }: BenchPrint,
  measure: EffectMeasureId,
  estimate: Estimate,
  table: FourfoldTable | undefined,
): EstimateText {
  const fraction =
    table === undefined ? null : EFFECT_MEASURES[measure].fraction(table, estimate.interval.method);
  const exact = fraction === null ? null : { kind: 'fraction' as const, ...fraction };
  return formatEstimate(measure, { estimate, exact }, decimals, style);
}

/** A p-value's figure with its relation, or why there is none. */
export function printedPValue(
  { result, style, book }: BenchPrint,
  test: Result<TestOutcome, EstimationIssue>,
): PrintedEstimate {
  if (!test.ok) return { ok: false, reason: sentenceOf(issueWords(test.issue, book)) };
  const { text } = formatPValue(test.value.pValue, result.specification.level, style);
  return { ok: true, value: text, limits: '' };
}

/** Why a number is not there, as a sentence. */
export function notEstimable({ book }: BenchPrint, issue: EstimationIssue): string {
  return `Not estimable: ${issueWords(issue, book)}.`;
}

/** Words with a capital and a full stop. */
export function sentenceOf(words: string): string {
  return `${capitalised(words)}.`;
}

/** The measures that a design shows beside each other. */
export function shownMeasures({ frame }: AnalysisResult): readonly EffectMeasureId[] {
  return frame.design === 'caseControl' ? ['oddsRatio'] : ['riskDifference', 'riskRatio'];
}
