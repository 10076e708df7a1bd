import { expect, test } from '@playwright/test';
import { startApplication, type RunningApplication } from './application';

let application: RunningApplication;

test.beforeAll(async () => {
  application = await startApplication();
});

test.afterAll(async () => {
  await application.stop();
});

test('the server answers on the port it was given', async ({ request }) => {
  const response = await request.get(`${application.address}/api/health`);
  expect(response.status()).toBe(200);
});
