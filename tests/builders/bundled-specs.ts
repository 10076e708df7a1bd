import { mkdtemp, readFile, rm } from 'node:fs/promises';
import { createRequire } from 'node:module';
import { tmpdir } from 'node:os';
import { join, resolve } from 'node:path';
import { build as bundle, type Plugin } from 'esbuild';
import { expect } from 'vitest';

/** A wrong formula: in one file of `shared`, the text that it replaces and the wrong text. */
export interface PlantedError {
  readonly file: string;
  readonly text: string;
  readonly wrong: string;
}

/** A test of a bundled spec file. */
export interface BundledTest {
  readonly name: string;
  readonly run: () => void;
}

/** Puts a wrong formula into the text of a file; a text that is not there once is a bug. */
export function plant(source: string, { file, text, wrong }: PlantedError): string {
  const parts = source.split(text);
  if (parts.length === 1) throw new Error(`${file}: the planted text is not there any more.`);
  if (parts.length > 2) throw new Error(`${file}: the planted text is there more than once.`);
  if (wrong === text) throw new Error(`${file}: the planted text is no error.`);
  return parts.join(wrong);
}

/**
 * The tests of spec files as they stand, over the project's sources with one wrong formula in them
 * (null: none). Everything is bundled into a folder of its own outside the project, loaded from
 * there and removed. The specs may use `describe`, `it` and `it.each` with tests that return
 * nothing.
 */
export async function bundledTests(
  specs: readonly string[],
  error: PlantedError | null,
): Promise<readonly BundledTest[]> {
  const folder = await mkdtemp(join(tmpdir(), 'planted-error-'));
  try {
    const outfile = join(folder, 'specs.cjs');
    await bundle({
      stdin: { contents: specs.map((spec) => `import './${spec}';`).join('\n'), resolveDir: '.' },
      outfile,
      bundle: true,
      platform: 'node',
      format: 'cjs',
      logLevel: 'error',
      plugins: [collecting, packages, ...(error ? [planting(error)] : [])],
    });
    return collectedBy(() => createRequire(import.meta.url)(outfile) as unknown);
  } finally {
    await rm(folder, { recursive: true, force: true });
  }
}

/**
 * A test that fails, or null: whether a wrong formula is seen. The last come first, because the
 * tests that take longest open their files.
 */
export function someFailure(tests: readonly BundledTest[]): string | null {
  const failed = tests.findLast(({ run }) => !passes(run));
  return failed?.name ?? null;
}

function passes(run: () => void): boolean {
  try {
    run();
    return true;
  } catch {
    return false;
  }
}

function planting(error: PlantedError): Plugin {
  const path = resolve(error.file);
  return {
    name: 'planted error',
    setup(build) {
      let planted = false;
      build.onLoad({ filter: /\.ts$/ }, async (asked) => {
        if (asked.path !== path) return null;
        planted = true;
        return { contents: plant(await readFile(path, 'utf8'), error), loader: 'ts' };
      });
      build.onEnd(() => {
        if (!planted) throw new Error(`${error.file}: the spec files do not use it.`);
      });
    },
  };
}

/** Packages stay where they are: bundled, they would take most of the time. */
const packages: Plugin = {
  name: 'packages',
  setup(build) {
    const { resolve: pathOf } = createRequire(import.meta.url);
    build.onResolve({ filter: /^[@a-z]/ }, ({ path }) => ({ path: pathOf(path), external: true }));
  },
};

/** Stands in for vitest within the bundle: tests are collected, and `expect` is vitest's own. */
const collecting: Plugin = {
  name: 'collected tests',
  setup(build) {
    build.onResolve({ filter: /^vitest$/ }, () => ({ path: 'vitest', namespace: 'collected' }));
    build.onLoad({ filter: /.*/, namespace: 'collected' }, () => ({
      contents: `export const { describe, it, expect } = globalThis.${PLACE};`,
    }));
  },
};

const PLACE = '__collectedTests';

/** What loading a bundle declares; it loads at once, so that one place is enough. */
function collectedBy(load: () => unknown): readonly BundledTest[] {
  const tests: BundledTest[] = [];
  const it = (name: string, run: () => void): void => {
    tests.push({ name, run });
  };
  const each =
    (rows: readonly unknown[]) =>
    (name: string, run: (...row: unknown[]) => void): void => {
      rows.forEach((row, at) => {
        const runRow = (): void => {
          run(...(Array.isArray(row) ? (row as unknown[]) : [row]));
        };
        it(`${name} [${at}]`, runRow);
      });
    };
  const describe = (_: string, declare: () => void): void => {
    declare();
  };
  Reflect.set(globalThis, PLACE, { describe, it: Object.assign(it, { each }), expect });
  try {
    load();
  } finally {
    Reflect.deleteProperty(globalThis, PLACE);
  }
  return tests;
}
