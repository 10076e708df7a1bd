import { failure, success } from '#shared/core';
import type { Issue, Result } from '#shared/core';
import { EFFECT_MEASURES, numberNeeded } from '#shared/effects';
import type { EffectMeasureId } from '#shared/effects';
import { designGivesRisk } from '#shared/effects/study-design';
import type {
  Estimate,
  EstimationIssue,
  EstimationIssueCode,
  GroupCount,
  Interaction,
  Interval,
  TestOutcome,
} from '#shared/stats';
import type { AnalysisResult, LayerResult, PooledContrastResult } from './analysis-result';
import { readCaseControl } from './read-case-control';
import { eValueAt, fractionInExposedAt, populationFractionAt } from './read-impact';
import { contrastTable, layerAt, pooledAt } from './result-places';
import type { Quantity } from './quantity';
import type {
  AddressedQuantity,
  AddressFacet,
  CaseControlQuantity,
  ValueAddress,
} from './value-address';

/** Why an address gives no number: nothing is there, the number is infinite, or not estimable. */
export type ValueIssue = Issue<EstimationIssueCode | 'addressNotInResult' | 'infinite'>;

type Reading = Result<Quantity, ValueIssue>;

/**
 * The number at an address of a result: a fraction of whole numbers where the counts give one, a
 * count, or a real number.
 *
 * A place that the result does not have gives `addressNotInResult`; a number that is not defined
 * gives its own issue; an infinite number needed gives `infinite`.
 */
export function readValue(result: AnalysisResult, address: ValueAddress): Reading {
  return READERS[address.quantity](result, address);
}

const NOT_THERE: ValueIssue = { code: 'addressNotInResult' };

const READERS: Readonly<
  Record<AddressedQuantity, (result: AnalysisResult, address: ValueAddress) => Reading>
> = {
  events: (result, address) => readCount(result, address, 'events'),
  total: (result, address) => readCount(result, address, 'total'),
  risk: readRisk,
  riskDifference: (result, address) => readMeasure('riskDifference', result, address),
  riskRatio: (result, address) => readMeasure('riskRatio', result, address),
  oddsRatio: (result, address) => readMeasure('oddsRatio', result, address),
  numberNeeded: readNumberNeeded,
  test: (result, address) => readTest(contrastAt(result, address)?.test, address.facet),
  pearson: (result, address) => readTest(contrastAt(result, address)?.pearson, address.facet),
  fisher: (result, address) => readTest(contrastAt(result, address)?.fisher, address.facet),
  association: (result, address) =>
    readTest(wholeLayer(result, address)?.association, address.facet),
  trend: (result, address) => readTest(wholeLayer(result, address)?.trend, address.facet),
  conditionalIndependence: (result, address) =>
    readTest(pooledContrast(result, address)?.conditionalIndependence, address.facet),
  'homogeneity:riskDifference': (result, address) =>
    readHomogeneity('riskDifference', result, address),
  'homogeneity:riskRatio': (result, address) => readHomogeneity('riskRatio', result, address),
  'homogeneity:oddsRatio': (result, address) => readHomogeneity('oddsRatio', result, address),
  'interaction:riskDifference': (result, address) =>
    readInteraction(interactionAt('riskDifference', result, address), address.facet),
  'interaction:riskRatio': (result, address) =>
    readInteraction(interactionAt('riskRatio', result, address), address.facet),
  'interaction:oddsRatio': (result, address) =>
    readInteraction(interactionAt('oddsRatio', result, address), address.facet),
  excessRisk: (result, address) =>
    readInteraction(pooledContrast(result, address)?.excessRisk, address.facet),
  fractionInExposed: (result, address) =>
    readReal(fractionInExposedAt(result, address), ({ value, interval }) =>
      estimateFacet(address.facet, value, interval),
    ),
  populationFraction: (result, address) =>
    readReal(populationFractionAt(result, address), ({ value, interval }) =>
      estimateFacet(address.facet, value, interval),
    ),
  eValue: (result, address) =>
    readReal(eValueAt(result, address), ({ ofValue, ofLimit }) => {
      const parts: Partial<Record<AddressFacet, number>> = { value: ofValue, lower: ofLimit };
      return parts[address.facet] ?? null;
    }),
  counted: (result, address) => readWholeCount(result.counted, address),
  leftOut: (result, address) =>
    readWholeCount(
      result.leftOut.reduce((sum, { count }) => sum + count, 0),
      address,
    ),
  controls: caseControl('controls'),
  shareOfCases: caseControl('shareOfCases'),
  shareOfControls: caseControl('shareOfControls'),
  comparedCases: caseControl('comparedCases'),
  comparedControls: caseControl('comparedControls'),
  shareOfComparedCases: caseControl('shareOfComparedCases'),
  shareOfComparedControls: caseControl('shareOfComparedControls'),
  // It stands beside results, in the report's sources.
  outsideEstimate: () => failure(NOT_THERE),
};

function caseControl(
  quantity: CaseControlQuantity,
): (result: AnalysisResult, address: ValueAddress) => Reading {
  return (result, address) => readCaseControl(result, { ...address, quantity });
}

function readWholeCount(count: number, { levelId, scope, facet }: ValueAddress): Reading {
  const there = levelId === null && scope.kind === 'crude' && facet === 'value';
  return there ? success({ kind: 'count', count }) : failure(NOT_THERE);
}

function readCount(result: AnalysisResult, address: ValueAddress, part: keyof GroupCount): Reading {
  const count = groupCount(layerAt(result, address.scope), address.levelId);
  return count && address.facet === 'value'
    ? success({ kind: 'count', count: count[part] })
    : failure(NOT_THERE);
}

function groupCount(
  layer: LayerResult | undefined,
  levelId: string | null,
): GroupCount | undefined {
  return levelId === null
    ? layer?.total
    : layer?.levels.find((level) => level.levelId === levelId)?.count;
}

function readRisk(result: AnalysisResult, address: ValueAddress): Reading {
  const layer = layerAt(result, address.scope);
  const { levelId, facet } = address;
  if (levelId === null) {
    return facet === 'value' && layer ? totalRisk(result, layer) : failure(NOT_THERE);
  }
  const level = layer?.levels.find((candidate) => candidate.levelId === levelId);
  return level
    ? readEstimate(level.risk, facet, () => fractionOf(level.count))
    : failure(NOT_THERE);
}

function totalRisk({ frame }: AnalysisResult, { total }: LayerResult): Reading {
  if (!designGivesRisk(frame.design)) {
    return failure({ code: 'notGivenByDesign' });
  }
  return total.total === 0 ? failure({ code: 'emptyGroup' }) : success(fractionOf(total));
}

function fractionOf({ events, total }: GroupCount): Quantity {
  return { kind: 'fraction', numerator: events, denominator: total };
}

function readMeasure(id: EffectMeasureId, result: AnalysisResult, address: ValueAddress): Reading {
  return readEstimate(estimateAt(id, result, address), address.facet, () =>
    exactOf(id, result, address),
  );
}

function estimateAt(
  id: EffectMeasureId,
  result: AnalysisResult,
  address: ValueAddress,
): Result<Estimate, EstimationIssue> | undefined {
  const contrast = pooledContrast(result, address) ?? contrastAt(result, address);
  return contrast?.measures[id];
}

/**
 * The fraction behind a contrast's estimate; null for pooled ones, which are sums of fractions, and
 * for a method with its own point estimate.
 */
function exactOf(
  id: EffectMeasureId,
  result: AnalysisResult,
  address: ValueAddress,
): Quantity | null {
  const table = contrastTable(layerAt(result, address.scope), address.levelId);
  const methodId = result.specification.methods[id];
  const fraction = table ? EFFECT_MEASURES[id].fraction(table, methodId) : null;
  return fraction && { kind: 'fraction', ...fraction };
}

function readEstimate(
  estimate: Result<Estimate, EstimationIssue> | undefined,
  facet: AddressFacet,
  exact: () => Quantity | null,
): Reading {
  if (!estimate?.ok) {
    return failure(estimate?.issue ?? NOT_THERE);
  }
  const { value, interval } = estimate.value;
  switch (facet) {
    case 'value':
      return success(exact() ?? { kind: 'real', value });
    case 'lower':
    case 'upper':
      return success({ kind: 'real', value: interval[facet] });
    case 'pValue':
    case 'statistic':
      return failure(NOT_THERE);
  }
}

function readNumberNeeded(result: AnalysisResult, address: ValueAddress): Reading {
  const difference = estimateAt('riskDifference', result, address);
  if (!difference?.ok) {
    return failure(difference?.issue ?? NOT_THERE);
  }
  const exact = exactOf('riskDifference', result, address);
  const fraction = exact?.kind === 'fraction' ? exact : null;
  const { value, limits } = numberNeeded(difference.value, fraction);
  const [lower, upper] =
    limits.kind === 'oneSided' ? [limits.nearest, limits.farthest] : [limits.fewer, limits.more];
  const counts: Readonly<Record<AddressFacet, number | null | undefined>> = {
    value: value.count,
    lower,
    upper,
    pValue: undefined,
    statistic: undefined,
  };
  return readFiniteCount(counts[address.facet]);
}

function readFiniteCount(count: number | null | undefined): Reading {
  if (count === undefined) {
    return failure(NOT_THERE);
  }
  return count === null ? failure({ code: 'infinite' }) : success({ kind: 'count', count });
}

function readTest(
  outcome: Result<TestOutcome, EstimationIssue> | undefined,
  facet: AddressFacet,
): Reading {
  if (!outcome?.ok) {
    return failure(outcome?.issue ?? NOT_THERE);
  }
  const value = facet === 'pValue' || facet === 'statistic' ? outcome.value[facet] : null;
  return value === null ? failure(NOT_THERE) : success({ kind: 'real', value });
}

function readHomogeneity(
  id: EffectMeasureId,
  result: AnalysisResult,
  address: ValueAddress,
): Reading {
  return readTest(pooledContrast(result, address)?.homogeneity[id], address.facet);
}

function interactionAt(
  id: EffectMeasureId,
  result: AnalysisResult,
  address: ValueAddress,
): Result<Interaction, EstimationIssue> | undefined {
  return pooledContrast(result, address)?.interaction?.[id];
}

function readInteraction(
  interaction: Result<Interaction, EstimationIssue> | undefined,
  facet: AddressFacet,
): Reading {
  return readReal(interaction, ({ estimate, test }) =>
    facet === 'pValue' || facet === 'statistic'
      ? test[facet]
      : estimateFacet(facet, estimate.value, estimate.interval),
  );
}

function estimateFacet(
  facet: AddressFacet,
  value: number,
  { lower, upper }: Interval,
): number | null {
  const parts: Partial<Record<AddressFacet, number>> = { value, lower, upper };
  return parts[facet] ?? null;
}

/** A real number of something that may not be estimable, or may not be there. */
function readReal<Found>(
  found: Result<Found, EstimationIssue> | undefined,
  partOf: (found: Found) => number | null,
): Reading {
  if (!found?.ok) {
    return failure(found?.issue ?? NOT_THERE);
  }
  const value = partOf(found.value);
  return value === null ? failure(NOT_THERE) : success({ kind: 'real', value });
}

function contrastAt(
  result: AnalysisResult,
  { scope, levelId }: ValueAddress,
): LayerResult['contrasts'][number] | undefined {
  const layer = layerAt(result, scope);
  return layer?.contrasts.find(({ indexLevelId }) => indexLevelId === levelId);
}

function pooledContrast(
  result: AnalysisResult,
  { scope, levelId }: ValueAddress,
): PooledContrastResult | undefined {
  return scope.kind === 'pooled' ? pooledAt(result, levelId) : undefined;
}

function wholeLayer(
  result: AnalysisResult,
  { scope, levelId }: ValueAddress,
): LayerResult | undefined {
  return levelId === null ? layerAt(result, scope) : undefined;
}
