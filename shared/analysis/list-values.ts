import { EFFECT_MEASURE_IDS } from '#shared/effects/measure-ids';
import type { AnalysisResult } from './analysis-result';
import type { Quantity } from './quantity';
import { readValue } from './read-value';
import { CASE_CONTROL_QUANTITIES } from './value-address';
import type { AddressedQuantity, AddressFacet, ResultScope, ValueAddress } from './value-address';

/** A number of a result with its place. */
export interface AddressedValue {
  readonly address: ValueAddress;
  readonly quantity: Quantity;
}

/**
 * Every number of a result, each with its address: totals, then the crude layer, the strata and the
 * pooled contrasts, in the order of the frame. What is not defined is not listed.
 */
export function listValues(result: AnalysisResult, analysisId: string): readonly AddressedValue[] {
  return placesOf(result).flatMap(({ quantity, levelId, scope, facets }) =>
    facets.flatMap((facet) => {
      const address: ValueAddress = { analysisId, quantity, levelId, scope, facet };
      const value = readValue(result, address);
      return value.ok ? [{ address, quantity: value.value }] : [];
    }),
  );
}

interface Place extends Omit<ValueAddress, 'analysisId' | 'facet'> {
  readonly facets: readonly AddressFacet[];
}

const VALUE: readonly AddressFacet[] = ['value'];
const ESTIMATE: readonly AddressFacet[] = ['value', 'lower', 'upper'];
const TEST: readonly AddressFacet[] = ['statistic', 'pValue'];

function placesOf(result: AnalysisResult): readonly Place[] {
  const crude: ResultScope = { kind: 'crude' };
  const strata = result.frame.strata.map(({ id }) => ({ kind: 'stratum', stratumId: id }) as const);
  return [
    ...placesAt(crude, null, VALUE, ['counted', 'leftOut']),
    ...layerPlaces(result, crude),
    ...strata.flatMap((scope) => layerPlaces(result, scope)),
    ...(result.pooled.length > 0 ? pooledPlaces(result) : []),
  ];
}

function layerPlaces(result: AnalysisResult, scope: ResultScope): readonly Place[] {
  const { levels, referenceLevelId } = result.frame.exposure;
  return [
    ...placesAt(scope, null, VALUE, ['events', 'total', 'risk']),
    ...placesAt(scope, null, TEST, ['association', 'trend']),
    ...caseControlPlaces(result, scope),
    ...levels.flatMap(({ id }) => [
      ...placesAt(scope, id, VALUE, ['events', 'total']),
      ...placesAt(scope, id, ESTIMATE, ['risk']),
      ...(id === referenceLevelId ? [] : contrastPlaces(scope, id)),
    ]),
  ];
}

/** Elsewhere than in a case–control study these places hold nothing. */
function caseControlPlaces({ frame }: AnalysisResult, scope: ResultScope): readonly Place[] {
  if (frame.design !== 'caseControl') {
    return [];
  }
  return [
    ...placesAt(scope, null, VALUE, ['controls']),
    ...frame.exposure.levels.flatMap(({ id }) =>
      placesAt(scope, id, ESTIMATE, CASE_CONTROL_QUANTITIES),
    ),
  ];
}

function contrastPlaces(scope: ResultScope, levelId: string): readonly Place[] {
  return [
    ...placesAt(scope, levelId, ESTIMATE, [...EFFECT_MEASURE_IDS, 'numberNeeded']),
    ...placesAt(scope, levelId, ESTIMATE, IMPACT),
    ...placesAt(scope, levelId, TEST, ['test', 'pearson', 'fisher']),
  ];
}

const INTERACTIONS: readonly AddressedQuantity[] = [
  ...EFFECT_MEASURE_IDS.map((id) => `interaction:${id}` as const),
  'excessRisk',
];

const IMPACT = ['fractionInExposed', 'populationFraction', 'eValue'] as const;

function pooledPlaces(result: AnalysisResult): readonly Place[] {
  const scope: ResultScope = { kind: 'pooled' };
  const homogeneity = EFFECT_MEASURE_IDS.map((id) => `homogeneity:${id}` as const);
  return result.pooled.flatMap(({ indexLevelId }) => [
    ...placesAt(scope, indexLevelId, ESTIMATE, [...EFFECT_MEASURE_IDS, 'numberNeeded']),
    ...placesAt(scope, indexLevelId, ESTIMATE, IMPACT),
    ...placesAt(scope, indexLevelId, TEST, ['conditionalIndependence', ...homogeneity]),
    ...placesAt(scope, indexLevelId, [...ESTIMATE, ...TEST], INTERACTIONS),
  ]);
}

function placesAt(
  scope: ResultScope,
  levelId: string | null,
  facets: readonly AddressFacet[],
  quantities: readonly AddressedQuantity[],
): readonly Place[] {
  return quantities.map((quantity) => ({ quantity, levelId, scope, facets }));
}
