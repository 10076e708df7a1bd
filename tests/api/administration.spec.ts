import { afterAll, afterEach, beforeAll, describe, expect, it } from 'vitest';
import type { User } from '../../server/models/user/user-store';
import { verifyTrail } from '../../server/services/trail/verify-trail';
import type { Browser } from '../builders/browser';
import { mailedToken } from '../builders/mailed-token';
import {
  startTestApplication,
  TEST_PASSWORD,
  type TestApplication,
} from '../builders/test-application';

let application: TestApplication;
let administrator: User;
let browser: Browser;

beforeAll(async () => {
  application = await startTestApplication();
  administrator = await application.addPerson({ administrator: true, name: 'Ada Birch' });
  browser = await application.signedIn(administrator);
});

afterEach(() => {
  expect(application.bugs).toEqual([]);
});

afterAll(async () => {
  await application.close();
});

function change(person: User, request: object) {
  return browser.patch(`/api/administration/accounts/${person.id}`, request);
}

describe('accounts', () => {
  it('are listed by name, without any hash', async () => {
    const person = await application.addPerson({ name: 'Aaron Aaker' });
    const response = await browser.get('/api/administration/accounts');
    expect((response.body as unknown[])[0]).toEqual({
      id: person.id,
      name: 'Aaron Aaker',
      email: person.email,
      administrator: false,
      disabled: false,
      createdAt: person.createdAt,
      lastSignInAt: null,
    });
    expect(response.text).not.toContain('argon2');
  });

  it('are made with an invitation, and their person chooses the password', async () => {
    const request = { name: 'Kim Sand', email: 'kim@example.org' };
    const made = await browser.post('/api/administration/accounts', request);
    expect(made.status).toBe(201);
    expect(made.body).toMatchObject({ ...request, administrator: false, disabled: false });
    const token = await mailedToken(application, 'kim@example.org');
    application.clock.moveBy(6 * 24 * 3600);
    const newcomer = await application.browser();
    const completion = { token, newPassword: 'the first one of mine' };
    expect((await newcomer.post('/api/password-resets/completion', completion)).status).toBe(204);
    expect((await newcomer.signIn('kim@example.org', completion.newPassword)).status).toBe(200);
    browser = await application.signedIn(administrator);
  });

  it('that are switched off end their sessions, and come back when switched on', async () => {
    const person = await application.addPerson();
    const theirs = await application.signedIn(person);
    expect((await change(person, { disabled: true })).body).toMatchObject({ disabled: true });
    expect((await theirs.get('/api/studies')).status).toBe(401);
    expect((await theirs.signIn(person.email, TEST_PASSWORD)).status).toBe(403);
    const fresh = await application.browser();
    expect((await fresh.signIn(person.email, TEST_PASSWORD)).status).toBe(401);
    await change(person, { disabled: false });
    expect((await theirs.get('/api/studies')).status).toBe(401);
    expect((await fresh.signIn(person.email, TEST_PASSWORD)).status).toBe(200);
  });

  it('are made administrators and back; what is left out stays', async () => {
    const person = await application.addPerson({ name: 'Before' });
    const theirs = await application.signedIn(person);
    await change(person, { administrator: true });
    expect((await theirs.get('/api/administration/accounts')).status).toBe(200);
    await change(person, { name: 'After', administrator: false });
    expect((await theirs.get('/api/administration/accounts')).status).toBe(403);
    const { users } = application.dependencies.database.stores;
    expect(await users.findById(person.id)).toMatchObject({ name: 'After', disabled: false });
  });

  it('leave their changes in the trail of the site, sealed', async () => {
    const person = await application.addPerson({ name: 'One' });
    await change(person, { name: 'Two' });
    const { trail } = application.dependencies.database.stores;
    expect(await trail.head('site')).toMatchObject({
      personId: administrator.id,
      what: 'account.changed',
      before: JSON.stringify({
        person: person.id,
        name: 'One',
        administrator: false,
        disabled: false,
      }),
      after: JSON.stringify({
        person: person.id,
        name: 'Two',
        administrator: false,
        disabled: false,
      }),
    });
    expect(await verifyTrail(application.dependencies, 'site')).toMatchObject({ whole: true });
  });
});

describe('the outbox', () => {
  it('shows mails to administrators with live links hidden', async () => {
    await browser.post('/api/administration/accounts', { name: 'Lee', email: 'lee@example.org' });
    const token = await mailedToken(application, 'lee@example.org');
    const response = await browser.get('/api/administration/mail');
    expect((response.body as unknown[])[0]).toMatchObject({
      to: 'lee@example.org',
      subject: 'You have an Evenhand account',
      delivery: 'outbox',
    });
    expect(response.text).toContain('Ada Birch made an account for you');
    expect(response.text).not.toContain(token);
    expect(response.text).not.toContain('token=');
  });
});

describe('POST /api/administration/accounts rejects', () => {
  it('an address that is taken, whatever its case', async () => {
    const person = await application.addPerson();
    const request = { name: 'Twin', email: person.email.toUpperCase() };
    const response = await browser.post('/api/administration/accounts', request);
    expect(response.body).toMatchObject({ status: 409, code: 'emailTaken' });
  });

  it('no name and no address, beside the fields', async () => {
    const response = await browser.post('/api/administration/accounts', { name: '  ', email: 'x' });
    expect(response.body).toMatchObject({
      status: 422,
      fields: [
        { path: 'name', message: 'Give a name.' },
        { path: 'email', message: 'Give an e-mail address such as name@example.org.' },
      ],
    });
  });
});

describe('PATCH /api/administration/accounts/:personId rejects', () => {
  it('switching off or demoting the last administrator', async () => {
    const own = await startTestApplication();
    const only = await own.addPerson({ administrator: true });
    await own.addPerson({ administrator: true, disabled: true });
    const theirs = await own.signedIn(only);
    for (const request of [{ administrator: false }, { disabled: true }]) {
      const response = await theirs.patch(`/api/administration/accounts/${only.id}`, request);
      expect(response.body).toMatchObject({ status: 409, code: 'lastAdministrator' });
    }
    expect(await own.dependencies.database.stores.users.countAdministrators()).toBe(1);
    expect((await theirs.get('/api/administration/accounts')).status).toBe(200);
    await own.close();
  });

  it('an account that does not exist', async () => {
    const response = await browser.patch('/api/administration/accounts/nobody', { name: 'X' });
    expect(response.body).toMatchObject({ status: 404, code: 'notFound' });
  });

  it('a value of the wrong kind', async () => {
    const response = await change(administrator, { disabled: 'yes' });
    expect(response.body).toMatchObject({
      status: 422,
      fields: [{ path: 'disabled', message: 'This must be true or false.' }],
    });
  });
});

describe('GET /api/administration/accounts rejects', () => {
  it('people who are no administrators', async () => {
    const other = await application.signedIn(await application.addPerson());
    const response = await other.get('/api/administration/accounts');
    expect(response.body).toMatchObject({ status: 403, code: 'administratorNeeded' });
  });
});

describe('GET /api/administration/mail rejects', () => {
  it('people who are no administrators', async () => {
    const other = await application.signedIn(await application.addPerson());
    expect((await other.get('/api/administration/mail')).status).toBe(403);
  });
});
