import { readFile, readdir } from 'node:fs/promises';
import { join } from 'node:path';
import { afterAll, afterEach, beforeAll, describe, expect, it } from 'vitest';
import type { User } from '../../server/models/user/user-store';
import {
  startTestApplication,
  TEST_PASSWORD,
  type TestApplication,
} from '../builders/test-application';
import { mailedToken } from '../builders/mailed-token';

const NEW_PASSWORD = 'quite another long one';

let application: TestApplication;

beforeAll(async () => {
  application = await startTestApplication();
});

afterEach(() => {
  expect(application.bugs).toEqual([]);
});

afterAll(async () => {
  await application.close();
});

async function canSignIn(person: User, password: string): Promise<boolean> {
  const browser = await application.browser();
  return (await browser.signIn(person.email, password)).status === 200;
}

async function requestToken(person: User): Promise<string> {
  const browser = await application.browser();
  const response = await browser.post('/api/password-resets', { email: person.email });
  expect(response.status).toBe(202);
  return mailedToken(application, person.email);
}

async function complete(token: string, newPassword = NEW_PASSWORD) {
  const browser = await application.browser();
  return browser.post('/api/password-resets/completion', { token, newPassword });
}

describe('changing the own password', () => {
  it('ends the other sessions, keeps this one, and tells the person by mail', async () => {
    const person = await application.addPerson();
    const [here, elsewhere] = [
      await application.signedIn(person),
      await application.signedIn(person),
    ];
    const request = { currentPassword: TEST_PASSWORD, newPassword: NEW_PASSWORD };
    expect((await here.post('/api/password-changes', request)).status).toBe(204);
    expect((await here.get('/api/studies')).status).toBe(200);
    expect((await elsewhere.get('/api/studies')).status).toBe(401);
    expect(await canSignIn(person, TEST_PASSWORD)).toBe(false);
    expect(await canSignIn(person, NEW_PASSWORD)).toBe(true);
    await application.dependencies.background.idle();
    const mails = await application.dependencies.database.stores.mail.newest(10);
    expect(mails.find(({ toAddress }) => toAddress === person.email)?.subject).toBe(
      'Your Evenhand password was changed',
    );
  });

  it('is kept as an argon2id hash with a salt', async () => {
    const { users } = application.dependencies.database.stores;
    const [one, other] = [await application.addPerson(), await application.addPerson()];
    const hashes = [await users.findById(one.id), await users.findById(other.id)].map(
      (user) => user?.passwordHash,
    );
    expect(hashes[0]).toMatch(/^\$argon2id\$v=19\$m=8,t=1,p=1\$/);
    expect(hashes[0]).not.toBe(hashes[1]);
  });
});

describe('POST /api/password-changes rejects', () => {
  it('a wrong present password, and guessing it', async () => {
    const person = await application.addPerson();
    const browser = await application.signedIn(person);
    const guess = { currentPassword: 'a guess', newPassword: NEW_PASSWORD };
    for (let attempt = 0; attempt < 5; attempt += 1) {
      const response = await browser.post('/api/password-changes', guess);
      expect(response.body).toMatchObject({ status: 403, code: 'wrongPassword' });
    }
    const right = { currentPassword: TEST_PASSWORD, newPassword: NEW_PASSWORD };
    const blocked = await browser.post('/api/password-changes', right);
    expect(blocked.body).toMatchObject({ status: 429, code: 'signInBlocked' });
    expect(await canSignIn(person, NEW_PASSWORD)).toBe(false);
  });

  it.each([
    ['short', 'Use at least 12 characters.'],
    ['x'.repeat(201), 'Use at most 200 characters.'],
    ['aaaaaaaaaaaaaaaa', /repeats or counts/],
    ['123456789012345', /repeats or counts/],
    ['password2026!', /guessed first/],
    ['Robin.Moss.2026', /name or address/],
  ])('the new password %s', async (newPassword, message) => {
    const browser = await application.signedIn(await application.addPerson({ name: 'Robin Moss' }));
    const request = { currentPassword: TEST_PASSWORD, newPassword };
    const response = await browser.post('/api/password-changes', request);
    expect(response.status).toBe(422);
    const { fields } = response.body as { fields: { path: string; message: string }[] };
    expect(fields).toHaveLength(1);
    expect(fields[0]).toMatchObject({ path: 'newPassword' });
    expect(fields[0]!.message).toMatch(message);
  });
});

describe('a forgotten password', () => {
  it('is set anew by the mailed link, which ends every session', async () => {
    const person = await application.addPerson();
    const browser = await application.signedIn(person);
    const token = await requestToken(person);
    expect((await complete(token)).status).toBe(204);
    expect((await browser.get('/api/studies')).status).toBe(401);
    expect(await canSignIn(person, TEST_PASSWORD)).toBe(false);
    expect(await canSignIn(person, NEW_PASSWORD)).toBe(true);
  });

  it('ends the wait after failed attempts, since the mailbox was proven', async () => {
    const person = await application.addPerson();
    for (let attempt = 0; attempt < 8; attempt += 1) await canSignIn(person, 'a guess');
    expect((await complete(await requestToken(person))).status).toBe(204);
    expect(await canSignIn(person, NEW_PASSWORD)).toBe(true);
  });

  it('leaves no token in the database, and no live link in the recorded mail', async () => {
    const person = await application.addPerson();
    const token = await requestToken(person);
    const { config, database } = application.dependencies;
    await database.sequelize.query('PRAGMA wal_checkpoint(TRUNCATE)');
    const bytes = await readFile(join(config.dataDirectory, 'evenhand.sqlite'));
    expect(bytes.includes(token)).toBe(false);
    expect(bytes.includes(person.email)).toBe(true);
    const mails = await database.stores.mail.newest(1);
    expect(mails[0]).toMatchObject({ toAddress: person.email, delivery: 'outbox' });
    expect(mails[0]!.text).toContain('(a link that only the addressee may open)');
  });
});

describe('POST /api/password-resets rejects', () => {
  it('nothing that would tell whether an account exists', async () => {
    const disabled = await application.addPerson({ disabled: true });
    const browser = await application.browser();
    const { config, background } = application.dependencies;
    const outbox = join(config.dataDirectory, 'outbox');
    const before = (await readdir(outbox)).length;
    for (const email of ['nobody@example.org', disabled.email]) {
      const response = await browser.post('/api/password-resets', { email });
      expect(response.status).toBe(202);
      expect(response.text).toBe('');
    }
    await background.idle();
    expect(await readdir(outbox)).toHaveLength(before);
  });

  it('what is no address', async () => {
    const browser = await application.browser();
    const response = await browser.post('/api/password-resets', { email: 'nobody' });
    expect(response.body).toMatchObject({
      status: 422,
      fields: [{ path: 'email', message: 'Give an e-mail address such as name@example.org.' }],
    });
  });
});

describe('POST /api/password-resets/completion rejects', () => {
  it('a link that was used', async () => {
    const token = await requestToken(await application.addPerson());
    expect((await complete(token)).status).toBe(204);
    expect((await complete(token, 'something else entirely')).body).toMatchObject({
      status: 410,
      code: 'linkNotUsable',
    });
  });

  it('one of two uses at the same moment', async () => {
    const token = await requestToken(await application.addPerson());
    const answers = await Promise.all([complete(token), complete(token)]);
    expect(answers.map(({ status }) => status).sort()).toEqual([204, 410]);
  });

  it('an older link once a newer one was used', async () => {
    const person = await application.addPerson();
    const older = await requestToken(person);
    application.clock.moveBy(1);
    const newer = await requestToken(person);
    expect((await complete(newer)).status).toBe(204);
    expect((await complete(older)).status).toBe(410);
  });

  it('a link that is older than an hour, or made up', async () => {
    const token = await requestToken(await application.addPerson());
    application.clock.moveBy(3601);
    expect((await complete(token)).status).toBe(410);
    expect((await complete('made up')).status).toBe(410);
  });

  it('a link of an account that was switched off', async () => {
    const person = await application.addPerson();
    const token = await requestToken(person);
    const { database } = application.dependencies;
    await database.unitOfWork('site', (unit) =>
      database.stores.users.update(person.id, { disabled: true }, unit),
    );
    expect((await complete(token)).status).toBe(410);
  });

  it('a weak password, and the link stays good', async () => {
    const token = await requestToken(await application.addPerson());
    expect((await complete(token, 'aaaaaaaaaaaaaaaa')).status).toBe(422);
    expect((await complete(token)).status).toBe(204);
  });
});
