import supertest, { type Response } from 'supertest';
import { afterAll, afterEach, beforeAll, describe, expect, it } from 'vitest';
import {
  startTestApplication,
  TEST_PASSWORD,
  type TestApplication,
} from '../builders/test-application';

const HOUR = 3600;

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

function cookies(response: Response): readonly string[] {
  return (response.headers['set-cookie'] as unknown as string[] | undefined) ?? [];
}

function sessionCookie(response: Response): string | undefined {
  return cookies(response).find((cookie) => cookie.startsWith('evenhand='));
}

async function storedSessions(): Promise<number> {
  return application.dependencies.database.stores.sessions.count();
}

describe('signing in', () => {
  it('says who is signed in, before and after', async () => {
    const person = await application.addPerson({ name: 'Ada Juniper Birch' });
    const browser = await application.browser();
    expect((await browser.get('/api/session')).body).toMatchObject({ person: null });
    const response = await browser.signIn(person.email.toUpperCase(), TEST_PASSWORD);
    expect(response.status).toBe(200);
    expect(response.body).toEqual({
      person: {
        id: person.id,
        name: 'Ada Juniper Birch',
        email: person.email,
        initials: 'AB',
        administrator: false,
      },
      firstAdministratorNeeded: false,
      demonstrationAccounts: [],
      demonstrationPassword: null,
    });
    expect((await browser.get('/api/session')).body).toMatchObject({ person: { id: person.id } });
    const { lastSignInAt } = (await application.dependencies.database.stores.users.findById(
      person.id,
    ))!;
    expect(lastSignInAt).toBe(application.clock.now().toISOString());
  });

  it('stores no session and sets no session cookie before', async () => {
    const before = await storedSessions();
    const browser = await application.browser();
    const response = await browser.get('/api/session');
    await browser.get('/api/studies');
    await browser.signIn('nobody@example.org', 'not the password');
    expect(sessionCookie(response)).toBeUndefined();
    expect(await storedSessions()).toBe(before);
  });

  it('gives a cookie that scripts and other sites cannot use', async () => {
    const person = await application.addPerson();
    const browser = await application.browser();
    const cookie = sessionCookie(await browser.signIn(person.email, TEST_PASSWORD));
    expect(cookie).toMatch(/; HttpOnly/);
    expect(cookie).toMatch(/; SameSite=Lax/);
    expect(cookie).toMatch(/; Path=\//);
  });

  it('gives a new session id each time, and voids the one before', async () => {
    const person = await application.addPerson();
    const browser = await application.browser();
    const first = sessionCookie(await browser.signIn(person.email, TEST_PASSWORD))!;
    const second = sessionCookie(await browser.signIn(person.email, TEST_PASSWORD))!;
    expect(second.split(';')[0]).not.toBe(first.split(';')[0]);
    const old = await application.browser();
    const response = await old.agent.get('/api/session').set('Cookie', first.split(';')[0]!);
    expect(response.body).toMatchObject({ person: null });
  });

  it('does not take over a session id that somebody planted', async () => {
    const person = await application.addPerson();
    const browser = await application.browser();
    const response = await browser
      .post('/api/session', { email: person.email, password: TEST_PASSWORD })
      .set('Cookie', `evenhand=s%3Aplanted.signature; XSRF-TOKEN=${browser.token()}`);
    expect(response.status).toBe(200);
    expect(sessionCookie(response)).not.toContain('planted');
  });
});

describe('the session', () => {
  it('ends on signing out, in the database too', async () => {
    const person = await application.addPerson();
    const browser = await application.signedIn(person);
    const { sessions } = application.dependencies.database.stores;
    expect(await sessions.countOf(person.id)).toBe(1);
    expect((await browser.delete('/api/session')).status).toBe(204);
    expect(await sessions.countOf(person.id)).toBe(0);
    expect((await browser.get('/api/studies')).status).toBe(401);
  });

  it('is not written on every request, and renewed at most every five minutes', async () => {
    const browser = await application.signedIn(await application.addPerson());
    application.clock.moveBy(4 * 60);
    expect(sessionCookie(await browser.get('/api/studies'))).toBeUndefined();
    application.clock.moveBy(2 * 60);
    expect(sessionCookie(await browser.get('/api/studies'))).toBeDefined();
    expect(sessionCookie(await browser.get('/api/studies'))).toBeUndefined();
  });

  it('ends after twelve hours without a request', async () => {
    const browser = await application.signedIn(await application.addPerson());
    application.clock.moveBy(11 * HOUR);
    expect((await browser.get('/api/studies')).status).toBe(200);
    application.clock.moveBy(11 * HOUR);
    expect((await browser.get('/api/studies')).status).toBe(200);
    application.clock.moveBy(12.1 * HOUR);
    expect((await browser.get('/api/studies')).status).toBe(401);
  });

  it('ends a week after signing in, used or not', async () => {
    const browser = await application.signedIn(await application.addPerson());
    for (let hours = 0; hours < 168; hours += 10) {
      expect((await browser.get('/api/studies')).status).toBe(200);
      application.clock.moveBy(10 * HOUR);
    }
    expect((await browser.get('/api/studies')).status).toBe(401);
  });

  it('does not come back when it was ended while a request ran', async () => {
    const person = await application.addPerson();
    const browser = await application.signedIn(person);
    const { database } = application.dependencies;
    application.clock.moveBy(6 * 60);
    const running = browser.get('/api/studies');
    const [response] = await Promise.all([
      running,
      database.unitOfWork('site', (unit) =>
        database.stores.sessions.endAllOf(person.id, null, unit),
      ),
    ]);
    expect([200, 401]).toContain(response.status);
    expect(await database.stores.sessions.countOf(person.id)).toBe(0);
    expect((await browser.get('/api/studies')).status).toBe(401);
  });
});

describe('POST /api/session rejects', () => {
  it('unknown, disabled and invited accounts like a wrong password', async () => {
    const person = await application.addPerson();
    const disabled = await application.addPerson({ disabled: true });
    const invited = await application.addPerson({ passwordHash: null });
    const browser = await application.browser();
    const wrong = await browser.signIn(person.email, 'not the password');
    expect(wrong.status).toBe(401);
    expect(wrong.body).toMatchObject({ code: 'signInFailed' });
    for (const email of ['nobody@example.org', disabled.email, invited.email]) {
      const response = await browser.signIn(email, TEST_PASSWORD);
      expect(response.status).toBe(401);
      expect(response.body).toEqual(wrong.body);
    }
  });

  it.each(['known', 'unknown'])('guessing at a %s account, with the time to wait', async (kind) => {
    const person = await application.addPerson();
    const email = kind === 'known' ? person.email : `${kind}@example.org`;
    const browser = await application.browser();
    for (let attempt = 0; attempt < 5; attempt += 1) {
      expect((await browser.signIn(email, 'a guess')).status).toBe(401);
    }
    const blocked = await browser.signIn(email, TEST_PASSWORD);
    expect(blocked.status).toBe(429);
    expect(blocked.headers['retry-after']).toBe('2');
    expect(blocked.body).toMatchObject({
      code: 'signInBlocked',
      title: 'Too many failed attempts for this account. Wait 2 seconds, then try again.',
      facts: { seconds: 2 },
    });
    application.clock.moveBy(2);
    const expected = kind === 'known' ? 200 : 401;
    expect((await browser.signIn(email, TEST_PASSWORD)).status).toBe(expected);
  });

  it('a person who stays away from other people’s accounts is not held up by them', async () => {
    const [victim, other] = [await application.addPerson(), await application.addPerson()];
    const browser = await application.browser();
    for (let attempt = 0; attempt < 6; attempt += 1) await browser.signIn(victim.email, 'a guess');
    expect((await browser.signIn(other.email, TEST_PASSWORD)).status).toBe(200);
  });

  it('missing fields, beside each field', async () => {
    const browser = await application.browser();
    const response = await browser.post('/api/session', { email: '' });
    expect(response.status).toBe(422);
    expect(response.body).toMatchObject({
      code: 'invalidRequest',
      fields: [
        { path: 'email', message: 'Give your e-mail address.' },
        { path: 'password', message: 'This is needed.' },
      ],
    });
  });

  it('credentials in the address', async () => {
    const person = await application.addPerson();
    const browser = await application.browser();
    const query = new URLSearchParams({ email: person.email, password: TEST_PASSWORD });
    const address = `/api/session?${query.toString()}`;
    expect((await browser.post(address, {})).status).toBe(422);
  });
});

describe('the limit by network address', () => {
  it('refuses further attempts after many failures, whatever the account', async () => {
    const narrow = await startTestApplication({ failedSignInsPerAddress: 3 });
    const person = await narrow.addPerson();
    const browser = await narrow.browser();
    for (let attempt = 0; attempt < 3; attempt += 1) {
      await browser.signIn(`guess-${String(attempt)}@example.org`, 'a guess');
    }
    const response = await browser.signIn(person.email, TEST_PASSWORD);
    expect(response.status).toBe(429);
    expect(response.body).toMatchObject({ code: 'tooManyRequests' });
    const { seconds } = (response.body as { facts: { seconds: number } }).facts;
    expect(seconds).toBeGreaterThan(0);
    expect(seconds).toBeLessThanOrEqual(600);
    expect(response.headers['retry-after']).toBe(String(seconds));
    await narrow.close();
  });
});

describe('the token against forged requests', () => {
  it('of another session or of none does not count', async () => {
    const person = await application.addPerson();
    const signedOut = await application.browser();
    const other = await application.signedIn(person);
    const browser = await application.browser();
    const cookie = sessionCookie(await browser.signIn(person.email, TEST_PASSWORD))!.split(';')[0]!;
    const signOut = (token: string) =>
      supertest(application.app)
        .delete('/api/session')
        .set('X-XSRF-TOKEN', token)
        .set('Cookie', `${cookie}; XSRF-TOKEN=${token}`);
    for (const token of [signedOut.token(), other.token(), 'made-up.token', '', '.', 'no-dot']) {
      const response = await signOut(token);
      expect(response.status).toBe(403);
      expect(response.body).toMatchObject({ code: 'forgedRequest' });
    }
    expect((await signOut(browser.token())).status).toBe(204);
  });

  it('is not enough when the browser says that another site sent the request', async () => {
    const browser = await application.signedIn(await application.addPerson());
    const from = (name: string, value: string) => browser.delete('/api/session').set(name, value);
    expect((await from('Sec-Fetch-Site', 'same-site')).status).toBe(403);
    expect((await from('Origin', 'https://elsewhere.example')).status).toBe(403);
    expect((await from('Origin', 'null')).status).toBe(403);
    expect((await from('Origin', 'http://localhost:4601')).status).toBe(403);
    expect((await from('Sec-Fetch-Site', 'same-origin')).status).toBe(204);
    const proxied = await application.signedIn(await application.addPerson());
    const origin = application.dependencies.config.publicUrl;
    const response = await proxied.delete('/api/session').set('Origin', origin);
    expect(response.status).toBe(204);
  });
});

describe('DELETE /api/session rejects', () => {
  it('nothing: signing out twice is fine', async () => {
    const browser = await application.browser();
    expect((await browser.delete('/api/session')).status).toBe(204);
    expect((await browser.delete('/api/session')).status).toBe(204);
  });
});
