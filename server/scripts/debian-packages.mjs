import { existsSync } from 'node:fs';
import { delimiter, join } from 'node:path';
import { runCommand, say } from './run-command.mjs';

/** The path of a program on PATH, or undefined. */
export function findProgram(name) {
  const folders = (process.env.PATH ?? '').split(delimiter);
  return folders.map((folder) => join(folder, name)).find((path) => existsSync(path));
}

/** Whether this process may install Debian packages by itself: root, with apt-get at hand. */
export function canInstallDebianPackages() {
  return process.getuid?.() === 0 && findProgram('apt-get') !== undefined;
}

/** Installs Debian packages without recommended extras; true when apt-get succeeded. */
export async function installDebianPackages(names) {
  say(`Installing from Debian: ${names.join(' ')} …`);
  const environment = { DEBIAN_FRONTEND: 'noninteractive' };
  await runCommand('apt-get', ['update', '-qq'], { environment });
  const install = ['install', '-y', '-qq', '--no-install-recommends', ...names];
  return (await runCommand('apt-get', install, { environment })) === 0;
}
