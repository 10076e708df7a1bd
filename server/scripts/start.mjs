import { fileURLToPath } from 'node:url';
import { buildAll } from './build-steps.mjs';
import { ensureNodePackages } from './node-packages.mjs';
import { releaseSignals, say } from './run-command.mjs';

process.chdir(fileURLToPath(new URL('../..', import.meta.url)));

if ((await ensureNodePackages()) && (await buildAll())) {
  await seed();
  say('Server: starting …');
  await serve();
} else {
  process.exitCode = 1;
}

/** An empty database gets the demonstration studies, unless the environment says no. */
async function seed() {
  const { seedWhenEmpty } = await import('../../dist/server/seed-when-empty.js');
  await seedWhenEmpty();
}

/** The server runs in this very process, so that a signal sent to it arrives. */
async function serve() {
  releaseSignals();
  process.setSourceMapsEnabled(true);
  await import('../../dist/server/main.js');
}
