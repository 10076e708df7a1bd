import { mkdtemp, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { openDatabase, type Database } from './database';
import type { Unit } from './unit-of-work';

let folder: string;
let database: Database;
let userId: string;

beforeAll(async () => {
  folder = await mkdtemp(join(tmpdir(), 'evenhand-units-'));
  database = await openDatabase(folder);
});

beforeEach(async () => {
  userId = crypto.randomUUID();
  await database.unitOfWork('site', (unit) => addUser(userId, unit));
});

afterAll(async () => {
  await database.close();
  await rm(folder, { recursive: true });
});

function addUser(id: string, unit: Unit): Promise<void> {
  const rest = { name: 'Before', passwordHash: null, administrator: false, disabled: false };
  const times = { createdAt: '2026-01-01T00:00:00.000Z', lastSignInAt: null };
  return database.stores.users.insert({ id, email: `${id}@example.org`, ...rest, ...times }, unit);
}

function rename(name: string, unit: Unit): Promise<void> {
  return database.stores.users.update(userId, { name }, unit);
}

async function storedName(): Promise<string | undefined> {
  return (await database.stores.users.findById(userId))?.name;
}

describe('a unit of work', () => {
  it('is stored as a whole, and gives what its work gives', async () => {
    const value = await database.unitOfWork('site', async (unit) => {
      await rename('After', unit);
      return (await database.stores.users.findById(userId, unit))?.name;
    });
    expect(value).toBe('After');
    expect(await storedName()).toBe('After');
  });

  it('leaves nothing behind when it throws', async () => {
    const work = database.unitOfWork('site', async (unit) => {
      await rename('After', unit);
      throw new Error('halfway');
    });
    await expect(work).rejects.toThrow('halfway');
    expect(await storedName()).toBe('Before');
  });

  it('leaves nothing behind when it gives a failure, and gives that failure', async () => {
    const issue = { code: 'lastLead' };
    const value = await database.unitOfWork('site', async (unit) => {
      await rename('After', unit);
      return { ok: false, issue } as const;
    });
    expect(value).toEqual({ ok: false, issue });
    expect(await storedName()).toBe('Before');
  });

  it('is alone: fifty counters at once lose no count, while others read', async () => {
    await database.unitOfWork('site', (unit) => rename('0', unit));
    const count = () =>
      database.unitOfWork('site', async (unit) => {
        const name = (await database.stores.users.findById(userId, unit))?.name;
        await rename(String(Number(name) + 1), unit);
      });
    const reads = Array.from({ length: 100 }, storedName);
    await Promise.all([...Array.from({ length: 50 }, count), ...reads]);
    expect(await storedName()).toBe('50');
  });

  it('is refused within another, since it would wait for ever', async () => {
    const nested = database.unitOfWork('site', () =>
      database.unitOfWork('study:x', () => Promise.resolve(1)),
    );
    await expect(nested).rejects.toThrow('A unit of work (study:x) was opened within another');
  });

  it('goes on after one that failed', async () => {
    const failed = database.unitOfWork('site', () => Promise.reject(new Error('first')));
    const next = database.unitOfWork('site', (unit) => rename('After', unit));
    await expect(failed).rejects.toThrow('first');
    await next;
    expect(await storedName()).toBe('After');
  });
});

describe('the database', () => {
  it('keeps a write-ahead log and checks foreign keys, in transactions too', async () => {
    const [rows] = await database.sequelize.query('PRAGMA journal_mode');
    expect(rows).toEqual([{ journal_mode: 'wal' }]);
    const orphan = database.unitOfWork('site', (unit) =>
      database.stores.memberships.insert(
        { studyId: 'none', userId, role: 'lead', createdAt: '' },
        unit,
      ),
    );
    await expect(orphan).rejects.toThrow(/foreign key/i);
  });

  it('refuses to change or remove what is immutable', async () => {
    const entry = { number: 1, at: '', personId: null, what: 'x', before: null, after: null };
    await database.unitOfWork('site', (unit) =>
      database.stores.trail.append({ chain: 'c', ...entry, previousMac: '', mac: '' }, unit),
    );
    const { sequelize } = database;
    await expect(sequelize.query("UPDATE trail SET what = 'y'")).rejects.toThrow();
    await expect(sequelize.query('DELETE FROM trail')).rejects.toThrow();
    expect(await database.stores.trail.head('c')).toMatchObject({ what: 'x' });
  });

  it('opens again as it was left, without migrating twice', async () => {
    const again = await openDatabase(folder);
    expect((await again.stores.users.findById(userId))?.name).toBe('Before');
    await again.close();
  });

  it('finds an address whatever its case and width', async () => {
    const found = await database.stores.users.findByEmail(` ${userId.toUpperCase()}@EXAMPLE.org`);
    expect(found?.id).toBe(userId);
  });
});
