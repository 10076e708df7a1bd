import { spawn, type ChildProcess } from 'node:child_process';
import { mkdtemp, rm } from 'node:fs/promises';
import { createServer, type AddressInfo } from 'node:net';
import { tmpdir } from 'node:os';
import { join } from 'node:path';

/** A server of its own: built code, free port, temporary data directory. */
export interface RunningApplication {
  readonly address: string;
  readonly dataDirectory: string;
  /** Everything that the server has printed. */
  readonly printed: () => string;
  /** Ends the server and removes its data. */
  readonly stop: () => Promise<void>;
}

/** What the database holds at the start. */
export type StartingData = 'nothing' | 'demonstration';

/** Starts the built server and waits until it answers, at most two minutes. */
export async function startApplication(
  data: StartingData = 'nothing',
  environment: Readonly<Record<string, string>> = {},
): Promise<RunningApplication> {
  const dataDirectory = await mkdtemp(join(tmpdir(), 'evenhand-e2e-'));
  const port = String(await freePort());
  const address = `http://localhost:${port}`;
  const demonstration = data === 'demonstration' ? 'yes' : 'no';
  const own = { PORT: port, EVENHAND_DATA: dataDirectory, EVENHAND_DEMONSTRATION: demonstration };
  const server = spawn(process.execPath, ['--enable-source-maps', '-e', START], {
    env: { ...process.env, ...own, ...environment },
    stdio: ['ignore', 'pipe', 'pipe'],
  });
  const lines: string[] = [];
  server.stdout.on('data', (text: Buffer) => lines.push(text.toString()));
  server.stderr.on('data', (text: Buffer) => lines.push(text.toString()));
  const printed = (): string => lines.join('');
  await untilItAnswers(server, address, printed);
  const stop = async (): Promise<void> => {
    await end(server);
    await rm(dataDirectory, { recursive: true, force: true });
  };
  return { address, dataDirectory, printed, stop };
}

/** What `npm start` does once everything is built. */
const START = `
  import('./dist/server/seed-when-empty.js')
    .then(({ seedWhenEmpty }) => seedWhenEmpty())
    .then(() => import('./dist/server/main.js'));
`;

async function freePort(): Promise<number> {
  const probe = createServer();
  await new Promise<void>((resolve) => probe.listen(0, '127.0.0.1', resolve));
  const { port } = probe.address() as AddressInfo;
  await new Promise((resolve) => probe.close(resolve));
  return port;
}

async function untilItAnswers(
  server: ChildProcess,
  address: string,
  printed: () => string,
): Promise<void> {
  for (let attempt = 0; attempt < 1200; attempt += 1) {
    if (server.exitCode !== null) break;
    if (await answers(address)) return;
    await new Promise((resolve) => setTimeout(resolve, 100));
  }
  server.kill('SIGKILL');
  throw new Error(`The server did not come up. It said:\n${printed()}`);
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
