/** A value, or the expected reason why there is none. */
export type Result<Value, Failure> =
  | { readonly ok: true; readonly value: Value }
  | { readonly ok: false; readonly issue: Failure };

/** Wraps a value as a success. */
export function success<Value>(value: Value): { readonly ok: true; readonly value: Value } {
  return { ok: true, value };
}

/** Wraps an issue as a failure. */
export function failure<Failure>(issue: Failure): { readonly ok: false; readonly issue: Failure } {
  return { ok: false, issue };
}
