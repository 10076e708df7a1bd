import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { startTestApplication, type TestApplication } from '../builders/test-application';

const REQUEST = { name: 'Ivo Lind', email: 'ivo@example.org', password: 'three words in a row' };

let application: TestApplication;

beforeEach(async () => {
  application = await startTestApplication();
});

afterEach(async () => {
  await application.close();
  expect(application.bugs).toEqual([]);
});

describe('the first administrator', () => {
  it('is made with the printed code, and signed in at once', async () => {
    const browser = await application.browser();
    expect((await browser.get('/api/session')).body).toMatchObject({
      firstAdministratorNeeded: true,
    });
    const code = application.dependencies.firstAdministratorCode;
    const typed = ` ${code.toLowerCase().replaceAll('-', ' ')}`;
    const response = await browser.post('/api/first-administrator', { ...REQUEST, code: typed });
    expect(response.status).toBe(201);
    expect(response.body).toMatchObject({
      person: { name: 'Ivo Lind', administrator: true },
      firstAdministratorNeeded: false,
    });
    expect((await browser.get('/api/administration/accounts')).body).toHaveLength(1);
  });

  it('needs a code that nobody guesses', () => {
    const { firstAdministratorCode } = application.dependencies;
    expect(firstAdministratorCode).toMatch(/^([A-HJ-NP-Z2-9]{4}-){3}[A-HJ-NP-Z2-9]{4}$/);
  });
});

describe('POST /api/first-administrator rejects', () => {
  it('a wrong code', async () => {
    const browser = await application.browser();
    const request = { ...REQUEST, code: 'AAAA-AAAA-AAAA-AAAA' };
    const response = await browser.post('/api/first-administrator', request);
    expect(response.body).toMatchObject({ status: 403, code: 'wrongCode' });
    expect(await application.dependencies.database.stores.users.count()).toBe(0);
  });

  it('a second administrator, even with the code and at the same moment', async () => {
    const code = application.dependencies.firstAdministratorCode;
    const browsers = [await application.browser(), await application.browser()];
    const answers = await Promise.all(
      browsers.map((browser, index) =>
        browser.post('/api/first-administrator', {
          ...REQUEST,
          email: `person-${String(index)}@example.org`,
          code,
        }),
      ),
    );
    expect(answers.map(({ status }) => status).sort()).toEqual([201, 409]);
    expect(await application.dependencies.database.stores.users.count()).toBe(1);
  });

  it('a weak password, beside its field', async () => {
    const browser = await application.browser();
    const code = application.dependencies.firstAdministratorCode;
    const request = { ...REQUEST, code, password: 'ivo@example.org' };
    const response = await browser.post('/api/first-administrator', request);
    expect(response.body).toMatchObject({ status: 422, fields: [{ path: 'password' }] });
  });
});
