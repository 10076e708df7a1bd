import { expect, it } from 'vitest';
import { hypergeometricProbability, hypergeometricSupport, stirlingError } from './hypergeometric';

it('sums to 1 over what an urn can give', () => {
  for (const [marked, unmarked, drawn] of [
    [223, 40, 34],
    [29, 30, 31],
    [8, 900, 45],
  ] as const) {
    const urn = { marked, unmarked, drawn };
    const { smallest, largest } = hypergeometricSupport(urn);
    let sum = 0;
    for (let count = smallest; count <= largest; count += 1) {
      sum += hypergeometricProbability(count, urn);
    }
    expect(Math.abs(sum - 1)).toBeLessThan(1e-13);
  }
});

// NIST's Digital Library of Mathematical Functions 5.4: gamma(1/2) is the root of pi.
it("has Stirling's error of a half, of ten and of numbers between", () => {
  const half = Math.log(Math.sqrt(Math.PI) / 2) + 0.5 - 0.5 * Math.log(2 * Math.PI);
  expect(stirlingError(0.5)).toBeCloseTo(half - Math.log(0.5), 13);
  const ten = Math.log(3_628_800) - (10.5 * Math.log(10) - 10 + 0.5 * Math.log(2 * Math.PI));
  expect(stirlingError(10)).toBeCloseTo(ten, 13);
  expect(stirlingError(15.9999999)).toBeCloseTo(stirlingError(16), 10);
});
