import { existsSync, readFileSync, writeFileSync } from 'node:fs';
import {
  canInstallDebianPackages,
  findProgram,
  installDebianPackages,
} from './debian-packages.mjs';
import { runCommand, say } from './run-command.mjs';

const OLDEST_NODE = [20, 19];
const STAMP = 'node_modules/.install-stamp';
const COMPILERS = { 'g++': 'g++', make: 'make', python3: 'python3' };

/**
 * Makes node_modules agree with package-lock.json and with this Node; true when it does.
 *
 * Does nothing when they agree already. SQLite is compiled when no ready binary can be had,
 * which needs g++, make and python3: as root on Debian they are installed, elsewhere named.
 */
export async function ensureNodePackages() {
  if (!nodeIsRecentEnough()) return false;
  if (isInstalled()) {
    say('Packages: up to date.');
    return true;
  }
  say('Packages: installing (two or three minutes the first time) …');
  const installed = (await installOnce()) || (await installWithCompilers());
  if (installed) writeFileSync(STAMP, stamp());
  return installed;
}

function nodeIsRecentEnough() {
  const [major, minor] = process.versions.node.split('.').map(Number);
  const [oldestMajor, oldestMinor] = OLDEST_NODE;
  if (major > oldestMajor || (major === oldestMajor && minor >= oldestMinor)) return true;
  say(`Evenhand needs Node ${OLDEST_NODE.join('.')} or newer; this is ${process.versions.node}.`);
  return false;
}

function isInstalled() {
  if (!existsSync(STAMP) || readFileSync(STAMP, 'utf8') !== stamp()) return false;
  const wanted = lockedPackages('package-lock.json');
  const present = lockedPackages('node_modules/.package-lock.json');
  return Object.entries(wanted).every(
    ([path, entry]) =>
      path === '' ||
      (present[path] ? present[path].version === entry.version : entry.optional === true),
  );
}

function lockedPackages(path) {
  return existsSync(path) ? JSON.parse(readFileSync(path, 'utf8')).packages : {};
}

/** Compiled packages hold for one Node version on one platform. */
function stamp() {
  return `${process.version} ${process.platform} ${process.arch}\n`;
}

async function installOnce() {
  return (await runCommand('npm', ['ci', '--include=dev', '--loglevel=error'])) === 0;
}

async function installWithCompilers() {
  const missing = Object.keys(COMPILERS).filter((program) => !findProgram(program));
  if (missing.length === 0) return false;
  if (canInstallDebianPackages()) {
    const packages = missing.map((program) => COMPILERS[program]);
    return (await installDebianPackages(packages)) && installOnce();
  }
  say(`SQLite has to be compiled here, and these programs are missing: ${missing.join(', ')}.`);
  say('Install them (on Debian or Ubuntu: apt-get install g++ make python3) and start again.');
  return false;
}
