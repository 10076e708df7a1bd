import type { AnalysisResult } from '../analysis-result';
import { allOrNoEvents } from './all-or-no-events';
import { commonOutcome } from './common-outcome';
import { emptyGroup } from './empty-group';
import type { Guard, GuardContext, GuardPoint, GuardSeverity } from './guard';
import { intervalAgainstTest } from './interval-against-test';
import { levelsOutOfOrder } from './levels-out-of-order';
import { noRiskByDesign } from './no-risk-by-design';
import { oneLevelExposure } from './one-level-exposure';
import { orderedAsUnordered } from './ordered-as-unordered';
import { repeatedIdentifiers } from './repeated-identifiers';
import { sparseCells } from './sparse-cells';
import { strataDisagree } from './strata-disagree';
import { stratumLeftOut } from './stratum-left-out';
import { turnedRound } from './turned-round';
import { zeroCell } from './zero-cell';

/** The guards, hardest first; findings come in this order. */
export const GUARDS = {
  oneLevelExposure,
  allOrNoEvents,
  repeatedIdentifiers,
  turnedRound,
  strataDisagree,
  emptyGroup,
  zeroCell,
  sparseCells,
  commonOutcome,
  intervalAgainstTest,
  levelsOutOfOrder,
  orderedAsUnordered,
  stratumLeftOut,
  noRiskByDesign,
} as const;

/** Id of a guard. */
export type GuardId = keyof typeof GUARDS;

/** What a guard found at one place, with its severity. */
export interface GuardFinding extends GuardPoint {
  readonly guardId: GuardId;
  readonly severity: GuardSeverity;
}

/** A context in which nothing is known beyond the result. */
export const NOTHING_KNOWN: GuardContext = { repeatedIdentifiers: null };

/** Everything that the guards find in a result, hardest first. */
export function findGuards(
  result: AnalysisResult,
  context: GuardContext = NOTHING_KNOWN,
): readonly GuardFinding[] {
  return (Object.keys(GUARDS) as GuardId[]).flatMap((guardId) => {
    const guard: Guard<GuardId> = GUARDS[guardId];
    const { severity } = guard;
    return guard.find(result, context).map((point) => ({ ...point, guardId, severity }));
  });
}
