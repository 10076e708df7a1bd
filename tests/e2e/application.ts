import { spawn, type ChildProcess } from 'node:child_process';
import { mkdtemp, rm } from 'node:fs/promises';
import { createServer, type AddressInfo } from 'node:net';
import { tmpdir } from 'node:os';
import { join } from 'node:path';

/** A server of its own for one test file: built code, free port, empty data directory. */
export interface RunningApplication {
  readonly address: string;
  readonly dataDirectory: string;
  /** Ends the server and removes its data. */
  readonly stop: () => Promise<void>;
}

/** Starts the built server and waits until it answers, at most a minute. */
export async function startApplication(
  environment: Readonly<Record<string, string>> = {},
): Promise<RunningApplication> {
  const dataDirectory = await mkdtemp(join(tmpdir(), 'evenhand-e2e-'));
  const port = String(await freePort());
  const server = spawn(process.execPath, ['--enable-source-maps', 'dist/server/main.js'], {
    env: { ...process.env, PORT: port, EVENHAND_DATA: dataDirectory, ...environment },
    stdio: ['ignore', 'pipe', 'pipe'],
  });
  const address = `http://127.0.0.1:${port}`;
  await untilItAnswers(server, address);
  const stop = async (): Promise<void> => {
    await end(server);
    await rm(dataDirectory, { recursive: true, force: true });
  };
  return { address, dataDirectory, stop };
}

async function freePort(): Promise<number> {
  const probe = createServer();
  await new Promise<void>((resolve) => probe.listen(0, '127.0.0.1', resolve));
  const { port } = probe.address() as AddressInfo;
  await new Promise((resolve) => probe.close(resolve));
  return port;
}

async function untilItAnswers(server: ChildProcess, address: string): Promise<void> {
  const said: string[] = [];
  server.stdout?.on('data', (text: Buffer) => said.push(text.toString()));
  server.stderr?.on('data', (text: Buffer) => said.push(text.toString()));
  for (let attempt = 0; attempt < 600; attempt += 1) {
    if (server.exitCode !== null) break;
    if (await answers(address)) return;
    await new Promise((resolve) => setTimeout(resolve, 100));
  }
  server.kill('SIGKILL');
  throw new Error(`The server did not come up. It said:\n${said.join('')}`);
}

async function answers(address: string): Promise<boolean> {
  try {
    return (await fetch(`${address}/api/health`)).ok;
  } catch {
    return false;
  }
}

async function end(server: ChildProcess): Promise<void> {
  if (server.exitCode !== null) return;
  const ended = new Promise((resolve) => server.once('exit', resolve));
  server.kill('SIGTERM');
  await ended;
}
