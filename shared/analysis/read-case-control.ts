import { failure, success } from '#shared/core';
import type { Result } from '#shared/core';
import type { EstimationIssue, GroupCount } from '#shared/stats';
import type { AnalysisResult, LayerResult } from './analysis-result';
import { shareEstimate } from './compute-layer';
import { contrastTable, layerAt } from './result-places';
import type { Quantity } from './quantity';
import type { AddressedQuantity, CaseControlQuantity, ValueAddress } from './value-address';

/** Why a case–control number is not there. */
export type CaseControlIssue = EstimationIssue | { readonly code: 'addressNotInResult' };

type Reading = Result<Quantity, CaseControlIssue>;

/**
 * A number that only a case–control study gives: controls, and the shares of its cases and controls
 * that are at a level, with limits. `compared…` ones look at the level and the reference only.
 */
export function readCaseControl(
  result: AnalysisResult,
  address: ValueAddress & { readonly quantity: CaseControlQuantity },
): Reading {
  const layer = layerAt(result, address.scope);
  if (result.frame.design !== 'caseControl') {
    return failure({ code: 'notGivenByDesign' });
  }
  if (!layer) {
    return NOT_THERE;
  }
  return address.facet === 'value'
    ? READERS[address.quantity](layer, address.levelId)
    : readLimit(result, layer, address);
}

/** Only the shares of all cases and of all controls have limits. */
function readLimit(
  { specification }: AnalysisResult,
  layer: LayerResult,
  { quantity, levelId, facet }: ValueAddress,
): Reading {
  const part = LIMITED[quantity];
  const group = countAt(layer, levelId);
  if (!part || !group || (facet !== 'lower' && facet !== 'upper')) {
    return NOT_THERE;
  }
  const estimate = shareEstimate(specification, { events: part(group), total: part(layer.total) });
  return estimate.ok ? success({ kind: 'real', value: estimate.value.interval[facet] }) : estimate;
}

const NOT_THERE = failure({ code: 'addressNotInResult' } as const);

const READERS: Readonly<
  Record<CaseControlQuantity, (layer: LayerResult, levelId: string | null) => Reading>
> = {
  controls: (layer, levelId) => {
    const count = levelId === null ? layer.total : countAt(layer, levelId);
    return count ? success({ kind: 'count', count: controlsOf(count) }) : NOT_THERE;
  },
  shareOfCases: (layer, levelId) => share(countAt(layer, levelId), layer.total, casesOf),
  shareOfControls: (layer, levelId) => share(countAt(layer, levelId), layer.total, controlsOf),
  comparedCases: (layer, levelId) => compared(layer, levelId, casesOf),
  comparedControls: (layer, levelId) => compared(layer, levelId, controlsOf),
  shareOfComparedCases: (layer, levelId) =>
    share(countAt(layer, levelId), bothGroups(layer, levelId), casesOf),
  shareOfComparedControls: (layer, levelId) =>
    share(countAt(layer, levelId), bothGroups(layer, levelId), controlsOf),
};

const LIMITED: Readonly<Partial<Record<AddressedQuantity, (count: GroupCount) => number>>> = {
  shareOfCases: casesOf,
  shareOfControls: controlsOf,
};

function casesOf({ events }: GroupCount): number {
  return events;
}

function controlsOf({ events, total }: GroupCount): number {
  return total - events;
}

function countAt(layer: LayerResult, levelId: string | null): GroupCount | undefined {
  return layer.levels.find((level) => level.levelId === levelId)?.count;
}

function bothGroups(layer: LayerResult, indexLevelId: string | null): GroupCount | undefined {
  const table = contrastTable(layer, indexLevelId);
  return (
    table && {
      events: table.index.events + table.reference.events,
      total: table.index.total + table.reference.total,
    }
  );
}

function compared(
  layer: LayerResult,
  levelId: string | null,
  part: (count: GroupCount) => number,
): Reading {
  const both = bothGroups(layer, levelId);
  return both ? success({ kind: 'count', count: part(both) }) : NOT_THERE;
}

function share(
  group: GroupCount | undefined,
  whole: GroupCount | undefined,
  part: (count: GroupCount) => number,
): Reading {
  if (!group || !whole) {
    return NOT_THERE;
  }
  return part(whole) === 0
    ? failure({ code: 'emptyGroup' })
    : success({ kind: 'fraction', numerator: part(group), denominator: part(whole) });
}
