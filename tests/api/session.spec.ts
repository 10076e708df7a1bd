import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import {
  startTestApplication,
  TEST_PASSWORD,
  type TestApplication,
} from '../builders/test-application';

let application: TestApplication;

beforeAll(async () => {
  application = await startTestApplication();
});

afterAll(async () => {
  await application.close();
  expect(application.bugs).toEqual([]);
});

describe('signing in', () => {
  it('says who is signed in, before and after', async () => {
    const person = await application.addPerson({ name: 'Ada Juniper Birch' });
    const browser = await application.browser();
    expect((await browser.get('/api/session')).body).toMatchObject({ person: null });
    const response = await browser.signIn(person.email.toUpperCase(), TEST_PASSWORD);
    expect(response.status).toBe(200);
    expect(response.body).toMatchObject({ person: { id: person.id, initials: 'AB' } });
    expect((await browser.get('/api/session')).body).toMatchObject({ person: { id: person.id } });
    expect((await browser.delete('/api/session')).status).toBe(204);
    expect((await browser.get('/api/session')).body).toMatchObject({ person: null });
  });
});
