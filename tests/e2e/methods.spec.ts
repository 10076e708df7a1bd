import type { Locator, Page } from '@playwright/test';
import { demonstrator, openReport, openStudy } from './demonstration';
import { expect, test } from './test';

test.use({ startingData: 'demonstration', signedIn: demonstrator('lead') });

test('a method that takes its time is computed when asked for, chosen, and kept by the server', async ({
  page,
}) => {
  await openBench(page, 'harbourSupper');
  await page.getByRole('main').getByText('All, crude', { exact: true }).click();
  const exact = methodRow(page, /Chan–Zhang/);
  await exact.getByRole('button', { name: 'Compute' }).click();
  await expect(exact).toContainText(/\d to /);
  const limits = (await exact.locator('.printed').innerText()).trim();

  await exact.getByRole('radio').check();
  await expect(exact).toHaveClass(/chosen/);
  await expect(exact.locator('.printed')).toHaveText(limits);
  await save(page);
  await page.reload();
  await page.getByRole('main').getByText('All, crude', { exact: true }).click();
  await expect(methodRow(page, /Chan–Zhang/).getByRole('radio')).toBeChecked();
  await expect(methodRow(page, /Chan–Zhang/).locator('.printed')).toHaveText(limits);
});

test('the way to pool turns table, sentence and notes of the report', async ({ page }) => {
  await openBench(page, 'wetWork');
  await methodRow(page, 'Standardised to all records').first().getByRole('radio').check();
  await expect(
    page.getByText(/After stratifying by workplace \(direct standardisation;/),
  ).toBeVisible();
  await save(page);
  const report = await openReport(page, 'wetWork');
  await expect(report.block('Table 1')).toContainText(
    'standardised to all records for the risk difference',
  );
  await expect(page.getByRole('main')).toContainText('(direct standardisation; Mantel–Haenszel)');
});

test('a table prints p-values, adjusted over all its contrasts', async ({ page }) => {
  const report = await openReport(page, 'wetWork');
  const table = report.block('Table 1');
  await report.takeInHand(table);
  await page.keyboard.press('Enter');
  await page.getByLabel('P-values').selectOption('holm');
  await expect(table.getByRole('columnheader', { name: 'P', exact: true }).first()).toBeVisible();
  await expect(table).toContainText(/adjusted for 12 contrasts together: Holm/);
});

async function openBench(page: Page, study: Parameters<typeof openStudy>[1]): Promise<void> {
  const place = await openStudy(page, study);
  await place.goTo('Analyses');
  await page.getByRole('main').getByRole('link', { name: /by/ }).first().click();
  await page.getByRole('heading', { level: 2, name: 'Estimates' }).waitFor();
}

/** A row of the panel in which methods stand beside each other. */
function methodRow(page: Page, name: string | RegExp): Locator {
  return page.locator('eh-methods-panel label.method').filter({ hasText: name }).first();
}

/** Saves; an analysis that a report uses asks why. */
async function save(page: Page): Promise<void> {
  await page.getByRole('banner').getByRole('button', { name: 'Save', exact: true }).click();
  const dialog = page.getByRole('dialog');
  await dialog.getByRole('textbox').fill('As the protocol says.');
  await dialog.getByRole('button', { name: /Save/ }).click();
  await expect(dialog).toHaveCount(0);
  await expect(
    page.getByRole('banner').getByRole('button', { name: 'Save', exact: true }),
  ).toBeDisabled();
}
