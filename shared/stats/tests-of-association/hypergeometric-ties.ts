import { logHypergeometricWeight } from '../distributions';
import type { Urn } from '../distributions';

/** Logarithms farther apart than this differ for certain; nearer ones are decided exactly. */
const CERTAIN = 1e-8;

/** Beyond this distance the exact product is too long; two such near values count as tied. */
const LONGEST_PRODUCT = 5000;

/**
 * Whether counts are no likelier than a given one of the same urn, with ties decided by whole
 * numbers: floating-point sums of tied tables would fall on either side.
 */
export function noLikelierThan(given: number, urn: Urn): (count: number) => boolean {
  const givenWeight = logHypergeometricWeight(given, urn);
  return (count) => {
    if (count === given || areMirrored(count, given, urn)) {
      return true;
    }
    const difference = logHypergeometricWeight(count, urn) - givenWeight;
    if (Math.abs(difference) > CERTAIN || Math.abs(count - given) > LONGEST_PRODUCT) {
      return difference <= CERTAIN;
    }
    return count > given
      ? !climbs(given, count, urn, 'strictly')
      : climbs(count, given, urn, 'orStays');
  };
}

/** Two counts that swapping equal margins turns into each other are equally likely. */
function areMirrored(count: number, other: number, { marked, unmarked, drawn }: Urn): boolean {
  const equalGroups = marked === unmarked && count === drawn - other;
  const equalOutcomes = 2 * drawn === marked + unmarked && count === marked - other;
  return equalGroups || equalOutcomes;
}

/** Whether the probability at `to` is above that at `from` (or not below it); from < to. */
function climbs(from: number, to: number, urn: Urn, how: 'strictly' | 'orStays'): boolean {
  let rise = 1n;
  let fall = 1n;
  for (let count = from; count < to; count += 1) {
    rise *= BigInt(urn.marked - count) * BigInt(urn.drawn - count);
    fall *= BigInt(count + 1) * BigInt(urn.unmarked - urn.drawn + count + 1);
  }
  return how === 'strictly' ? rise > fall : rise >= fall;
}
