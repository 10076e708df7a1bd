/// <reference path="./jstat.d.ts" />
import jstat from 'jstat';

/** Natural logarithm of the gamma function, for x > 0. Source: jstat. */
export function logGamma(x: number): number {
  return jstat.jStat.gammaln(x);
}
