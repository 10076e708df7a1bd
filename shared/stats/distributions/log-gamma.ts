// The client compiles without this folder, so that the declarations have to come along.
// eslint-disable-next-line @typescript-eslint/triple-slash-reference
/// <reference path="./jstat.d.ts" />
import jstat from 'jstat';

/** Natural logarithm of the gamma function, for x > 0. Source: jstat. */
export function logGamma(x: number): number {
  return jstat.jStat.gammaln(x);
}
