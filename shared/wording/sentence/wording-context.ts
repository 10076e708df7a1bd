import type { AddressedQuantity, AddressFacet, ResultScope, ValueAddress } from '#shared/analysis';
import { decimalsUnder, type PrintedDecimals } from '#shared/format';
import type { HouseStyle } from '#shared/house-style';
import type { Claim } from '../claim';
import type { Phrasebook } from '../phrasebook/phrasebook';

/** What a sentence is made of: the claim, how numbers print, and the words. */
export interface WordingContext {
  readonly claim: Claim;
  readonly style: HouseStyle;
  readonly book: Phrasebook;
  readonly decimals: PrintedDecimals;
}

/** The context of one claim. */
export function wordingContext(claim: Claim, style: HouseStyle, book: Phrasebook): WordingContext {
  return { claim, style, book, decimals: decimalsUnder(claim.precision, style) };
}

/** The address of a number of the claim's contrast. */
export function addressOf(
  { claim }: WordingContext,
  quantity: AddressedQuantity,
  facet: AddressFacet,
): ValueAddress {
  const { analysisId, scope } = claim;
  return { analysisId, quantity, levelId: claim.index.level.id, scope, facet };
}

/** The address of a count or share of a group; a pooled claim counts over all records. */
export function countAddress(
  { claim }: WordingContext,
  quantity: AddressedQuantity,
  levelId: string,
): ValueAddress {
  const crude: ResultScope = { kind: 'crude' };
  const scope = claim.scope.kind === 'pooled' ? crude : claim.scope;
  return { analysisId: claim.analysisId, quantity, levelId, scope, facet: 'value' };
}
