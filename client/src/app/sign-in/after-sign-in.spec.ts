import { expect, it } from 'vitest';
import { afterSignIn } from './after-sign-in';

it('goes back to the page that somebody came for', () => {
  expect(afterSignIn('/studies/s1/reports/r1?block=b2')).toBe('/studies/s1/reports/r1?block=b2');
});

it('goes to the desk when there was none', () => {
  expect(afterSignIn(null)).toBe('/desk');
});

it('never leads to another site', () => {
  const addresses = ['//elsewhere.example', '/\\elsewhere.example', 'https://elsewhere.example'];
  expect(addresses.map(afterSignIn)).toEqual(['/desk', '/desk', '/desk']);
});
