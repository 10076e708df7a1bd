import type { AnalysisResult } from '../analysis-result';
import type { Guard, GuardPoint } from './guard';

/**
 * A stratum that no pooled number could use. Facts: code (of the issue), group ("index" or
 * "reference", for an empty group, or "" otherwise), levelIds (the contrasts concerned).
 */
export const stratumLeftOut = {
  id: 'stratumLeftOut',
  severity: 'note',
  source:
    'Mantel N, Haenszel W. Statistical aspects of the analysis of data from retrospective studies ' +
    'of disease. Journal of the National Cancer Institute 1959;22:719-748.',
  find: (result) => result.frame.strata.flatMap(({ id }) => pointsOf(result, id)),
} as const satisfies Guard<'stratumLeftOut'>;

function pointsOf({ pooled }: AnalysisResult, stratumId: string): readonly GuardPoint[] {
  const dropped = pooled.flatMap(({ indexLevelId, leftOut }) =>
    leftOut
      .filter((stratum) => stratum.stratumId === stratumId)
      .map(({ issue }) => ({
        indexLevelId,
        code: issue.code,
        group: issue.facts?.group ?? '',
      })),
  );
  const reasons = new Map(dropped.map((one) => [`${one.code} ${String(one.group)}`, one]));
  return [...reasons.values()].map(({ code, group }) => {
    const same = dropped.filter((one) => one.code === code && one.group === group);
    const levelIds = same.map(({ indexLevelId }) => indexLevelId);
    const levelId = levelIds.length === 1 && pooled.length > 1 ? (levelIds[0] ?? null) : null;
    return {
      place: { scope: { kind: 'stratum', stratumId }, levelId },
      facts: { code, group, levelIds },
    };
  });
}
