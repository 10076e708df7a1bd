import { fileURLToPath } from 'node:url';
import { ensureNodePackages } from './node-packages.mjs';

/**
 * Installs what is missing: the packages, and on request the programs that tests use.
 *
 * --browser           a Chromium for the browser tests
 * --outside-readers   the programs that read exported files independently
 */
const wanted = new Set(process.argv.slice(2));
process.chdir(fileURLToPath(new URL('../..', import.meta.url)));

const outcomes = [await ensureNodePackages()];
if (wanted.has('--browser')) {
  const { ensureBrowser } = await import('../../tests/scripts/browser.mjs');
  outcomes.push(await ensureBrowser());
}
if (wanted.has('--outside-readers')) {
  const { ensureOutsideReaders } = await import('../../tests/scripts/outside-readers.mjs');
  outcomes.push(await ensureOutsideReaders());
}
process.exitCode = outcomes.every(Boolean) ? 0 : 1;
