import type { AddressedQuantity, AnalysisResult, ResultScope } from '#shared/analysis';
import { layerAt, pooledAt, printedTest, scopeKey } from '#shared/analysis';
import type { Result } from '#shared/core';
import { ADJUSTMENTS, adjustPValues } from '#shared/stats';
import type { AdjustmentId, EstimationIssue, TestOutcome } from '#shared/stats';
import type { TablePlan } from './table-plan';

/** Whether a table prints p-values, and how they are adjusted for their number. */
export const P_VALUE_CHOICES = ['none', 'unadjusted', ...adjustmentIds()] as const;

/** One of the ways to print p-values. */
export type PValueChoice = (typeof P_VALUE_CHOICES)[number];

/** A p-value of a table as it prints, with the number of the result that it comes from. */
export interface PlacedPValue {
  readonly scope: ResultScope;
  readonly levelId: string;
  readonly quantity: AddressedQuantity;
  readonly method: string;
  /** Adjusted, where the table adjusts. */
  readonly pValue: number;
}

/** All p-values of a table; together they are the family that is adjusted for. */
export interface TablePValues {
  readonly adjustment: AdjustmentId | null;
  /** By layer and level, in the order of the table. */
  readonly placed: ReadonlyMap<string, PlacedPValue>;
}

/**
 * The p-values of the contrasts that a table shows, adjusted over all of them together; null where
 * it shows none. A contrast whose test is not defined has none, and is not counted.
 */
export function tablePValues(
  choice: PValueChoice | undefined,
  plan: TablePlan,
  result: AnalysisResult,
): TablePValues | null {
  if (choice === undefined || choice === 'none') return null;
  const raw = plan.layers.flatMap(({ scope }) => pValuesAt(scope, result));
  if (choice === 'unadjusted') return { adjustment: null, placed: byPlace(raw) };
  const adjusted = adjustPValues(
    choice,
    raw.map(({ pValue }) => pValue),
  );
  const placed = raw.map((each, at) => ({ ...each, pValue: adjusted[at] ?? each.pValue }));
  return { adjustment: choice, placed: byPlace(placed) };
}

/** The p-value of a level in a layer, if there is one. */
export function pValueAt(
  { placed }: TablePValues,
  scope: ResultScope,
  levelId: string,
): PlacedPValue | undefined {
  return placed.get(placeKey(scope, levelId));
}

function byPlace(placed: readonly PlacedPValue[]): ReadonlyMap<string, PlacedPValue> {
  return new Map(placed.map((each) => [placeKey(each.scope, each.levelId), each]));
}

function placeKey(scope: ResultScope, levelId: string): string {
  return `${scopeKey(scope)}/${levelId}`;
}

function adjustmentIds(): readonly AdjustmentId[] {
  return Object.keys(ADJUSTMENTS) as AdjustmentId[];
}

function pValuesAt(scope: ResultScope, result: AnalysisResult): readonly PlacedPValue[] {
  const { levels, referenceLevelId } = result.frame.exposure;
  const compared = levels.map(({ id }) => id).filter((id) => id !== referenceLevelId);
  return compared.flatMap((levelId) => {
    const tested = testAt(scope, levelId, result);
    if (tested?.outcome.ok !== true) return [];
    const { method, pValue } = tested.outcome.value;
    return [{ scope, levelId, quantity: tested.quantity, method, pValue }];
  });
}

interface Tested {
  readonly quantity: AddressedQuantity;
  readonly outcome: Result<TestOutcome, EstimationIssue>;
}

function testAt(scope: ResultScope, levelId: string, result: AnalysisResult): Tested | undefined {
  if (scope.kind === 'pooled') {
    const outcome = pooledAt(result, levelId)?.conditionalIndependence;
    return outcome && { quantity: 'conditionalIndependence', outcome };
  }
  const layer = layerAt(result, scope);
  const contrast = layer?.contrasts.find(({ indexLevelId }) => indexLevelId === levelId);
  return layer && contrast && printedTest(result, layer, contrast);
}
