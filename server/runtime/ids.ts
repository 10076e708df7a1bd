import { v7 } from 'uuid';

/** Makes ids. */
export interface Ids {
  readonly next: () => string;
}

/** UUIDs of version 7: unguessable enough to be unique, and in order of time. */
export const timeOrderedIds: Ids = { next: () => v7() };
