import { spawn } from 'node:child_process';

const running = new Set();

for (const signal of ['SIGINT', 'SIGTERM']) {
  process.on(signal, () => passOn(signal));
}

/**
 * Runs a command with this terminal and resolves with its exit code.
 *
 * A command that can't be started gives 127; one ended by a signal gives 1.
 */
export function runCommand(command, parameters, { environment = {}, quiet = false } = {}) {
  return new Promise((resolve) => {
    const child = spawn(command, parameters, {
      stdio: quiet ? 'ignore' : 'inherit',
      env: { ...process.env, ...environment },
      shell: process.platform === 'win32',
    });
    running.add(child);
    child.once('error', () => settle(child, resolve, 127));
    child.once('exit', (code) => settle(child, resolve, code ?? 1));
  });
}

/** Hands SIGINT and SIGTERM back to whoever runs next in this process. */
export function releaseSignals() {
  process.removeAllListeners('SIGINT');
  process.removeAllListeners('SIGTERM');
}

/** Prints one plain line about the step that begins or was left out. */
export function say(line) {
  console.log(line);
}

function settle(child, resolve, code) {
  running.delete(child);
  resolve(code);
}

function passOn(signal) {
  for (const child of running) child.kill(signal);
  process.exit(signal === 'SIGINT' ? 130 : 143);
}
