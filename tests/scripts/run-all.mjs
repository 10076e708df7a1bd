import { fileURLToPath } from 'node:url';
import { mkdirSync, rmSync } from 'node:fs';
import { ensureNodePackages } from '../../server/scripts/node-packages.mjs';
import { buildAll } from '../../server/scripts/build-steps.mjs';
import { runCommand, say } from '../../server/scripts/run-command.mjs';
import { ensureBrowser } from './browser.mjs';
import { ensureOutsideReaders } from './outside-readers.mjs';
import { countPlaywright, countVitest, NOTHING } from './test-counts.mjs';

const RESULTS = 'test-results/counts';
const NODE = process.execPath;

/** Each says what it does, and gives its own count; a check without tests counts failures only. */
const STEPS = [
  { name: 'Packages', run: () => check(ensureNodePackages()), needed: true },
  { name: 'Browser', run: () => check(ensureBrowser()) },
  { name: 'Outside readers', run: outsideReaders },
  { name: 'Types', run: () => command('tests/scripts/typecheck.mjs') },
  {
    name: 'Lint',
    run: () => command('node_modules/eslint/bin/eslint.js', '.', '--max-warnings=0'),
  },
  { name: 'Node tests', run: nodeTests },
  { name: 'Client tests', run: clientTests },
  { name: 'Build', run: () => check(buildAll()) },
  { name: 'Browser tests', run: browserTests },
];

process.chdir(fileURLToPath(new URL('../..', import.meta.url)));
rmSync(RESULTS, { recursive: true, force: true });
mkdirSync(RESULTS, { recursive: true });

const counts = await runSteps();
say('');
for (const { name, passed, failed, skipped } of counts) {
  const skips = skipped > 0 ? `, ${skipped} skipped` : '';
  say(`${name}: ${passed} passed, ${failed} failed${skips}`);
}
const total = (key) => counts.reduce((sum, count) => sum + count[key], 0);
say(`${total('passed')} passed, ${total('failed')} failed`);
process.exitCode = total('failed') === 0 ? 0 : 1;

async function runSteps() {
  const done = [];
  for (const { name, run, needed } of STEPS) {
    say(`\n── ${name}`);
    const count = await run();
    done.push({ name, ...count });
    if (needed && count.failed > 0) break;
  }
  return done;
}

async function check(outcome) {
  return (await outcome) ? NOTHING : { ...NOTHING, failed: 1 };
}

function command(...parameters) {
  return check(runCommand(NODE, parameters).then((code) => code === 0));
}

/** Only CI insists on the programs that read exports from outside. */
async function outsideReaders() {
  if (!process.env.CI) return NOTHING;
  return check(ensureOutsideReaders());
}

async function nodeTests() {
  const file = `${RESULTS}/node.json`;
  const reporters = ['--reporter=default', '--reporter=json', `--outputFile.json=${file}`];
  const code = await runCommand(NODE, ['node_modules/vitest/vitest.mjs', 'run', ...reporters]);
  return countVitest(file, code);
}

async function clientTests() {
  const file = `${RESULTS}/client.json`;
  const parameters = ['node_modules/@angular/cli/bin/ng.js', 'test', '--no-watch'];
  const reporters = ['--reporters=json', '--reporters=default', `--output-file=${file}`];
  const code = await runCommand(NODE, [...parameters, ...reporters], {
    environment: { NG_CLI_ANALYTICS: 'false' },
  });
  return countVitest(file, code);
}

async function browserTests() {
  const file = `${RESULTS}/browser.json`;
  const parameters = ['node_modules/@playwright/test/cli.js', 'test', '--reporter=list,json'];
  const code = await runCommand(NODE, parameters, {
    environment: { PLAYWRIGHT_JSON_OUTPUT_FILE: file },
  });
  return countPlaywright(file, code);
}
