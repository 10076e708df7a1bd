import {
  formatCount,
  intervalLabel,
  joinLimits,
  limitBrackets,
  pValueStatement,
} from '#shared/format';
import type { HouseStyle } from '#shared/house-style';
import type { OutsideEstimate, OutsideMeasureId } from '#shared/outside-estimates';
import { capitalised, fillPattern, fillWords, joinParts } from '../phrasebook/fill-pattern';
import type { Phrasebook } from '../phrasebook/phrasebook';
import type { Phrase, PhrasePart } from '../phrase';
import { headWithInterval } from '../print/column-heads';
import { printContext, type PrintContext, type PrintedAnalysis } from '../print/print-context';
import { outsideAddress, outsidePValue, outsideText } from './outside-numbers';

/** What a measure is called beside an analysis: "odds ratio", "hazard ratio". */
export function outsideMeasureName(
  measure: OutsideMeasureId,
  { result }: Pick<PrintedAnalysis, 'result'>,
  book: Phrasebook,
): string {
  return measure === 'rateRatio' || measure === 'hazardRatio'
    ? fillWords(book, `outside.${measure}`, {})
    : book.terms[result.frame.design].measures[measure].name;
}

/** One model's estimates of one measure; `number` tells models apart, null where there is one. */
export interface OutsideColumn {
  readonly estimates: readonly OutsideEstimate[];
  readonly number: number | null;
}

/** The head of a column of estimates from elsewhere: "Adjusted odds ratio (95% CI)". */
export function outsideHead(
  column: OutsideColumn,
  analysis: PrintedAnalysis,
  style: HouseStyle,
  book: Phrasebook,
): string {
  const [first] = column.estimates;
  if (first === undefined) return '';
  return headWithInterval(outsideName(column, analysis, style, book), first.level, style, book);
}

/** "Adjusted odds ratio": the head of a column of estimates from elsewhere, with any unit. */
export function outsideName(
  column: OutsideColumn,
  analysis: PrintedAnalysis,
  style: HouseStyle,
  book: Phrasebook,
): string {
  const name = columnName(column, analysis, book);
  return column.estimates[0]?.measure === 'riskDifference'
    ? fillWords(book, `head.${style.difference.unit}`, { head: name })
    : name;
}

/** Method, covariates, number analysed and source of a column, and its estimate over all levels. */
export function outsideNote(
  column: OutsideColumn,
  analysis: PrintedAnalysis,
  style: HouseStyle,
  book: Phrasebook,
): Phrase {
  const context = printContext(analysis, style, book);
  const [first] = column.estimates;
  if (first === undefined) return { parts: [] };
  const note = fillPattern(book, 'outside.note', {
    columns: columnName(column, analysis, book),
    model: modelWords(first, context),
    source: first.source,
    date:
      first.computedOn === null ? '' : fillWords(book, 'outside.date', { date: first.computedOn }),
  });
  const overall = column.estimates.filter(({ levelId }) => levelId === null);
  const more = overall.flatMap((estimate) => [' ', ...overallParts(estimate, context)]);
  return { parts: joinParts([note, ...more].flat()) };
}

/** A sentence of its own: what adjustment gives, how, and that it was computed elsewhere. */
export function outsideSentence(
  estimate: OutsideEstimate,
  analysis: PrintedAnalysis,
  style: HouseStyle,
  book: Phrasebook,
): Phrase {
  const context = printContext(analysis, style, book);
  const filled = {
    method: estimate.method,
    analysed: analysedWords(estimate, context),
    measure: outsideMeasureName(estimate.measure, analysis, book),
    value: valueParts(estimate, context),
    details: detailParts(estimate, context),
  };
  const covariates = listWords(estimate.covariates, book);
  const parts =
    covariates === ''
      ? fillPattern(book, 'outside.sentenceUnadjusted', filled)
      : fillPattern(book, 'outside.sentence', { ...filled, covariates });
  return { parts };
}

function columnName(
  { estimates, number }: OutsideColumn,
  analysis: PrintedAnalysis,
  book: Phrasebook,
): string {
  const measure = outsideMeasureName(estimates[0]?.measure ?? 'oddsRatio', analysis, book);
  const column = fillWords(book, 'outside.column', { measure });
  return number === null
    ? column
    : fillWords(book, 'outside.columnOfModel', { column, number: String(number) });
}

function modelWords(estimate: OutsideEstimate, context: PrintContext): string {
  const { book } = context;
  const { method } = estimate;
  const analysed = analysedWords(estimate, context);
  const covariates = listWords(estimate.covariates, book);
  const words =
    covariates === ''
      ? fillWords(book, 'outside.modelUnadjusted', { method, analysed })
      : fillWords(book, 'outside.model', { method, covariates, analysed });
  return capitalised(words);
}

function analysedWords({ numberAnalysed }: OutsideEstimate, context: PrintContext): string {
  const { book, style, result } = context;
  if (numberAnalysed === null) return '';
  const count = formatCount(numberAnalysed, style).text;
  return fillWords(book, 'outside.analysed', { count, people: result.frame.peopleNoun });
}

function listWords(words: readonly string[], book: Phrasebook): string {
  const last = words.at(-1) ?? '';
  const others = words.slice(0, -1).join(fillWords(book, 'list.comma', {}));
  return others === '' ? last : others + fillWords(book, 'list.and', {}) + last;
}

function overallParts(estimate: OutsideEstimate, context: PrintContext): readonly PhrasePart[] {
  const { book, style, result } = context;
  return fillPattern(book, 'outside.allLevels', {
    measure: outsideMeasureName(estimate.measure, { result }, book),
    value: valueParts(estimate, context),
    interval: intervalWords(estimate, style),
    limits: limitParts(estimate, context),
  });
}

function valueParts(
  estimate: OutsideEstimate,
  { style, book }: PrintContext,
): readonly PhrasePart[] {
  const text = outsideText(estimate, style)?.value.text ?? estimate.value;
  const value = { kind: 'value', text, address: outsideAddress(estimate, 'value') } as const;
  const unit = style.difference.unit;
  return estimate.measure === 'riskDifference'
    ? fillPattern(book, `size.${unit}`, { size: value })
    : [value];
}

function limitParts(estimate: OutsideEstimate, { style }: PrintContext): readonly PhrasePart[] {
  const printed = outsideText(estimate, style);
  const lower = printed?.lower.text ?? estimate.lower;
  const upper = printed?.upper.text ?? estimate.upper;
  const { open, close } = limitBrackets('sentence', style);
  const limits = {
    kind: 'limits',
    text: joinLimits(lower, upper, style),
    lower: outsideAddress(estimate, 'lower'),
    upper: outsideAddress(estimate, 'upper'),
    first: 'lower',
  } as const;
  return joinParts([open, limits, close]);
}

function intervalWords({ level }: OutsideEstimate, style: HouseStyle): string {
  return intervalLabel(level, style) + style.interval.afterLabel;
}

/** "95% CI 1.08 to 3.78; P = .03". */
function detailParts(estimate: OutsideEstimate, context: PrintContext): readonly PhrasePart[] {
  const { style, book } = context;
  const p = pValueParts(estimate, context);
  const limits = joinParts([intervalWords(estimate, style), limitParts(estimate, context)]);
  return p.length === 0 ? limits : joinParts([limits, fillWords(book, 'list.semicolon', {}), p]);
}

function pValueParts(estimate: OutsideEstimate, { style }: PrintContext): readonly PhrasePart[] {
  const pValue = outsidePValue(estimate, style);
  if (pValue === null) return [];
  const { symbol, italic, relation } = pValueStatement(pValue, style);
  return [
    { kind: 'text', text: symbol, ...(italic ? { italic: true as const } : {}) },
    { kind: 'text', text: relation },
    { kind: 'value', text: pValue.figure, address: outsideAddress(estimate, 'pValue') },
  ];
}
