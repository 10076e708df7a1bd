import { failure, success } from '#shared/core';
import type { Issue, Result } from '#shared/core';
import { isAddressFacet, isAddressedQuantity } from './value-address';
import type { ResultScope, ValueAddress } from './value-address';

/** Stands for "all levels"; no encoded id holds an unescaped "@". */
const ALL_LEVELS = '@all';

/**
 * An address as one line of text: analysis, quantity, level, scope and facet, ids percent-encoded,
 * joined by "/". Equal addresses have equal keys. `parseAddress` reads it back.
 *
 * Example: `a7/riskDifference/daily/stratum:kitchen/upper`.
 */
export function addressKey(address: ValueAddress): string {
  return [
    encodeURIComponent(address.analysisId),
    quantityKey(address),
    address.levelId === null ? ALL_LEVELS : encodeURIComponent(address.levelId),
    scopeKey(address.scope),
    address.facet,
  ].join('/');
}

function quantityKey({ quantity, estimateId }: ValueAddress): string {
  return estimateId === undefined ? quantity : `${quantity}:${encodeURIComponent(estimateId)}`;
}

/** A scope as the part of an address: text that only this scope has. */
export function scopeKey(scope: ResultScope): string {
  return scope.kind === 'stratum' ? `stratum:${encodeURIComponent(scope.stratumId)}` : scope.kind;
}

/** Reads the text that `addressKey` wrote; anything else gives `malformedAddress`. */
export function parseAddress(key: string): Result<ValueAddress, Issue<'malformedAddress'>> {
  const malformed = failure({ code: 'malformedAddress' as const, facts: { key } });
  const [analysis, quantityText, level, scopeText, facet, ...rest] = key.split('/');
  const analysisId = decoded(analysis);
  const scope = scopeOf(scopeText);
  const levelId = level === ALL_LEVELS ? null : decoded(level);
  const quantity = quantityOf(quantityText);
  if (rest.length > 0 || analysisId === undefined || levelId === undefined || !scope) {
    return malformed;
  }
  return quantity && isAddressFacet(facet)
    ? success({ analysisId, levelId, scope, facet, ...quantity })
    : malformed;
}

/** An estimate from elsewhere carries its id behind the quantity; no other quantity has one. */
function quantityOf(
  text: string | undefined,
): Pick<ValueAddress, 'quantity' | 'estimateId'> | undefined {
  if (text?.startsWith(OUTSIDE)) {
    const estimateId = decoded(text.slice(OUTSIDE.length));
    return estimateId ? { quantity: 'outsideEstimate', estimateId } : undefined;
  }
  return isAddressedQuantity(text) && text !== 'outsideEstimate' ? { quantity: text } : undefined;
}

const OUTSIDE = 'outsideEstimate:';

function scopeOf(text: string | undefined): ResultScope | undefined {
  if (text === 'crude' || text === 'pooled') {
    return { kind: text };
  }
  const stratumId = text?.startsWith('stratum:')
    ? decoded(text.slice('stratum:'.length))
    : undefined;
  return stratumId === undefined ? undefined : { kind: 'stratum', stratumId };
}

function decoded(text: string | undefined): string | undefined {
  try {
    return text === undefined ? undefined : decodeURIComponent(text);
  } catch {
    return undefined;
  }
}
