import type { DecimalMark } from '#shared/code-book';
import type { EncodedColumn } from '#shared/tally';
import type { CutState } from '../models/cut/cut-model';
import type { Stores } from '../models/stores';
import type { CutColumn } from '../models/cut/cut-column-store';
import { unpackDictionary } from '../intake/encode/dictionary-chunks';
import { unpackCodes } from '../intake/encode/stored-column';
import { createBoundedCache } from './bounded-cache';

/** What is known of a cut without its contents. */
export interface CutOutline {
  readonly rows: number;
  readonly decimalMark: DecimalMark;
  readonly columns: readonly CutColumn[];
}

/** Columns of cuts in memory, read from the database when they are needed. */
export interface ResidentCuts {
  /** The outline of a ready cut. */
  readonly outline: (cutId: string) => Promise<CutOutline>;
  /** The outline as it stands now, also of a cut whose columns may still get other ids. */
  readonly presentOutline: (cutId: string) => Promise<CutOutline>;
  readonly column: (outline: CutOutline, column: CutColumn) => Promise<EncodedColumn>;
}

const OUTLINES_BYTES = 16 * 1024 * 1024;
const COLUMN_FACTS_BYTES = 400;

/** The contents of columns never change, so that what is kept never goes stale. */
export function createResidentCuts(
  stores: Pick<Stores, 'cuts' | 'cutColumns' | 'columnChunks'>,
  bytesAtMost: number,
): ResidentCuts {
  const columns = createBoundedCache<EncodedColumn>(bytesAtMost, bytesOfColumn);
  const outlines = createBoundedCache<CutOutline>(
    OUTLINES_BYTES,
    (outline) => outline.columns.length * COLUMN_FACTS_BYTES,
  );
  return {
    outline: (cutId) => outlines.get(cutId, () => readOutline(stores, cutId, ['ready'])),
    presentOutline: (cutId) => readOutline(stores, cutId, ['ready', 'loading']),
    column: (outline, column) =>
      columns.get(`${column.cutId}/${String(column.position)}`, () =>
        readColumn(stores, outline, column),
      ),
  };
}

async function readOutline(
  { cuts, cutColumns }: Pick<Stores, 'cuts' | 'cutColumns'>,
  cutId: string,
  states: readonly CutState[],
): Promise<CutOutline> {
  const cut = await cuts.findById(cutId);
  if (cut === null || !states.includes(cut.state)) {
    throw new Error(`Cut ${cutId} is not there to be counted.`);
  }
  return {
    rows: cut.rows,
    decimalMark: cut.profile.usedOptions.decimalMark ?? '.',
    columns: await cutColumns.list(cutId),
  };
}

async function readColumn(
  { columnChunks }: Pick<Stores, 'columnChunks'>,
  { rows }: CutOutline,
  { cutId, position, width, chunkRows }: CutColumn,
): Promise<EncodedColumn> {
  const codes = await columnChunks.read(cutId, position, 'codes');
  const dictionary = await columnChunks.read(cutId, position, 'dictionary');
  return {
    codes: unpackCodes(codes, { rows, chunkRows, width }),
    dictionary: dictionary.flatMap(unpackDictionary),
  };
}

const STRING_BYTES = 32;

function bytesOfColumn({ codes, dictionary }: EncodedColumn): number {
  const texts = dictionary.reduce((sum, { length }) => sum + STRING_BYTES + 2 * length, 0);
  return codes.byteLength + texts;
}
