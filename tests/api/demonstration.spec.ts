import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { addDemonstrationAccount } from '../../server/services/demonstration/add-demonstration-account';
import { markAsDemonstration } from '../../server/services/demonstration/demonstration';
import { createStudy } from '../../server/services/studies/create-study';
import { welcome } from '../../server/start-up/welcome';
import { startTestApplication, type TestApplication } from '../builders/test-application';

const ACCOUNT = { name: 'Ada Birch', email: 'ada@example.org', password: 'a documented password' };

let application: TestApplication;

beforeEach(async () => {
  application = await startTestApplication();
});

afterEach(async () => {
  await application.close();
  expect(application.bugs).toEqual([]);
});

describe('a database that was seeded for demonstration', () => {
  it('tells its documented accounts and their password, on the page and at start', async () => {
    const { dependencies } = application;
    const account = { ...ACCOUNT, administrator: false };
    const person = await addDemonstrationAccount(dependencies, account);
    const words = { title: 'Supper', population: '', peopleNoun: 'guests' };
    await createStudy(dependencies, person, { ...words, design: 'cohort' }, 'invented');
    await markAsDemonstration(dependencies, {
      accounts: [{ email: ACCOUNT.email, role: 'lead' }],
      password: ACCOUNT.password,
    });
    const browser = await application.browser();
    expect((await browser.get('/api/session')).body).toEqual({
      person: null,
      firstAdministratorNeeded: false,
      demonstrationAccounts: [{ email: 'ada@example.org', role: 'lead' }],
      demonstrationPassword: 'a documented password',
    });
    expect((await browser.signIn(ACCOUNT.email, ACCOUNT.password)).status).toBe(200);
    expect((await browser.get('/api/studies')).body).toMatchObject([
      { title: 'Supper', role: 'lead', invented: true },
    ]);
    const said = (await welcome(dependencies)).join('\n');
    expect(said).toContain('  ada@example.org (lead)');
    expect(said).toContain('"a documented password"');
    expect(said).not.toContain(dependencies.firstAdministratorCode);
  });
});

describe('a database that was not', () => {
  it('prints the code while there is no account, and nothing of it later', async () => {
    const { dependencies } = application;
    expect((await welcome(dependencies)).join('\n')).toContain(dependencies.firstAdministratorCode);
    await application.addPerson();
    expect((await welcome(dependencies)).join('\n')).toBe(
      '\nEvenhand is ready. Open http://localhost:4600\n',
    );
  });
});
