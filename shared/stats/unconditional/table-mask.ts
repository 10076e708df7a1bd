import { binomialTerms } from '../distributions';
import { gridSize, supremumOf } from './supremum';

/** Any set of tables of two groups, row by row: 1 at events × (reference total + 1) + events. */
export interface TableMask {
  readonly indexTotal: number;
  readonly referenceTotal: number;
  readonly isMember: Uint8Array;
}

/** The tables of two groups that a predicate names. */
export function tableMask(
  indexTotal: number,
  referenceTotal: number,
  belongs: (indexEvents: number, referenceEvents: number) => boolean,
): TableMask {
  const width = referenceTotal + 1;
  const isMember = new Uint8Array((indexTotal + 1) * width);
  for (let at = 0; at < isMember.length; at += 1) {
    const referenceEvents = at % width;
    isMember[at] = belongs((at - referenceEvents) / width, referenceEvents) ? 1 : 0;
  }
  return { indexTotal, referenceTotal, isMember };
}

/**
 * The largest probability of a set of tables when both groups have the same risk, over all risks:
 * the p-value of an exact unconditional test whose extreme tables these are.
 */
export function largestProbability(mask: TableMask): number {
  const { indexTotal, referenceTotal, isMember } = mask;
  const index = binomialTerms(indexTotal, 0);
  const reference = binomialTerms(referenceTotal, 0);
  const width = referenceTotal + 1;
  const probabilityAt = (place: number): number => {
    const risk = Math.sin((Math.PI / 2) * place) ** 2;
    const rows = index.fill(risk);
    const columns = reference.fill(risk);
    let sum = 0;
    for (let row = rows.from; row <= rows.to; row += 1) {
      let inRow = 0;
      for (let column = columns.from; column <= columns.to; column += 1) {
        inRow += (isMember[row * width + column] as number) * (reference.terms[column] as number);
      }
      sum += inRow * (index.terms[row] as number);
    }
    return sum;
  };
  const size = gridSize(Math.max(indexTotal, referenceTotal));
  return Math.min(1, supremumOf(probabilityAt, size));
}
