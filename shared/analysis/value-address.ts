import type { EffectMeasureId } from '#shared/effects';

/** Which number family of a result an address points into. */
export type AddressedQuantity =
  | 'events'
  | 'total'
  | 'risk'
  | EffectMeasureId
  | 'numberNeeded'
  | 'pearson'
  | 'fisher'
  | 'association'
  | 'trend'
  | 'conditionalIndependence'
  | `homogeneity:${EffectMeasureId}`
  | 'counted'
  | 'leftOut';

/** Which number of the family. */
export type AddressFacet = 'value' | 'lower' | 'upper' | 'pValue' | 'statistic';

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
}
