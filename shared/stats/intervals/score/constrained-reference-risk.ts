import type { FourfoldCells } from '../../check-counts';

/** More steps than Newton's method, bisecting where it leaves the bracket, ever took. */
const MOST_STEPS = 120;

/** A Newton step this small, relative to the risk, leaves an error of about its square. */
const SETTLED = 1e-8;

/**
 * The maximum likelihood risk of the reference group when the index group's is larger by a given
 * difference within [-1, 1].
 *
 * The closed root of the cubic is a start only: it loses six digits with risks near 1e-7. Newton
 * steps on the likelihood equation, kept inside a bracket, bring it to the last digits.
 * Source: Miettinen and Nurminen (1985) Statistics in Medicine 4:213-226.
 */
export function constrainedReferenceRisk(cells: FourfoldCells, difference: number): number {
  const { indexEvents, indexOthers, referenceEvents, referenceOthers } = cells;
  let lower = Math.max(0, -difference);
  let upper = Math.min(1, 1 - difference);
  if (!risesAtLower(cells, lower, difference)) {
    return lower;
  }
  if (!fallsAtUpper(cells, upper, difference)) {
    return upper;
  }
  let risk = inside(closedRoot(cells, difference), lower, upper);
  for (let step = 0; step < MOST_STEPS; step += 1) {
    const one = 1 / (risk + difference);
    const two = 1 / (1 - risk - difference);
    const three = 1 / risk;
    const four = 1 / (1 - risk);
    const slope =
      indexEvents * one - indexOthers * two + referenceEvents * three - referenceOthers * four;
    const steepness =
      indexEvents * one * one +
      indexOthers * two * two +
      referenceEvents * three * three +
      referenceOthers * four * four;
    if (slope > 0) {
      lower = risk;
    } else {
      upper = risk;
    }
    const next = risk + slope / steepness;
    const isSettled = Math.abs(next - risk) <= SETTLED * Math.min(risk, 1 - risk);
    if (isSettled && next >= lower && next <= upper) {
      return next;
    }
    risk = inside(next, lower, upper);
  }
  return risk;
}

/** Without a cell whose share is infinite there, the likelihood may be highest at the end. */
function risesAtLower(cells: FourfoldCells, risk: number, difference: number): boolean {
  const held = difference < 0 ? cells.indexEvents : cells.referenceEvents;
  return held > 0 || slopeAt(cells, risk, difference) > 0;
}

function fallsAtUpper(cells: FourfoldCells, risk: number, difference: number): boolean {
  const held = difference > 0 ? cells.indexOthers : cells.referenceOthers;
  return held > 0 || slopeAt(cells, risk, difference) < 0;
}

/** A risk strictly between two, or else their middle. */
function inside(risk: number, lower: number, upper: number): number {
  return risk > lower && risk < upper ? risk : lower + (upper - lower) / 2;
}

/** Slope of the log likelihood, decreasing in the reference risk. */
function slopeAt(cells: FourfoldCells, risk: number, difference: number): number {
  return (
    term(cells.indexEvents, risk + difference) -
    term(cells.indexOthers, 1 - risk - difference) +
    term(cells.referenceEvents, risk) -
    term(cells.referenceOthers, 1 - risk)
  );
}

/** A cell's share in the slope; an empty cell has none. */
function term(count: number, risk: number): number {
  return count === 0 ? 0 : count / Math.max(0, risk);
}

/** The middle root of the likelihood's cubic, by the cosine of a third of an angle. */
function closedRoot(cells: FourfoldCells, difference: number): number {
  const indexTotal = cells.indexEvents + cells.indexOthers;
  const referenceTotal = cells.referenceEvents + cells.referenceOthers;
  const total = indexTotal + referenceTotal;
  const events = cells.indexEvents + cells.referenceEvents;
  const second = ((indexTotal + 2 * referenceTotal) * difference - total - events) / total;
  const first =
    ((referenceTotal * difference - total - 2 * cells.referenceEvents) * difference + events) /
    total;
  const constant = (cells.referenceEvents * difference * (1 - difference)) / total;
  const q = (second * second * second) / 27 - (first * second) / 6 + constant / 2;
  const p = Math.sign(q) * Math.sqrt(Math.max(0, (second * second) / 9 - first / 3));
  const cosine = Math.max(-1, Math.min(1, q / (p * p * p)));
  return 2 * p * Math.cos((Math.PI + Math.acos(cosine)) / 3) - second / 3;
}
