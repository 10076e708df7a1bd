import { spawn } from 'node:child_process';
import { mkdtemp, readdir, readFile, rm, stat } from 'node:fs/promises';
import { createServer, type AddressInfo } from 'node:net';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';

let dataDirectory: string;

beforeEach(async () => {
  dataDirectory = await mkdtemp(join(tmpdir(), 'evenhand-start-'));
});

afterEach(async () => {
  await rm(dataDirectory, { recursive: true, force: true });
});

interface Started {
  readonly said: () => string;
  readonly address: string;
  readonly end: (signal: NodeJS.Signals) => Promise<number | null>;
  readonly ended: Promise<number | null>;
}

async function freePort(): Promise<number> {
  const probe = createServer();
  await new Promise<void>((resolve) => probe.listen(0, '127.0.0.1', resolve));
  const { port } = probe.address() as AddressInfo;
  await new Promise((resolve) => probe.close(resolve));
  return port;
}

/** Starts the server from its sources, as `npm run dev` does. */
function start(environment: Readonly<Record<string, string>>, port: number): Started {
  const server = spawn(process.execPath, ['--import', 'tsx', 'server/main.ts'], {
    env: {
      ...process.env,
      EVENHAND_DATA: dataDirectory,
      EVENHAND_DEMONSTRATION: 'no',
      PORT: String(port),
      ...environment,
    },
    stdio: ['ignore', 'pipe', 'pipe'],
  });
  const words: string[] = [];
  server.stdout.on('data', (text: Buffer) => words.push(text.toString()));
  server.stderr.on('data', (text: Buffer) => words.push(text.toString()));
  const ended = new Promise<number | null>((resolve) => {
    server.once('exit', (code) => {
      resolve(code);
    });
  });
  return {
    said: () => words.join(''),
    address: `http://127.0.0.1:${String(port)}`,
    ended,
    end: (signal) => {
      server.kill(signal);
      return ended;
    },
  };
}

async function untilItSays(started: Started, words: RegExp): Promise<void> {
  await expect.poll(() => started.said(), { timeout: 60_000, interval: 100 }).toMatch(words);
}

describe('the server', () => {
  it('says where to go and prints the code, and ends cleanly on SIGTERM', async () => {
    const started = start({}, await freePort());
    await untilItSays(started, /Evenhand is ready\. Open http:\/\/localhost:\d+\n/);
    await untilItSays(started, /asks for the first administrator.*\n +([A-Z2-9]{4}-?){4}\n/);
    expect((await fetch(`${started.address}/api/health`)).status).toBe(200);
    for (const name of ['session-secret', 'trail-key']) {
      expect((await stat(join(dataDirectory, name))).mode & 0o777).toBe(0o600);
    }
    const secret = await readFile(join(dataDirectory, 'session-secret'), 'utf8');
    expect(await started.end('SIGTERM')).toBe(0);
    expect(await readdir(dataDirectory)).not.toContain('evenhand.sqlite-wal');
    const again = start({}, await freePort());
    await untilItSays(again, /Evenhand is ready\./);
    expect(await readFile(join(dataDirectory, 'session-secret'), 'utf8')).toBe(secret);
    expect(await again.end('SIGINT')).toBe(0);
  }, 120_000);

  it('says plainly that its port is taken', async () => {
    const taken = createServer();
    await new Promise<void>((resolve) => taken.listen(0, resolve));
    const { port } = taken.address() as AddressInfo;
    const started = start({}, port);
    expect(await started.ended).toBe(1);
    expect(started.said()).toContain(`Evenhand can't start: Port ${String(port)} is taken;`);
    await new Promise((resolve) => taken.close(resolve));
  }, 60_000);

  it('says plainly which setting it cannot use', async () => {
    const started = start({ PORT: 'many' }, 1);
    expect(await started.ended).toBe(1);
    expect(started.said()).toContain('PORT must be a whole number from 0 to 65535.');
  }, 60_000);
});
