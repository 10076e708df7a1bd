/** Ends a switch over a closed set; reaching it is a bug. */
export function assertNever(value: never): never {
  throw new Error(`Unexpected member of a closed set: ${JSON.stringify(value)}`);
}
