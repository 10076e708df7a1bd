import type { DecimalMark } from '#shared/code-book';
import type { NumberWriting, ReadNumber } from '../encode/byte-numbers';

/** The numbers of a column, summed up; rows count, not distinct values. */
export interface NumberTotals {
  readonly rows: number;
  readonly minimum: number | null;
  readonly maximum: number | null;
  readonly sum: number | null;
  readonly negative: number;
  readonly fractional: number;
}

/** How many distinct values of a file speak for a decimal mark, and which only might. */
export interface MarkVotes {
  readonly point: number;
  readonly comma: number;
  /** "1,234": a comma with three digits after it may as well group thousands. */
  readonly groupedComma: number;
  readonly groupedPoint: number;
}

/** Gathers the numbers of one column, apart by how they are written. */
export class NumberGatherer {
  private readonly totals: Record<NumberWriting, Gathered> = {
    whole: nothing(),
    point: nothing(),
    comma: nothing(),
  };
  private groupedComma = 0;
  private groupedPoint = 0;

  /** Takes a distinct value and the number of rows that hold it. */
  add({ writing, value, grouped }: ReadNumber, rows: number): void {
    const totals = this.totals[writing];
    totals.values += 1;
    totals.rows += rows;
    totals.sum += value * rows;
    totals.minimum = Math.min(totals.minimum, value);
    totals.maximum = Math.max(totals.maximum, value);
    if (value < 0) totals.negative += rows;
    if (!Number.isInteger(value)) totals.fractional += rows;
    if (grouped && writing === 'comma') this.groupedComma += 1;
    if (grouped && writing === 'point') this.groupedPoint += 1;
  }

  get votes(): MarkVotes {
    const { groupedComma, groupedPoint } = this;
    return {
      point: this.totals.point.values - groupedPoint,
      comma: this.totals.comma.values - groupedComma,
      groupedComma,
      groupedPoint,
    };
  }

  /** The numbers of the column under a decimal mark. */
  under(decimalMark: DecimalMark): NumberTotals {
    const { whole } = this.totals;
    const decimal = decimalMark === ',' ? this.totals.comma : this.totals.point;
    const rows = whole.rows + decimal.rows;
    return {
      rows,
      minimum: rows === 0 ? null : Math.min(whole.minimum, decimal.minimum),
      maximum: rows === 0 ? null : Math.max(whole.maximum, decimal.maximum),
      sum: rows === 0 ? null : finite(whole.sum + decimal.sum),
      negative: whole.negative + decimal.negative,
      fractional: whole.fractional + decimal.fractional,
    };
  }
}

interface Gathered {
  values: number;
  rows: number;
  sum: number;
  minimum: number;
  maximum: number;
  negative: number;
  fractional: number;
}

function nothing(): Gathered {
  return {
    values: 0,
    rows: 0,
    sum: 0,
    minimum: Infinity,
    maximum: -Infinity,
    negative: 0,
    fractional: 0,
  };
}

/** Sums of huge numbers may run over; JSON has no word for that. */
function finite(sum: number): number | null {
  return Number.isFinite(sum) ? sum : null;
}
