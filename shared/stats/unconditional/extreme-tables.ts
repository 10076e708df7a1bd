/**
 * The tables of two groups that count as extreme, by rows. With i events in the index group: those
 * with at most `below[i]` events in the reference group (-1: none) favour the index group, those
 * with at least `above[i]` (total + 1: none) the reference group; null where that side does not
 * count.
 */
export interface ExtremeTables {
  readonly below: Int32Array;
  readonly above: Int32Array | null;
}

/** The score of a table; grows with the index group's events, falls with the reference group's. */
export type TableScore = (indexEvents: number, referenceEvents: number) => number;

/** Which direction counts: scores from a bound up, or also those from minus the bound down. */
export type ExtremeSides = 'upper' | 'both';

/** Scores nearer than this, relative to their size, are ties; rounding errors stay below 1e-12. */
const TIE = 1e-9;

/**
 * The tables with scores at least as large as a bound (both sides: or as small as its opposite),
 * found along the staircase that a score makes which is monotone in either count.
 *
 * A tie counts as extreme. That two tables whose scores cross be tied within TIE moves a limit by
 * no more than about TIE times its standard error; tables tied for good (mirrored ones of equal
 * groups) always count.
 */
export function extremeTables(
  indexTotal: number,
  referenceTotal: number,
  scoreOf: TableScore,
  bound: number,
  sides: ExtremeSides,
): ExtremeTables {
  const least = Number.isFinite(bound) ? bound - TIE * Math.max(1, Math.abs(bound)) : bound;
  const below = staircase(indexTotal, -1, (events, reached) => {
    return reached < referenceTotal && scoreOf(events, reached + 1) >= least;
  });
  const above = staircase(indexTotal, 0, (events, next) => {
    return sides === 'both' && next <= referenceTotal && scoreOf(events, next) > -least;
  });
  return { below, above: sides === 'both' ? above : null };
}

/** How far one can climb in each row, beginning where the row before ended. */
function staircase(
  indexTotal: number,
  bottom: number,
  climbsFrom: (indexEvents: number, step: number) => boolean,
): Int32Array {
  const steps = new Int32Array(indexTotal + 1);
  let step = bottom;
  for (let events = 0; events <= indexTotal; events += 1) {
    while (climbsFrom(events, step)) {
      step += 1;
    }
    steps[events] = step;
  }
  return steps;
}

/** The tables that are extreme in either of two sets with the same sides. */
export function eitherExtreme(one: ExtremeTables, other: ExtremeTables): ExtremeTables {
  const { below, above } = other;
  return {
    below: one.below.map((reached, events) => Math.max(reached, below[events] as number)),
    above: one.above && above && one.above.map((next, row) => Math.min(next, above[row] as number)),
  };
}

/** Whether two sets hold the same tables. */
export function isSame(one: ExtremeTables, other: ExtremeTables): boolean {
  return (
    one.below.every((reached, events) => reached === other.below[events]) &&
    (one.above?.every((next, events) => next === other.above?.[events]) ?? other.above === null)
  );
}
