import { intervalLabel, limitBrackets } from '#shared/format';
import type { HouseStyle } from '#shared/house-style';
import { fillWords } from '../phrasebook/fill-pattern';
import type { Phrasebook } from '../phrasebook/phrasebook';
import { printContext, termsOf, type PrintedAnalysis } from './print-context';

/** Heads of the columns that a table of one analysis can have. */
export interface ColumnHeads {
  /** Head of the levels: the exposure's label. */
  readonly level: string;
  /** "n/N". */
  readonly count: string;
  /** "Risk, %" or "Prevalence, %". */
  readonly share: string;
  /** "Difference, points". */
  readonly riskDifference: string;
  readonly riskRatio: string;
  readonly oddsRatio: string;
  /** "Cases" and "Controls", n of the layer's, and their shares of all cases or controls. */
  readonly cases: string;
  readonly controls: string;
  readonly casesShare: string;
  readonly controlsShare: string;
  /** "P" or "p". */
  readonly pValue: string;
}

/** The heads that the design and the house style ask for. */
export function columnHeads(
  analysis: PrintedAnalysis,
  style: HouseStyle,
  book: Phrasebook,
): ColumnHeads {
  const { head, measures } = termsOf(printContext(analysis, style, book));
  const difference = `head.${style.difference.unit}` as const;
  return {
    level: analysis.result.frame.exposure.label,
    count: fillWords(book, 'head.count', {}),
    share: fillWords(book, 'head.percent', { head }),
    riskDifference: fillWords(book, difference, { head: measures.riskDifference.head }),
    riskRatio: measures.riskRatio.head,
    oddsRatio: measures.oddsRatio.head,
    cases: fillWords(book, 'head.cases', {}),
    controls: fillWords(book, 'head.controls', {}),
    casesShare: fillWords(book, 'head.casesShare', {}),
    controlsShare: fillWords(book, 'head.controlsShare', {}),
    pValue: style.pValue.symbol,
  };
}

/** A head whose cells hold an estimate with its limits: "Risk ratio (95% CI)". */
export function headWithInterval(
  head: string,
  level: number,
  style: HouseStyle,
  book: Phrasebook,
): string {
  const interval = intervalLabel(level, style);
  return fillWords(book, 'head.withInterval', { head, interval, ...limitBrackets('table', style) });
}
