import { failure, type Result, success } from '#shared/core';

const LARGEST_COUNT = 1_000_000_000;

/**
 * A count as a person types it: whole, not negative, with or without spaces or commas between
 * thousands. A refused text comes back with what is wrong, in one sentence.
 */
export function parsedCount(text: string): Result<number, string> {
  const bare = text.replace(/[\s\u00a0\u202f]/g, '');
  if (bare === '') return failure('Type a count, or 0.');
  if (/^[-\u2212]\d/.test(bare)) return failure('A count cannot be negative.');
  if (/^[1-9]\d{0,2}(,\d{3})+$/.test(bare)) return inRange(Number(bare.replaceAll(',', '')));
  if (/^\d+$/.test(bare)) return inRange(Number(bare));
  if (/^\d*[.,]\d+$/.test(bare)) return failure('Counts are whole numbers.');
  return failure(`"${text.trim()}" is not a count.`);
}

function inRange(count: number): Result<number, string> {
  return count <= LARGEST_COUNT
    ? success(count)
    : failure('This count is larger than a study can be.');
}
