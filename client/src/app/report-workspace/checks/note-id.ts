import type { ProofCheck } from './proof-check';

/** The id of a note on the page; blocks name it as what tells more about them. */
export function noteId(check: ProofCheck): string {
  return `note-${check.id.replace(/[^\w-]/gu, '-')}`;
}
