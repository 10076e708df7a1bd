import { hypergeometricSupport } from '../distributions';
import { fitOddsRatio } from '../fitted-odds-ratio';
import type { FourfoldTable } from '../fourfold-table';
import { urnOf } from '../urn-of';
import { addTerm, emptySums, sharesOf } from './tail-sums';
import type { ConditionalCounts } from './tail-sums';

/** Probabilities this far below the largest are left out. */
const NEGLIGIBLE = 1e-22;

/**
 * The noncentral hypergeometric distribution of a table as a function of the logarithm of the odds
 * ratio. Only counts around the mode are visited, so that ten million people take microseconds.
 */
export function conditionalCounts(table: FourfoldTable): (logRatio: number) => ConditionalCounts {
  const urn = urnOf(table);
  const { smallest, largest } = hypergeometricSupport(urn);
  const observed = table.index.events;
  const ratioUp = (count: number): number =>
    ((urn.marked - count) * (urn.drawn - count)) /
    ((count + 1) * (urn.unmarked - urn.drawn + count + 1));
  return (logRatio) => {
    const expected = observed - fitOddsRatio(table, logRatio).deviation;
    const mode = Math.min(largest, Math.max(smallest, Math.round(expected)));
    const sums = emptySums();
    const odds = Math.exp(logRatio);
    addTerm(sums, mode - observed, 1);
    for (let count = mode, term = 1; count < largest;) {
      term *= ratioUp(count) * odds;
      count += 1;
      if (term < NEGLIGIBLE) {
        break;
      }
      addTerm(sums, count - observed, term);
    }
    for (let count = mode, term = 1; count > smallest;) {
      count -= 1;
      term /= ratioUp(count) * odds;
      if (term < NEGLIGIBLE) {
        break;
      }
      addTerm(sums, count - observed, term);
    }
    return sharesOf(sums);
  };
}
