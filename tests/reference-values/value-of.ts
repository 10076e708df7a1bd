import type { Result } from '#shared/core';

/** The value of a result that must be one. */
export function valueOf<Value>(result: Result<Value, unknown>): Value {
  if (!result.ok) {
    throw new Error(`No value: ${JSON.stringify(result.issue)}`);
  }
  return result.value;
}
