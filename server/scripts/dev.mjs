import { fileURLToPath } from 'node:url';
import { ensureNodePackages } from './node-packages.mjs';
import { releaseSignals } from './run-command.mjs';

const SERVER = {
  name: 'server',
  command: 'tsx seeds/main.ts && tsx watch --clear-screen=false server/main.ts',
};
const CLIENT = { name: 'client', command: 'ng serve' };

process.chdir(fileURLToPath(new URL('../..', import.meta.url)));

if (await ensureNodePackages()) {
  releaseSignals();
  const { default: concurrently } = await import('concurrently');
  await concurrently([SERVER, CLIENT], { killOthersOn: ['failure', 'success'] }).result.catch(
    () => (process.exitCode = 1),
  );
} else {
  process.exitCode = 1;
}
