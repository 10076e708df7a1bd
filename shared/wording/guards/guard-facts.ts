import type { GuardFinding, ResultScope } from '#shared/analysis';
import { EFFECT_MEASURE_IDS, type EffectMeasureId } from '#shared/effects';
import {
  DIFFERENCE_SCALES,
  formatCount,
  formatNumber,
  formatPValue,
  formatShare,
  pValueStatement,
  withPercentSign,
} from '#shared/format';
import { fillWords } from '../phrasebook/fill-pattern';
import { groupWords } from '../sentence/group-words';
import { withinWords } from '../sentence/opening';
import { strataWords, termsOf, type PrintContext } from '../print/print-context';

/** Reads the facts of one finding as words and printed numbers. */
export interface GuardFactsReader {
  readonly context: PrintContext;
  readonly finding: GuardFinding;
  text(name: string): string;
  count(name: string): string;
  /** A share of 0..1 as a percentage. */
  percent(name: string): string;
  /** A share of 0..1 as a whole percentage. */
  wholePercent(name: string): string;
  /** A real number to one decimal. */
  decimal(name: string): string;
  measureValue(measure: EffectMeasureId, name: string): string;
  pValue(name: string): string;
  /** The measures that a fact lists. */
  measures(name: string): readonly EffectMeasureId[];
  measureName(measure: EffectMeasureId): string;
  /** Labels of the levels that a fact lists, in its order. */
  levels(name: string): string;
  levelLabel(levelId: string): string;
  group(levelId: string, mention?: 'full' | 'those'): string;
  /** Where the finding belongs: "in kitchens: ", or nothing for all records. */
  place(): string;
}

/** A reader of one finding under a house style. */
export function guardFacts(context: PrintContext, finding: GuardFinding): GuardFactsReader {
  const number = (name: string): number => Number(finding.facts[name] ?? Number.NaN);
  return {
    context,
    finding,
    text: (name) => String(finding.facts[name] ?? ''),
    count: (name) => formatCount(number(name), context.style).text,
    percent: (name) => percentWords(context, number(name), context.decimals.percent),
    wholePercent: (name) => percentWords(context, number(name), 0),
    decimal: (name) => decimalWords(context, number(name)),
    measureValue: (measure, name) => measureWords(context, measure, number(name)),
    pValue: (name) => pValueWords(context, number(name)),
    measures: (name) => EFFECT_MEASURE_IDS.filter((id) => listed(finding, name).includes(id)),
    measureName: (measure) => termsOf(context).measures[measure].name,
    levels: (name) => levelList(context, listed(finding, name)),
    levelLabel: (levelId) => labelOf(context, levelId),
    group: (levelId, mention = 'full') => groupAt(context, levelId, mention),
    place: () => placeWords(context, finding.place.scope),
  };
}

function listed({ facts }: GuardFinding, name: string): readonly string[] {
  const fact = facts[name];
  return Array.isArray(fact) ? fact.map(String) : [];
}

function percentWords({ style }: PrintContext, value: number, decimals: number): string {
  const form = { scale: 100, decimals, sign: 'none' } as const;
  return withPercentSign(formatNumber({ kind: 'real', value }, form, style).text, style);
}

function decimalWords({ style }: PrintContext, value: number): string {
  const form = { scale: 1, decimals: 1, sign: 'minus' } as const;
  return formatNumber({ kind: 'real', value }, form, style).text;
}

function measureWords(
  { style, book, decimals }: PrintContext,
  measure: EffectMeasureId,
  value: number,
): string {
  const real = { kind: 'real', value } as const;
  if (measure !== 'riskDifference') {
    return formatNumber(real, { scale: 1, decimals: decimals[measure], sign: 'minus' }, style).text;
  }
  const { scale } = DIFFERENCE_SCALES[style.difference.unit];
  const form = { scale, decimals: decimals.riskDifference, sign: 'plusAndMinus' } as const;
  const size = formatNumber(real, form, style).text;
  return fillWords(book, `size.${style.difference.unit}`, { size });
}

function pValueWords({ style, result }: PrintContext, value: number): string {
  const pValue = formatPValue(value, result.specification.level, style);
  const { symbol, relation } = pValueStatement(pValue, style);
  return symbol + relation + pValue.figure;
}

function levelList(context: PrintContext, ids: readonly string[]): string {
  const comma = fillWords(context.book, 'list.comma', {});
  return ids.map((id) => labelOf(context, id)).join(comma);
}

function labelOf({ result }: PrintContext, levelId: string): string {
  return result.frame.exposure.levels.find(({ id }) => id === levelId)?.label ?? levelId;
}

function groupAt(
  { result, book }: PrintContext,
  levelId: string,
  mention: 'full' | 'those',
): string {
  const { frame } = result;
  const level = frame.exposure.levels.find(({ id }) => id === levelId);
  const naming = {
    peopleNoun: frame.peopleNoun,
    exposureSentenceLabel: frame.exposure.sentenceLabel,
    groupPattern: frame.exposure.groupPattern ?? null,
  };
  return groupWords(naming, level?.sentenceLabel ?? levelId, mention, book);
}

function placeWords(context: PrintContext, scope: ResultScope): string {
  const { result, book } = context;
  if (scope.kind !== 'stratum') {
    return fillWords(book, 'guard.place.everywhere', {});
  }
  const stratum = result.frame.strata.find(({ id }) => id === scope.stratumId);
  const within = stratum ? withinWords(stratum, strataWords(context) ?? '', book) : '';
  return fillWords(book, 'guard.place.within', { within });
}

/** "4 of 118 (3.4%)", from two counts among the facts. */
export function countWords(reader: GuardFactsReader, events: string, total: string): string {
  const { context, finding } = reader;
  const { style, book, decimals } = context;
  const count = { events: Number(finding.facts[events]), total: Number(finding.facts[total]) };
  const figures = {
    events: formatCount(count.events, style).text,
    total: formatCount(count.total, style).text,
  };
  const counted = fillWords(book, `count.${style.sentence.groupCount}`, figures);
  const share = formatShare(count, decimals.percent, style);
  return share
    ? fillWords(book, 'count.inText', {
        count: counted,
        share: withPercentSign(share.text, style),
      })
    : counted;
}
