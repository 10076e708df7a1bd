import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { startTestApplication, type TestApplication } from '../builders/test-application';
import { appendToTrail } from '../../server/services/trail/append-to-trail';
import { verifyTrail } from '../../server/services/trail/verify-trail';

let application: TestApplication;
let chain: string;

beforeAll(async () => {
  application = await startTestApplication();
  await application.dependencies.database.sequelize.query('DROP TRIGGER trail_refuse_update');
  await application.dependencies.database.sequelize.query('DROP TRIGGER trail_refuse_delete');
});

beforeEach(async () => {
  chain = crypto.randomUUID();
  for (const what of ['first', 'second', 'third']) await append(what);
});

afterAll(async () => {
  await application.close();
});

function append(what: string): Promise<void> {
  const { dependencies } = application;
  const change = { chain, personId: null, what, before: null, after: { what } };
  return dependencies.database.unitOfWork('site', (unit) =>
    appendToTrail(dependencies, change, unit),
  );
}

function tamper(statement: string): Promise<unknown> {
  const { sequelize } = application.dependencies.database;
  return sequelize.query(statement, { replacements: { chain } });
}

describe('the trail', () => {
  it('is whole as it was written', async () => {
    const head = await application.dependencies.database.stores.trail.head(chain);
    expect(await verifyTrail(application.dependencies, chain)).toEqual({
      whole: true,
      entries: 3,
      head: head!.mac,
    });
  });

  it.each([
    ['an altered entry', "UPDATE trail SET what = 'x' WHERE chain = :chain AND number = 2", 2],
    ['an altered time', "UPDATE trail SET at = 'x' WHERE chain = :chain AND number = 1", 1],
    ['a removed entry', 'DELETE FROM trail WHERE chain = :chain AND number = 2', 2],
    ['a first entry cut off', 'DELETE FROM trail WHERE chain = :chain AND number = 1', 1],
    ['an entry with an emptied value', 'UPDATE trail SET "after" = NULL WHERE chain = :chain', 1],
  ])('shows %s', async (_name, statement, firstBroken) => {
    await tamper(statement);
    expect(await verifyTrail(application.dependencies, chain)).toEqual({
      whole: false,
      firstBroken,
    });
  });

  it('shows an entry that was moved from another chain', async () => {
    const other = chain;
    chain = crypto.randomUUID();
    await tamper(`UPDATE trail SET chain = :chain WHERE chain = '${other}'`);
    expect(await verifyTrail(application.dependencies, chain)).toMatchObject({ firstBroken: 1 });
  });
});
