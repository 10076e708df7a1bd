import type { FourfoldTable } from '../fourfold-table';
import { scoreOfDifference } from '../intervals/score/risk-difference-score';
import { riskRatioScore } from '../intervals/score/risk-ratio-score';
import type { TableScore } from './extreme-tables';

/**
 * The hypotheses that an unconditional interval inverts: one value of the effect each, under which
 * the reference group's risk is left open.
 */
export interface NullFamily {
  /** The statistic that orders tables at a tested value. */
  scoreAt(tested: number): TableScore;
  /** The index group's risk, within 0 … 1, that goes with a reference risk; grows with `tested`. */
  indexRisk(referenceRisk: number, tested: number): number;
  /** Reference risks that go with some tested value between two. */
  referenceRisks(from: number, to: number): readonly [least: number, most: number];
}

/** Risk differences, tested in [-1, 1], with tables in the order of the score statistic. */
export function differences(indexTotal: number, referenceTotal: number): NullFamily {
  return {
    scoreAt: (tested) => (indexEvents, referenceEvents) => {
      const indexOthers = indexTotal - indexEvents;
      const referenceOthers = referenceTotal - referenceEvents;
      const cells = { indexEvents, indexOthers, referenceEvents, referenceOthers };
      return scoreOfDifference(cells, tested);
    },
    indexRisk: (referenceRisk, tested) => Math.min(1, Math.max(0, referenceRisk + tested)),
    referenceRisks: (from, to) => [Math.max(0, -to), Math.min(1, 1 - from)],
  };
}

/** Logarithms of risk ratios, with tables in the order of the ratio's score statistic. */
export function logRatios(indexTotal: number, referenceTotal: number): NullFamily {
  return {
    scoreAt: (tested) => (indexEvents, referenceEvents) =>
      riskRatioScore(tableOf(indexEvents, indexTotal, referenceEvents, referenceTotal), 1)(tested),
    indexRisk: (referenceRisk, tested) => Math.min(1, referenceRisk * Math.exp(tested)),
    referenceRisks: (from) => [0, Math.min(1, Math.exp(-from))],
  };
}

function tableOf(
  indexEvents: number,
  indexTotal: number,
  referenceEvents: number,
  referenceTotal: number,
): FourfoldTable {
  return {
    index: { events: indexEvents, total: indexTotal },
    reference: { events: referenceEvents, total: referenceTotal },
  };
}
