import { EFFECT_MEASURE_IDS } from '#shared/effects/measure-ids';
import type { EffectMeasureId } from '#shared/effects/measure-ids';

/** What only cases and controls give; `compared…` counts a level and the reference only. */
export const CASE_CONTROL_QUANTITIES = [
  'controls',
  'shareOfCases',
  'shareOfControls',
  'comparedCases',
  'comparedControls',
  'shareOfComparedCases',
  'shareOfComparedControls',
] as const;

/** One of the quantities of a case–control study. */
export type CaseControlQuantity = (typeof CASE_CONTROL_QUANTITIES)[number];

const PLAIN_QUANTITIES = [
  'events',
  'total',
  'risk',
  ...EFFECT_MEASURE_IDS,
  'numberNeeded',
  'test',
  'pearson',
  'fisher',
  'association',
  'trend',
  'conditionalIndependence',
  'excessRisk',
  'fractionInExposed',
  'populationFraction',
  'eValue',
  'counted',
  'leftOut',
  ...CASE_CONTROL_QUANTITIES,
  'outsideEstimate',
] as const;

/** Which number family of a result an address points into. */
export type AddressedQuantity =
  | (typeof PLAIN_QUANTITIES)[number]
  | `homogeneity:${EffectMeasureId}`
  | `interaction:${EffectMeasureId}`;

const ADDRESS_FACETS = ['value', 'lower', 'upper', 'pValue', 'statistic'] as const;

/**
 * Which number of the family. The `lower` and `upper` of a number needed are the smaller and the
 * larger count; where its limits run through infinity, `lower` is the count for one fewer event and
 * `upper` the count for one more. The `lower` of an E-value is that of the limit nearer to 1.
 */
export type AddressFacet = (typeof ADDRESS_FACETS)[number];

/** Where in a result: over all records, within one stratum, or pooled over strata. */
export type ResultScope =
  | { readonly kind: 'crude' }
  | { readonly kind: 'stratum'; readonly stratumId: string }
  | { readonly kind: 'pooled' };

/**
 * The lasting place of one number: analysis, quantity, level, scope, facet; ids only, never a label
 * or an index. `levelId` is null for numbers about all levels (a total, a trend).
 */
export interface ValueAddress {
  readonly analysisId: string;
  readonly quantity: AddressedQuantity;
  readonly levelId: string | null;
  readonly scope: ResultScope;
  readonly facet: AddressFacet;
  /** Which estimate from elsewhere; given for `outsideEstimate` only, whose scope is `crude`. */
  readonly estimateId?: string;
}

const QUANTITIES: ReadonlySet<string> = new Set([
  ...PLAIN_QUANTITIES,
  ...EFFECT_MEASURE_IDS.flatMap((id) => [`homogeneity:${id}`, `interaction:${id}`]),
]);

/** Whether a text names a quantity that an address can point to. */
export function isAddressedQuantity(text: string | undefined): text is AddressedQuantity {
  return text !== undefined && QUANTITIES.has(text);
}

const FACETS: ReadonlySet<string> = new Set(ADDRESS_FACETS);

/** Whether a text names a facet of an address. */
export function isAddressFacet(text: string | undefined): text is AddressFacet {
  return text !== undefined && FACETS.has(text);
}
