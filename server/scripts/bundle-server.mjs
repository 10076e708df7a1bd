import { readdirSync, rmSync } from 'node:fs';
import { join } from 'node:path';
import { build } from 'esbuild';

/** Every file named *-worker.ts is an entry of its own beside main.js. */
const workers = readdirSync('server', { recursive: true })
  .filter((path) => path.endsWith('-worker.ts') && !path.includes('testing'))
  .map((path) => join('server', path));

rmSync('dist/server', { recursive: true, force: true });
await build({
  entryPoints: ['server/main.ts', ...workers],
  outdir: 'dist/server',
  entryNames: '[name]',
  bundle: true,
  splitting: true,
  packages: 'external',
  platform: 'node',
  target: 'node20',
  format: 'esm',
  sourcemap: true,
  logLevel: 'warning',
});
