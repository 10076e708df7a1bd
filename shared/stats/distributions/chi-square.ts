import erfc from '@stdlib/math-base-special-erfc';
import gammainc from '@stdlib/math-base-special-gammainc';

/**
 * Upper tail P(X > x) of the chi-square distribution.
 *
 * Takes a statistic >= 0 and a whole number of degrees of freedom >= 1.
 * Good to 1e-11 relative down to 1e-300; never 1 minus the lower tail, which ends at 1e-16.
 * Source: complementary error function for one degree, regularised upper incomplete gamma else.
 */
export function chiSquareUpperTail(statistic: number, degreesOfFreedom: number): number {
  if (degreesOfFreedom === 1) {
    return erfc(Math.sqrt(statistic / 2));
  }
  return gammainc(statistic / 2, degreesOfFreedom / 2, true, true);
}
