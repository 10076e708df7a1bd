import { failure, success, type Result } from '#shared/core';
import type { CodeBook } from '#shared/code-book';
import type { ReadingOptions } from '#shared/api';
import { readDelimited } from './delimited/read-delimited';
import type { ChunkSink } from './encode/chunk';
import { packDictionary } from './encode/dictionary-chunks';
import { asUtf8 } from './encode/encoding-watch';
import { fileTypeOf, type FileType } from './file-type';
import type { IntakeIssue } from './intake-issue';
import { withLimit } from './issue-limits';
import { summarizeColumn, type ColumnSummary } from './profile/column-summary';
import { profileTable, type ProfiledTable } from './profile/profile-table';
import type { Progress, ReadingContext, ReadingOutcome, ReadTable } from './reading';
import { openSourceFile, type SourceFile } from './source-file';
import { readWorkbook } from './workbook/read-workbook';

/** A file to read, and how. */
export interface ReadingOrder {
  readonly path: string;
  /** The name that the person's file has; its ending tells the type. */
  readonly fileName: string;
  readonly options: ReadingOptions;
  /** The code book of the data set that the file belongs to; null for a new one. */
  readonly previous: CodeBook | null;
}

/** A column as its chunks were given away. */
export interface StoredColumnFacts {
  readonly position: number;
  readonly columnId: string;
  readonly name: string;
  readonly width: number;
  readonly chunkRows: number;
  readonly dictionarySize: number;
}

/** A file that was read whole. */
export interface ReadFile extends ProfiledTable {
  readonly sha256: string;
  readonly rows: number;
  readonly columns: readonly StoredColumnFacts[];
}

const READERS: Readonly<
  Record<FileType, (file: SourceFile, context: ReadingContext) => ReadingOutcome>
> = { delimited: readDelimited, workbook: readWorkbook };

/**
 * Reads a file into encoded columns, whose chunks go to `sink` while it is read.
 *
 * Bounded in memory by the distinct values, not by the rows. Fails with an issue that names the
 * line; what was given to `sink` until then is to be thrown away.
 */
export async function readFile(
  order: ReadingOrder,
  sink: ChunkSink,
  pause: (progress: Progress) => Promise<void>,
): Promise<Result<ReadFile, IntakeIssue>> {
  const file = await openSourceFile(order.path);
  try {
    const type = fileTypeOf(order.fileName, file.firstBytes);
    if (!type.ok) return type;
    const context = { options: order.options, sink, pause: within(pause, 0, READ) };
    const read = await READERS[type.value](file, context);
    return read.ok
      ? success(await finish(order, file, read.value, sink, pause))
      : failure(withLimit(read.issue));
  } finally {
    await file.close();
  }
}

/** Shares of the work: most is reading the bytes, the rest profiling and giving values away. */
const READ = 0.9;
const PROFILED = 0.95;

/** Reports progress within a part of the whole. */
type Pause = (progress: Progress) => Promise<void>;

function within(pause: Pause, from: number, to: number): Pause {
  return ({ share, rows }) => pause({ share: from + share * (to - from), rows });
}

async function finish(
  order: ReadingOrder,
  file: SourceFile,
  read: ReadTable,
  sink: ChunkSink,
  pause: Pause,
): Promise<ReadFile> {
  const summaries = await summarize(read, within(pause, READ, PROFILED));
  const reading = { ...read, fileName: order.fileName };
  const profiled = profileTable(read.table, summaries, reading, order.options, order.previous);
  await giveDictionaries(read, sink, within(pause, PROFILED, 1));
  return {
    ...profiled,
    sha256: file.sha256(),
    rows: read.table.rows,
    columns: columnFacts(read, profiled),
  };
}

async function summarize(
  { table, encoding }: ReadTable,
  pause: Pause,
): Promise<readonly ColumnSummary[]> {
  const summaries: ColumnSummary[] = [];
  for (const { dictionary } of table.columns) {
    summaries.push(summarizeColumn(dictionary, encoding));
    await pause({ share: summaries.length / table.columns.length, rows: table.rows });
  }
  return summaries;
}

async function giveDictionaries(
  { table, encoding }: ReadTable,
  sink: ChunkSink,
  pause: Pause,
): Promise<void> {
  for (const [position, { dictionary }] of table.columns.entries()) {
    let chunk = 0;
    for (const bytes of packDictionary(asUtf8(dictionary, encoding))) {
      sink({ position, part: 'dictionary', chunk, bytes });
      chunk += 1;
      await pause({ share: position / table.columns.length, rows: table.rows });
    }
  }
}

function columnFacts(
  { table }: ReadTable,
  { profile }: ProfiledTable,
): readonly StoredColumnFacts[] {
  return table.columns.map(({ codes, dictionary }, position) => ({
    position,
    columnId: profile.columns[position]?.columnId ?? '',
    name: profile.columns[position]?.name ?? '',
    width: codes.width,
    chunkRows: table.chunkRows,
    dictionarySize: dictionary.size,
  }));
}
