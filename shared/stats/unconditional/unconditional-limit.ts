import type { FourfoldTable } from '../fourfold-table';
import { zeroOfDecreasing } from '../intervals/score/bisection';
import { eitherExtreme, extremeTables, isSame } from './extreme-tables';
import type { ExtremeSides, ExtremeTables } from './extreme-tables';
import type { NullFamily } from './null-family';
import { gridSize, placeAbove, supremumOf } from './supremum';
import type { NuisanceCurve } from './supremum';
import { tailProbability } from './tail-probability';
import type { TailProbability } from './tail-probability';

/** How a tested value is judged: which tables are extreme, and how probable they may be. */
export interface UnconditionalTest {
  readonly family: NullFamily;
  readonly sides: ExtremeSides;
}

/** Limits are found to this width of the tested value. */
const NARROWEST = 1e-10;

/** No stretch wider than this part of the range is left out unseen. */
const FIRST_PARTS = 16;

/**
 * At no effect many tables tie exactly, and the p-value jumps there; the tolerance of ties makes a
 * limit that lies at 0 come out this near it.
 */
const NULL_TIES = 1e-8;

/** Binomial terms this far below the largest play no part in an interval. */
const NEGLIGIBLE = 1e-18;

/**
 * The smallest tested value between two that is not refused: the first whose extreme tables have,
 * at some reference risk, a probability above `tail`. With the largest value where all are refused.
 *
 * The p-value need not be monotone, so stretches are left out only when even the tables that are
 * extreme at either end, at the most favourable risks of the whole stretch, stay below `tail`; or
 * when the same tables are extreme throughout a short stretch, over which the p-value is smooth,
 * and the parabola through three of its values stays below.
 */
export function unconditionalLowerLimit(
  table: FourfoldTable,
  test: UnconditionalTest,
  [least, most]: readonly [number, number],
  tail: number,
): number {
  const search = searchOf(table, test, tail);
  const ends = Array.from({ length: FIRST_PARTS + 1 }, (_, part) =>
    part === FIRST_PARTS ? most : least + ((most - least) * part) / FIRST_PARTS,
  );
  let from = search.placeAt(least);
  for (const end of ends.slice(1)) {
    const to = search.placeAt(end);
    const found = firstAccepted(search, from, to);
    if (found !== null) {
      return Math.abs(found) < NULL_TIES ? 0 : found;
    }
    from = to;
  }
  return most;
}

/** The exact p-value of one tested value: the largest probability of its extreme tables. */
export function unconditionalPValue(
  table: FourfoldTable,
  test: UnconditionalTest,
  tested: number,
): number {
  const { placeAt, curveBetween, size } = searchOf(table, test, 1);
  const place = placeAt(tested);
  return Math.min(1, supremumOf(curveBetween(place, place), size));
}

/** A tested value and its extreme tables. */
interface Place {
  readonly tested: number;
  readonly extreme: ExtremeTables;
}

interface Search {
  readonly tail: number;
  readonly size: number;
  /** Whether more of the tested effect makes the same extreme tables more probable. */
  readonly isMonotone: boolean;
  readonly placeAt: (tested: number) => Place;
  /** An upper bound of the probability for every tested value between two places. */
  readonly curveBetween: (from: Place, to: Place) => NuisanceCurve;
  /** Whether that bound passes the tail. */
  readonly mayAccept: (from: Place, to: Place) => boolean;
}

function searchOf(
  { index, reference }: FourfoldTable,
  test: UnconditionalTest,
  tail: number,
): Search {
  const { family, sides } = test;
  const probability = tailProbability(index.total, reference.total, NEGLIGIBLE);
  const between = (from: Place, to: Place): NuisanceCurve =>
    curveBetween(family, probability, from, to);
  const size = gridSize(Math.max(index.total, reference.total));
  let hint = 0.5;
  return {
    tail,
    size,
    isMonotone: sides === 'upper',
    placeAt(tested) {
      const scoreOf = family.scoreAt(tested);
      const observed = scoreOf(index.events, reference.events);
      const bound = sides === 'both' ? Math.abs(observed) : observed;
      const extreme = extremeTables(index.total, reference.total, scoreOf, bound, sides);
      return { tested, extreme };
    },
    curveBetween: between,
    mayAccept(from, to) {
      const above = placeAbove(between(from, to), size, tail, hint);
      hint = above ?? hint;
      return above !== null;
    },
  };
}

function curveBetween(
  family: NullFamily,
  probability: TailProbability,
  from: Place,
  to: Place,
): NuisanceCurve {
  const extreme = from === to ? from.extreme : eitherExtreme(from.extreme, to.extreme);
  const [least, most] = family.referenceRisks(from.tested, to.tested);
  return (place) => {
    const reference = least + (most - least) * Math.sin((Math.PI / 2) * place) ** 2;
    return probability(extreme, {
      reference,
      indexBelow: family.indexRisk(reference, to.tested),
      indexAbove: family.indexRisk(reference, from.tested),
    });
  };
}

function firstAccepted(search: Search, from: Place, to: Place): number | null {
  if (!search.mayAccept(from, to)) {
    return null;
  }
  const width = to.tested - from.tested;
  if (width <= NARROWEST) {
    return search.mayAccept(from, from) || search.mayAccept(to, to) ? from.tested : null;
  }
  const middle = search.placeAt(from.tested + width / 2);
  const short = search.isMonotone || width <= 1 / (4 * search.size);
  const same = [middle, to].every((place) => isSame(from.extreme, place.extreme));
  const found = short && same ? firstOnSmooth(search, from, to) : undefined;
  return found === undefined
    ? (firstAccepted(search, from, middle) ?? firstAccepted(search, middle, to))
    : found;
}

/**
 * The first accepted value of a stretch over which the same tables are extreme and the p-value is
 * smooth; null where the parabola through three values stays below the tail, undefined where that
 * cannot be told.
 */
function firstOnSmooth(
  { curveBetween: curve, size, tail }: Search,
  from: Place,
  to: Place,
): number | null | undefined {
  const pValue = (tested: number): number => {
    const place = { tested, extreme: from.extreme };
    return supremumOf(curve(place, place), size);
  };
  const [first, last] = [pValue(from.tested), pValue(to.tested)];
  if (first > tail) {
    return from.tested;
  }
  if (last > tail) {
    const shortfall = (tested: number): number => Math.log(tail / pValue(tested));
    return zeroOfDecreasing(shortfall, from.tested, to.tested);
  }
  const second = pValue((from.tested + to.tested) / 2);
  const bend = Math.max(0, second - (first + last) / 2);
  return Math.max(first, second, last) + bend <= tail ? null : undefined;
}
