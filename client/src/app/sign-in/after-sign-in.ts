/**
 * Where a person goes after signing in: back to the page they came for, if it is one of ours, else
 * to their desk.
 */
export function afterSignIn(then: string | null): string {
  const isOurs = then !== null && /^\/(?![/\\])/.test(then);
  return isOurs ? then : '/desk';
}
