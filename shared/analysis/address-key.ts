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
    address.quantity,
    address.levelId === null ? ALL_LEVELS : encodeURIComponent(address.levelId),
    scopeKey(address.scope),
    address.facet,
  ].join('/');
}

function scopeKey(scope: ResultScope): string {
  return scope.kind === 'stratum' ? `stratum:${encodeURIComponent(scope.stratumId)}` : scope.kind;
}

/** Reads the text that `addressKey` wrote; anything else gives `malformedAddress`. */
export function parseAddress(key: string): Result<ValueAddress, Issue<'malformedAddress'>> {
  const malformed = failure({ code: 'malformedAddress' as const, facts: { key } });
  const [analysis, quantity, level, scopeText, facet, ...rest] = key.split('/');
  const analysisId = decoded(analysis);
  const scope = scopeOf(scopeText);
  const levelId = level === ALL_LEVELS ? null : decoded(level);
  if (rest.length > 0 || analysisId === undefined || levelId === undefined || !scope) {
    return malformed;
  }
  return isAddressedQuantity(quantity) && isAddressFacet(facet)
    ? success({ analysisId, quantity, levelId, scope, facet })
    : malformed;
}

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
