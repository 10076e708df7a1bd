import type { Result } from '#shared/core';
import type { Chunk } from './encode/chunk';
import type { IntakeIssue } from './intake-issue';
import type { ReadFile, ReadingOrder } from './read-file';
import type { Progress } from './reading';

/** What an intake worker is told: to read a file, or that so many pieces of it were stored. */
export type WorkerOrder =
  | { readonly kind: 'read'; readonly order: ReadingOrder }
  | { readonly kind: 'chunksStored'; readonly chunks: number };

/** What it tells: pieces of columns, how far it is, and at last the outcome. */
export type WorkerMessage =
  | { readonly kind: 'chunk'; readonly chunk: Chunk }
  | { readonly kind: 'progress'; readonly progress: Progress }
  | { readonly kind: 'done'; readonly outcome: Result<ReadFile, IntakeIssue> };
