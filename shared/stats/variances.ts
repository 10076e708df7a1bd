import type { FourfoldTable, GroupCount } from './fourfold-table';

/** Binomial variance of an estimated risk; 0 at risks of 0 and 1. */
export function varianceOfRisk({ events, total }: GroupCount): number {
  return ((events / total) * ((total - events) / total)) / total;
}

/** Variance of a risk difference, the groups being independent. */
export function varianceOfDifference({ index, reference }: FourfoldTable): number {
  return varianceOfRisk(index) + varianceOfRisk(reference);
}

/** Variance of the logarithm of a risk, by the delta method; infinite without events. */
export function varianceOfLogRisk({ events, total }: GroupCount): number {
  return (total - events) / total / events;
}

/** Variance of the logarithm of a risk ratio; infinite when a group has no events. */
export function varianceOfLogRiskRatio({ index, reference }: FourfoldTable): number {
  return varianceOfLogRisk(index) + varianceOfLogRisk(reference);
}

/** Variance of the logarithm of an odds; infinite without events and without others. */
export function varianceOfLogOdds({ events, total }: GroupCount): number {
  return 1 / events + 1 / (total - events);
}

/** Variance of the logarithm of an odds ratio; infinite with a zero cell. */
export function varianceOfLogOddsRatio(table: FourfoldTable): number {
  return varianceOfLogOdds(table.index) + varianceOfLogOdds(table.reference);
}
