import { runCommand, say } from '../../server/scripts/run-command.mjs';

const TSC = 'node_modules/typescript/bin/tsc';
const NGC = 'node_modules/@angular/compiler-cli/bundles/src/bin/ngc.js';

/** Every folder with its own settings; the client's compiler checks its templates too. */
const FOLDERS = {
  shared: [TSC, '-p', 'shared/tsconfig.json', '--noEmit'],
  server: [TSC, '-p', 'server/tsconfig.json', '--noEmit'],
  tests: [TSC, '-p', 'tests/tsconfig.json', '--noEmit'],
  client: [NGC, '-p', 'client/tsconfig.spec.json', '--noEmit'],
};

const outcomes = [];
for (const [folder, parameters] of Object.entries(FOLDERS)) {
  const code = await runCommand(process.execPath, parameters);
  if (code !== 0) say(`Types: ${folder} has errors.`);
  outcomes.push(code);
}
process.exitCode = outcomes.every((code) => code === 0) ? 0 : 1;
