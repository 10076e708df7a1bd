import type { AnalysisResult } from '#shared/analysis';
import { formatNumber, joinLimits, limitBrackets, levelPercent } from '#shared/format';
import type { HouseStyle } from '#shared/house-style';
import { checkOutsideEstimate, crudeBeside } from '#shared/outside-estimates';
import type {
  OutsideEstimate,
  OutsideFinding,
  OutsideFindingSeverity,
} from '#shared/outside-estimates';
import { outsideFindingWords, outsideMeasureName, outsideText } from '#shared/wording';
import type { Phrasebook } from '#shared/wording';
import type { NoteTone } from '../../ui/status/margin-note';
import { levelLabel } from '../bench/result-scopes';

/** What estimates are printed with: the saved result that they stand beside, a style and words. */
export interface OutsidePrint {
  readonly result: AnalysisResult;
  readonly style: HouseStyle;
  readonly book: Phrasebook;
}

/** What a check found, as a note says it. */
export interface FindingNote {
  readonly tone: NoteTone;
  readonly tag: string;
  readonly words: string;
}

/** An estimate from elsewhere as the bench lists it. */
export interface OutsideRow {
  readonly estimate: OutsideEstimate;
  readonly level: string;
  readonly measure: string;
  readonly value: string;
  readonly limits: string;
  /** The crude number beside it; empty where there is none. */
  readonly crude: string;
  readonly model: string;
  readonly notes: readonly FindingNote[];
}

/** The rows of the list, in the order of entry. */
export function outsideRows(
  estimates: readonly OutsideEstimate[],
  print: OutsidePrint,
): readonly OutsideRow[] {
  return estimates.map((estimate) => rowOf(estimate, print));
}

/** What the checks found, in words, with the tone of each. */
export function findingNotes(
  findings: readonly OutsideFinding[],
  { style, book }: Pick<OutsidePrint, 'style' | 'book'>,
): readonly FindingNote[] {
  return findings.map((finding) => ({
    tone: TONES[finding.severity],
    tag: TAGS[finding.severity],
    words: outsideFindingWords(finding, style, book),
  }));
}

const TONES: Readonly<Record<OutsideFindingSeverity, NoteTone>> = {
  refusal: 'problem',
  caution: 'caution',
  note: 'clear',
};

const TAGS: Readonly<Record<OutsideFindingSeverity, string>> = {
  refusal: 'Stop',
  caution: 'Caution',
  note: 'Note',
};

function rowOf(estimate: OutsideEstimate, print: OutsidePrint): OutsideRow {
  const { result, style, book } = print;
  const { levelId, measure, method, covariates, level } = estimate;
  const printed = outsideText(estimate, style);
  const { open, close } = limitBrackets('table', style);
  const lower = printed?.lower.text ?? estimate.lower;
  const upper = printed?.upper.text ?? estimate.upper;
  const interval = `${open}${joinLimits(lower, upper, style)}${close}`;
  const usual = level === result.specification.level;
  return {
    estimate,
    level: levelId === null ? 'All levels' : levelLabel(result, levelId),
    measure: outsideMeasureName(measure, { result }, book),
    value: printed?.value.text ?? estimate.value,
    limits: usual ? interval : `${interval}, ${levelPercent(level, style)}`,
    crude: crudeText(estimate, print),
    model: covariates.length === 0 ? method : `${method}; ${covariates.join(', ')}`,
    notes: findingNotes(checkOutsideEstimate(estimate, result), print),
  };
}

/** With as many decimals as the adjusted number has, so that they can be compared. */
function crudeText(estimate: OutsideEstimate, { result, style }: OutsidePrint): string {
  const crude = crudeBeside(estimate, result);
  if (crude === null) return '';
  const decimals = (estimate.value.split('.')[1] ?? '').trim().length;
  const sign = estimate.measure === 'riskDifference' ? 'plusAndMinus' : 'minus';
  const form = { scale: 1, decimals, sign } as const;
  return formatNumber({ kind: 'real', value: crude }, form, style).text;
}
