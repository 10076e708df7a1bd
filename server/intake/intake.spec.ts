import { mkdtemp, rm, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, afterEach, beforeAll, describe, expect, it } from 'vitest';
import type { Chunk } from './encode/chunk';
import { createIntake, INTAKE_LIMITS, type Intake, type IntakeJob } from './intake';
import { FIND_OUT } from './testing/read-bytes';

let folder: string;
let intake: Intake;
const logged: unknown[] = [];
const log = (...words: readonly unknown[]): void => void logged.push(words);

beforeAll(async () => {
  folder = await mkdtemp(join(tmpdir(), 'evenhand-intake-'));
  intake = createIntake(log);
});

afterEach(() => {
  logged.length = 0;
});

afterAll(async () => {
  await intake.close();
  await rm(folder, { recursive: true });
});

async function jobOf(
  id: string,
  text: string,
  storeChunks: IntakeJob['storeChunks'],
): Promise<IntakeJob> {
  const path = join(folder, id);
  await writeFile(path, text);
  return {
    id,
    storeChunks,
    order: { path, fileName: 'data.csv', options: FIND_OUT, previous: null },
  };
}

const MANY = `id,x\n${Array.from({ length: 300_000 }, (_, row) => `${String(row)},y`).join('\n')}\n`;

describe('an intake', () => {
  it('reads files one after the other, each whole', async () => {
    for (const rows of [1, 2]) {
      const chunks: Chunk[] = [];
      const job = await jobOf('small', `a,b\n${'1,2\n'.repeat(rows)}`, (some) =>
        Promise.resolve(void chunks.push(...some)),
      );
      const end = await intake.read(job);
      expect(end).toMatchObject({ ok: true, value: { rows } });
      expect(chunks).toHaveLength(4);
    }
  });

  it('waits for the pieces to be stored, and tells how far it is', async () => {
    let stored = 0;
    const seen: number[] = [];
    const job = await jobOf('slow', MANY, async (some) => {
      await new Promise((resolve) => setTimeout(resolve, 20));
      expect(some.reduce((bytes, chunk) => bytes + chunk.bytes.length, 0)).toBeLessThan(1 << 20);
      stored += some.length;
      seen.push(intake.progressOf('slow')?.rows ?? -1);
    });
    const end = await intake.read(job);
    expect(end?.ok && end.value.rows).toBe(300_000);
    expect(stored).toBeGreaterThan(10);
    expect(seen.every((rows) => rows >= 0)).toBe(true);
    expect(intake.progressOf('slow')).toBeNull();
  });

  it('stops a reading, and reads on with another thread', async () => {
    const job = await jobOf(
      'stopped',
      MANY,
      () => new Promise((resolve) => setTimeout(resolve, 10)),
    );
    const reading = intake.read(job);
    await intake.stop('stopped');
    expect(await reading).toBeNull();
    const next = await jobOf('next', 'a,b\n1,2\n', () => Promise.resolve());
    expect(await intake.read(next)).toMatchObject({ ok: true });
    expect(logged).toEqual([]);
  });

  it('refuses a file with its reason', async () => {
    const job = await jobOf('ragged', 'a,b\n1\n', () => Promise.resolve());
    expect(await intake.read(job)).toMatchObject({ ok: false, issue: { code: 'raggedRow' } });
  });

  it('says that reading failed when a piece cannot be stored, and logs why', async () => {
    const full = new Error('The disk is full.');
    const job = await jobOf('full', MANY, () => Promise.reject(full));
    expect(await intake.read(job)).toEqual({ ok: false, issue: { code: 'readerFailed' } });
    expect(logged).toEqual([['Reading a file failed', full]]);
  });

  it('survives a thread that breaks', async () => {
    const broken = createIntake(log, {
      ...INTAKE_LIMITS,
      workerPath: 'intake/testing/broken-worker',
    });
    const job = await jobOf('broken', 'a,b\n1,2\n', () => Promise.resolve());
    expect(await broken.read(job)).toEqual({ ok: false, issue: { code: 'readerFailed' } });
    expect(String((logged[0] as unknown[])[1])).toContain('This worker breaks.');
    await broken.close();
  });
});
