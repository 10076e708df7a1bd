import type { IntakeWarning, ReadingOptions } from '#shared/api';
import type { Result } from '#shared/core';
import type { ChunkSink } from './encode/chunk';
import type { TextEncoding } from './encode/encoding-watch';
import type { TableEncoder } from './encode/table-encoder';
import type { IntakeIssue } from './intake-issue';

/** What a reader needs of its surroundings. */
export interface ReadingContext {
  readonly options: ReadingOptions;
  /** Takes pieces of columns as they are complete. */
  readonly sink: ChunkSink;
  /** Tells how far the reading is (0..1) and waits where pieces are taken too slowly. */
  readonly pause: (progress: Progress) => Promise<void>;
}

/** How far a reading is. */
export interface Progress {
  readonly share: number;
  readonly rows: number;
}

/** A table that was read, and how its file turned out to be written. */
export interface ReadTable {
  readonly table: TableEncoder;
  readonly encoding: TextEncoding;
  readonly delimiter: string | null;
  readonly sheet: string | null;
  readonly sheets: readonly string[];
  readonly warnings: readonly IntakeWarning[];
}

/** A table, or why the file can't be read. */
export type ReadingOutcome = Promise<Result<ReadTable, IntakeIssue>>;
