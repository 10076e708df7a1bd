import { DeskPage } from './pages/desk-page';
import { startApplication, type RunningApplication } from './application';
import { printedCode } from './sessions';
import { ADMINISTRATOR, expect, test } from './test';
import { startWatch } from './watch';

test.describe('a server without accounts', () => {
  test.use({ signedIn: null });
  let own: RunningApplication;

  test.beforeAll(async () => {
    own = await startApplication();
  });

  test.afterAll(async () => {
    await own.stop();
  });

  test('asks for the first administrator, with the code that it printed', async ({ browser }) => {
    const watch = startWatch(own.address, [403]);
    const context = await browser.newContext({ baseURL: own.address });
    watch.over(context);
    const page = await context.newPage();
    await page.goto('/');
    await expect(page.getByRole('heading', { name: 'First administrator' })).toBeVisible();

    await page.getByLabel('Start code').fill('not the code');
    await page.getByLabel('Your name').fill('Wilma Hart');
    await page.getByLabel('Work e-mail').fill(ADMINISTRATOR.email);
    await page.getByRole('textbox', { name: 'Password' }).fill('too short');
    await page.getByRole('button', { name: 'Create the account' }).click();
    await expect(page.getByText('at least 12 characters', { exact: false }).first()).toBeVisible();
    await page.getByRole('textbox', { name: 'Password' }).fill(ADMINISTRATOR.password);
    await page.getByRole('button', { name: 'Create the account' }).click();
    await expect(page.getByText('The code is not the one that the server printed')).toBeVisible();

    await page.getByLabel('Start code').fill(printedCode(own));
    await page.getByRole('button', { name: 'Create the account' }).click();
    await expect(page.getByRole('heading', { level: 1, name: 'Your desk' })).toBeVisible();
    expect(watch.complaints).toEqual([]);
    await context.close();
  });
});

test.describe('somebody with an account', () => {
  test.use({ signedIn: null, refusals: [401] });

  test('signs in, comes to the page that was asked for, and signs out', async ({ page }) => {
    await page.goto('/account');
    await expect(page.getByRole('heading', { name: 'Sign in' })).toBeVisible();
    await page.getByLabel('Work e-mail').fill(ADMINISTRATOR.email);
    await page.getByRole('textbox', { name: 'Password' }).fill('not the password');
    await page.getByRole('button', { name: 'Sign in' }).click();
    await expect(page.getByText('do not belong together')).toBeVisible();

    await page.getByRole('textbox', { name: 'Password' }).fill(ADMINISTRATOR.password);
    await page.getByRole('button', { name: 'Sign in' }).click();
    await expect(page).toHaveURL(/\/account$/);
    await page.getByRole('button', { name: /, your account$/ }).click();
    await page.getByRole('button', { name: 'Sign out' }).click();
    await expect(page.getByRole('heading', { name: 'Sign in' })).toBeVisible();
    await page.goto('/desk');
    await expect(page.getByRole('heading', { name: 'Sign in' })).toBeVisible();
  });
});

test('keeps the session over a reload', async ({ page }) => {
  const desk = new DeskPage(page);
  await desk.open();
  await page.reload();
  await expect(page.getByRole('heading', { level: 1, name: 'Your desk' })).toBeVisible();
});
