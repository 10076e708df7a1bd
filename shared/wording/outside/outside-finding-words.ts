import { formatCount, formatNumber, formatPValue, levelPercent } from '#shared/format';
import type { PValueText } from '#shared/format';
import type { HouseStyle } from '#shared/house-style';
import type { OutsideFinding, OutsideFindingId } from '#shared/outside-estimates';
import { fillWords } from '../phrasebook/fill-pattern';
import type { Phrasebook } from '../phrasebook/phrasebook';

/** What a check of an estimate from elsewhere found, in one or two sentences. */
export function outsideFindingWords(
  finding: OutsideFinding,
  style: HouseStyle,
  book: Phrasebook,
): string {
  return WORDS[finding.id]({ facts: finding.facts, style, book });
}

interface FindingContext {
  readonly facts: OutsideFinding['facts'];
  readonly style: HouseStyle;
  readonly book: Phrasebook;
}

const WORDS: Readonly<Record<OutsideFindingId, (context: FindingContext) => string>> = {
  numberNotReadable: (context) =>
    fillWords(context.book, 'outside.finding.numberNotReadable', { text: text(context, 'text') }),
  pValueNotReadable: (context) =>
    fillWords(context.book, 'outside.finding.pValueNotReadable', { text: text(context, 'text') }),
  ratioNotPositive: ({ book }) => fillWords(book, 'outside.finding.ratioNotPositive', {}),
  limitsReversed: (context) =>
    fillWords(context.book, 'outside.finding.limitsReversed', {
      lower: text(context, 'lower'),
      upper: text(context, 'upper'),
    }),
  limitsWithoutValue: (context) =>
    fillWords(context.book, 'outside.finding.limitsWithoutValue', {
      value: text(context, 'value'),
      lower: text(context, 'lower'),
      upper: text(context, 'upper'),
    }),
  notSymmetric: (context) =>
    fillWords(context.book, 'outside.finding.notSymmetric', {
      middle: decimal(context, 'middle', Number(context.facts.decimals)),
    }),
  pDisagrees: (context) =>
    fillWords(context.book, 'outside.finding.pDisagrees', {
      pValue: text(context, 'pValue'),
      implied: impliedWords(context),
    }),
  referenceChanged: (context) =>
    fillWords(context.book, 'outside.finding.referenceChanged', {
      reference: text(context, 'reference'),
    }),
  levelGone: ({ book }) => fillWords(book, 'outside.finding.levelGone', {}),
  notGivenByDesign: ({ book }) => fillWords(book, 'outside.finding.notGivenByDesign', {}),
  otherSide: (context) =>
    fillWords(context.book, 'outside.finding.otherSide', {
      value: text(context, 'value'),
      crude: decimal(context, 'crude', 2),
    }),
  otherNumber: (context) =>
    fillWords(context.book, 'outside.finding.otherNumber', {
      entered: count(context, 'entered'),
      counted: count(context, 'counted'),
    }),
  otherLevel: (context) =>
    fillWords(context.book, 'outside.finding.otherLevel', {
      entered: levelPercent(Number(context.facts.entered), context.style),
      analysis: levelPercent(Number(context.facts.analysis), context.style),
    }),
};

function text({ facts }: FindingContext, name: string): string {
  return String(facts[name] ?? '');
}

function decimal({ facts, style }: FindingContext, name: string, decimals: number): string {
  const form = { scale: 1, decimals, sign: 'minus' } as const;
  return formatNumber({ kind: 'real', value: Number(facts[name]) }, form, style).text;
}

function count({ facts, style }: FindingContext, name: string): string {
  return formatCount(Number(facts[name]), style).text;
}

/** The p-values that the limits allow for: a range, one value, or what lies below a bound. */
function impliedWords({ facts, style, book }: FindingContext): string {
  const print = (name: string): PValueText => formatPValue(Number(facts[name]), 0.95, style);
  const lowest = print('lowest');
  const highest = print('highest');
  const pValue = highest.figure;
  if (highest.relation === '<') return fillWords(book, 'outside.finding.impliedBelow', { pValue });
  if (lowest.relation === '<') return fillWords(book, 'outside.finding.impliedAtMost', { pValue });
  return lowest.text === highest.text
    ? fillWords(book, 'outside.finding.impliedOne', { pValue })
    : fillWords(book, 'outside.finding.impliedRange', { lowest: lowest.text, highest: pValue });
}
