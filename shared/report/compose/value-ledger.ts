import type { ValueAddress } from '#shared/analysis';
import type {
  CellNumber,
  ChartBar,
  ComposedReport,
  LayoutElement,
  Run,
  TableElement,
} from '#shared/layout';
import { numeralsOf } from '../text/numerals';
import { runsOf } from './element-runs';

/** One printed number: the block that prints it, its source, and the figures on the page. */
export interface PrintedNumber {
  readonly blockId: string;
  readonly address: ValueAddress;
  readonly text: string;
}

/**
 * Every bound number that a composed report prints, in the order of print: in sentences and notes,
 * in the cells of tables and over the bars of figures. A run whose figures don't match its
 * addresses one to one (a bound in place of a p-value) gives its whole text for each.
 */
export function valueLedger(composed: ComposedReport): readonly PrintedNumber[] {
  return composed.elements.flatMap(numbersOf);
}

function numbersOf(element: LayoutElement): readonly PrintedNumber[] {
  switch (element.kind) {
    case 'table':
      return tableNumbers(element);
    case 'figure':
      return [
        ...element.caption.runs.flatMap((run) => runNumbers(run, element.blockId)),
        ...element.figure.bars.flatMap((bar) => barNumbers(bar, element.blockId)),
        ...element.notes.flat().flatMap((run) => runNumbers(run, element.blockId)),
      ];
    case 'heading':
    case 'paragraph':
    case 'list':
      return runsOf(element).flatMap((run) => runNumbers(run, element.blockId));
    case 'problem':
      return [];
  }
}

/** Cells carry their numbers beside the runs that print them, so that they count once. */
function tableNumbers(table: TableElement): readonly PrintedNumber[] {
  const { blockId } = table;
  const cells = table.rows.flatMap((row) => row.cells);
  return [
    ...table.caption.runs.flatMap((run) => runNumbers(run, blockId)),
    ...cells
      .flatMap(({ numbers }) => numbers.filter((number) => number !== null))
      .map((number: CellNumber) => ({ blockId, address: number.address, text: number.text })),
    ...table.notes.flat().flatMap((run) => runNumbers(run, blockId)),
  ];
}

function barNumbers(bar: ChartBar, blockId: string): readonly PrintedNumber[] {
  return bar.addresses.map((address, index) => ({
    blockId,
    address,
    text: index === bar.addresses.length - 1 ? bar.totalText : bar.valueText,
  }));
}

function runNumbers({ text, origin }: Run, blockId: string): readonly PrintedNumber[] {
  if (origin?.state !== 'bound') return [];
  const numerals = numeralsOf(text);
  const paired = numerals.length === origin.addresses.length;
  return origin.addresses.map((address, index) => ({
    blockId,
    address,
    text: (paired ? numerals[index] : undefined) ?? text,
  }));
}
