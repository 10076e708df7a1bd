import { existsSync, mkdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { compressClient } from './compress-client.mjs';
import { runCommand, say } from './run-command.mjs';
import { sourceHash } from './source-hash.mjs';

const SETTINGS = ['package.json', 'package-lock.json', 'tsconfig.json', 'shared'];

/** Builds client and server into dist, each only when its sources changed; true when both stand. */
export async function buildAll() {
  const client = await buildWhenChanged(
    'client',
    ['client', 'angular.json', 'server/scripts', ...SETTINGS],
    buildClient,
  );
  const server = await buildWhenChanged('server', ['server', 'seeds', ...SETTINGS], () =>
    runCommand(process.execPath, ['server/scripts/bundle-server.mjs']),
  );
  return client && server;
}

async function buildClient() {
  const code = await runCommand(
    process.execPath,
    ['node_modules/@angular/cli/bin/ng.js', 'build'],
    { environment: { NG_CLI_ANALYTICS: 'false' } },
  );
  if (code === 0) compressClient('dist/client');
  return code;
}

async function buildWhenChanged(part, sources, build) {
  const stampFile = `dist/.${part}-stamp`;
  const hash = sourceHash(sources);
  if (existsSync(stampFile) && readFileSync(stampFile, 'utf8') === hash) {
    say(`Build of the ${part}: up to date.`);
    return true;
  }
  say(`Build of the ${part}: working …`);
  rmSync(stampFile, { force: true });
  if ((await build()) !== 0) return false;
  mkdirSync('dist', { recursive: true });
  writeFileSync(stampFile, hash);
  return true;
}
