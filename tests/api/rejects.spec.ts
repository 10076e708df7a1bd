import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { describe, expect, it } from 'vitest';
import { ROUTES } from '../../server/routes';
import { routeName } from '../builders/route-request';

/** The sources of all API tests; a test may lie in a folder of its resource. */
const SOURCES = readdirSync(import.meta.dirname, { recursive: true, encoding: 'utf8' })
  .filter((name) => name.endsWith('.spec.ts'))
  .map((name) => readFileSync(join(import.meta.dirname, name), 'utf8'))
  .join('\n');

/** A public GET takes nothing that could be wrong. */
const REFUSING = ROUTES.filter(
  ({ access, method, query, path }) =>
    access.kind !== 'public' || method !== 'get' || query !== null || path.includes(':'),
);

describe('what a route rejects', () => {
  it.each(REFUSING.map((route) => routeName(route)))('is tested: %s', (name) => {
    expect(SOURCES.includes(`describe('${name} rejects', () => {`)).toBe(true);
  });
});
