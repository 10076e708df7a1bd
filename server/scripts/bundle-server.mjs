import { readdirSync, rmSync } from 'node:fs';
import { join } from 'node:path';
import { build } from 'esbuild';

/** The server, the seeder, and every file named *-worker.ts are entries beside each other. */
const workers = readdirSync('server', { recursive: true })
  .filter((path) => path.endsWith('-worker.ts') && !path.includes('testing'))
  .map((path) => join('server', path));

rmSync('dist/server', { recursive: true, force: true });
await build({
  entryPoints: ['server/main.ts', 'seeds/seed-when-empty.ts', ...workers],
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
