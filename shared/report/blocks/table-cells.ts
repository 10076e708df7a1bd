import type { ValueAddress } from '#shared/analysis';
import type { NumberText } from '#shared/format';
import type { CellNumber, Run, RunMark, RunOrigin, TableBodyCell } from '#shared/layout';

/** A printed number with the place that it comes from. */
export function cellNumber(number: NumberText, address: ValueAddress): CellNumber {
  return { ...number, address };
}

/** A run of generated words. */
export function wordsRun(text: string, blockId: string, marks: readonly RunMark[] = []): Run {
  return withMarks({ text, origin: { blockId, state: 'text', addresses: [] } }, marks);
}

/** A run that prints bound numbers. */
export function numbersRun(
  text: string,
  blockId: string,
  addresses: readonly ValueAddress[],
  marks: readonly RunMark[] = [],
): Run {
  const origin: RunOrigin = { blockId, state: 'bound', addresses };
  return withMarks({ text, origin }, marks);
}

/** A cell of words that holds none of its column's `parts` numbers. */
export function wordsCell(
  text: string,
  blockId: string,
  { parts, marks = [] }: { readonly parts: number; readonly marks?: readonly RunMark[] },
): TableBodyCell {
  const numbers = Array.from({ length: parts }, () => null);
  return { runs: [wordsRun(text, blockId, marks)], numbers };
}

function withMarks(run: Run, marks: readonly RunMark[]): Run {
  return marks.length === 0 ? run : { ...run, marks };
}
