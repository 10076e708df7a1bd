import { v7 } from 'uuid';

/** An id for something new, made here so that a request sent twice is applied once. */
export function newId(): string {
  return v7();
}
