import { execFile } from 'node:child_process';
import { mkdirSync, mkdtempSync, readFileSync, readdirSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { promisify } from 'node:util';
import { afterAll, describe, expect, it } from 'vitest';
import { skipsWithout } from '../builders/outside-readers';

const FOLDER = 'tests/reference-values';
/** Sourced by the others; writes nothing itself. */
const SHARED = 'json.R';
/** The same sums in the same order; another build of R may differ in the last bits. */
const RELATIVE = 1e-12;

const scripts = readdirSync(join(FOLDER, 'scripts')).filter(
  (name) => name.endsWith('.R') && name !== SHARED,
);
const out = mkdtempSync(join(tmpdir(), 'reference-values-'));

afterAll(() => {
  rmSync(out, { recursive: true });
});

describe.skipIf(skipsWithout('r'))('reference values recomputed by R', () => {
  it('has scripts to run', () => {
    expect(scripts.length).toBeGreaterThan(3);
  });

  it.each(scripts)(
    '%s gives the stored values again',
    async (script) => {
      const folder = join(out, script);
      mkdirSync(folder);
      await promisify(execFile)('Rscript', [join(FOLDER, 'scripts', script), folder]);
      const written = readdirSync(folder);
      expect(written.length).toBeGreaterThan(0);
      for (const name of written) {
        expectSame(read(folder, name), read(FOLDER, name), name);
      }
    },
    240_000,
  );

  it('has a script for every file that names one', () => {
    const named = readdirSync(FOLDER)
      .filter((name) => name.endsWith('.json'))
      .map((name) => (read(FOLDER, name) as { readonly script?: string }).script)
      .filter((script) => script !== undefined);
    expect(new Set(named)).toEqual(new Set(scripts.map((name) => `${FOLDER}/scripts/${name}`)));
  });
});

function read(folder: string, name: string): unknown {
  return JSON.parse(readFileSync(join(folder, name), 'utf8')) as unknown;
}

/** The same shape and words, and numbers that agree; the version of R may be another. */
function expectSame(computed: unknown, stored: unknown, path: string): void {
  if (typeof stored === 'number' && typeof computed === 'number') {
    const near = Math.abs(computed - stored) <= RELATIVE * Math.abs(stored);
    expect(near, `${path}: ${computed}, stored ${stored}`).toBe(true);
  } else if (isObject(stored) && isObject(computed)) {
    expect(Object.keys(computed), path).toEqual(Object.keys(stored));
    for (const key of Object.keys(stored).filter((one) => one !== 'source')) {
      expectSame(computed[key], stored[key], `${path}.${key}`);
    }
  } else {
    expect(computed, path).toEqual(stored);
  }
}

function isObject(value: unknown): value is Readonly<Record<string, unknown>> {
  return typeof value === 'object' && value !== null;
}
