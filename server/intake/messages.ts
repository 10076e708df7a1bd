import type { Result } from '#shared/core';
import type { Chunk } from './encode/chunk';
import type { IntakeIssue } from './intake-issue';
import type { ReadFile } from './read-file';
import type { Progress } from './reading';

/** What the intake worker tells: pieces of columns, how far it is, and at last the outcome. */
export type WorkerMessage =
  | { readonly kind: 'chunk'; readonly chunk: Chunk }
  | { readonly kind: 'progress'; readonly progress: Progress }
  | { readonly kind: 'done'; readonly outcome: Result<ReadFile, IntakeIssue> };

/** What the worker is told: a piece was stored. */
export const CHUNK_STORED = 'chunkStored';
