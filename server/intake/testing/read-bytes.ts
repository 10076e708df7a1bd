import { mkdtemp, rm, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import type { Result } from '#shared/core';
import type { ReadingOptions } from '#shared/api';
import type { CodeBook } from '#shared/code-book';
import type { EncodedColumn, EncodedCut } from '#shared/tally';
import type { Chunk } from '../encode/chunk';
import { unpackDictionary } from '../encode/dictionary-chunks';
import { unpackCodes } from '../encode/stored-column';
import { intakeProblem, type IntakeIssue } from '../intake-issue';
import { readFile, type ReadFile } from '../read-file';

/** Reading options that leave everything to be found out. */
export const FIND_OUT: ReadingOptions = {
  delimiter: null,
  encoding: null,
  decimalMark: null,
  sheet: null,
};

/** How a test wants bytes to be read. */
export interface TestReading {
  readonly fileName?: string;
  readonly options?: Partial<ReadingOptions>;
  readonly previous?: CodeBook;
}

/** What was read, with the columns put together again from their chunks. */
export interface ReadBytes extends ReadFile {
  readonly cut: EncodedCut;
  readonly chunks: readonly Chunk[];
}

/** Reads bytes as a file of their own; the file is gone afterwards. */
export async function readBytes(
  bytes: Uint8Array | string,
  { fileName = 'data.csv', options = {}, previous }: TestReading = {},
): Promise<Result<ReadBytes, IntakeIssue>> {
  const folder = await mkdtemp(join(tmpdir(), 'evenhand-intake-'));
  const path = join(folder, 'file');
  await writeFile(path, bytes);
  try {
    const chunks: Chunk[] = [];
    const order = {
      path,
      fileName,
      options: { ...FIND_OUT, ...options },
      previous: previous ?? null,
    };
    const read = await readFile(
      order,
      (chunk) => chunks.push(chunk),
      () => Promise.resolve(),
    );
    return read.ok
      ? { ok: true, value: { ...read.value, chunks, cut: cutOf(read.value, chunks) } }
      : read;
  } finally {
    await rm(folder, { recursive: true });
  }
}

/** The cells of every column by name, as they were read; throws when they were not. */
export async function readCells(
  bytes: Uint8Array | string,
  reading: TestReading = {},
): Promise<Readonly<Record<string, readonly string[]>>> {
  const read = await readBytes(bytes, reading);
  if (!read.ok) throw new Error(intakeProblem(read.issue).message);
  const { cut, columns } = read.value;
  return Object.fromEntries(
    columns.map(({ columnId, name }) => [name, cellsOf(cut.columns.get(columnId))]),
  );
}

function cellsOf(column: EncodedColumn | undefined): readonly string[] {
  return Array.from(column?.codes ?? [], (code) => column?.dictionary[code] ?? '');
}

function cutOf({ columns, rows, profile }: ReadFile, chunks: readonly Chunk[]): EncodedCut {
  return {
    rows,
    decimalMark: profile.usedOptions.decimalMark ?? '.',
    columns: new Map(
      columns.map(({ columnId, position, chunkRows, width }) => {
        const bytesOf = (part: Chunk['part']): readonly Uint8Array[] =>
          chunks
            .filter((chunk) => chunk.position === position && chunk.part === part)
            .sort((one, other) => one.chunk - other.chunk)
            .map(({ bytes }) => bytes);
        const codes = unpackCodes(bytesOf('codes'), { rows, chunkRows, width });
        return [columnId, { codes, dictionary: bytesOf('dictionary').flatMap(unpackDictionary) }];
      }),
    ),
  };
}
