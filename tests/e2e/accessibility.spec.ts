import AxeBuilder from '@axe-core/playwright';
import type { Page } from '@playwright/test';
import { demonstrator, openReport, openStudy } from './demonstration';
import { NewCutPage } from './pages/new-cut-page';
import { expect, test } from './test';

/** WCAG 2.2, levels A and AA, with what it took over from 2.0 and 2.1. */
const STANDARD = ['wcag2a', 'wcag2aa', 'wcag21a', 'wcag21aa', 'wcag22aa'];
const THEMES = ['light', 'dark'] as const;
const WIDTHS = [1440, 390] as const;

test.use({ startingData: 'demonstration', signedIn: demonstrator('lead') });

test.describe('signed out', () => {
  test.use({ signedIn: null });

  test('sign-in', async ({ page }) => {
    await page.goto('/sign-in');
    await expectAccessible(page, 'Sign in');
    await page.getByRole('button', { name: 'Sign in' }).click();
    await expectAccessible(page, 'Sign in');
  });

  test('a new password', async ({ page }) => {
    await page.goto('/reset-password');
    await expectAccessible(page, 'Reset your password');
    await page.goto('/reset-password?token=none');
    await expectAccessible(page, 'Choose a password');
  });
});

test('desk, with the dialogs of a new study and a new report', async ({ page }) => {
  await page.goto('/desk');
  await expectAccessible(page, 'Your desk');
  await expectAccessibleDialog(page, 'New study');
  await expectAccessibleDialog(page, 'New report');
});

test('study, with its dialogs', async ({ page }) => {
  await openStudy(page, 'wetWork');
  await expectAccessible(page, /^Wet work/);
  await expectAccessibleDialog(page, 'Change the study');
  await expectAccessibleDialog(page, 'Add an outcome');
  await expectAccessibleDialog(page, 'Add a milestone');
  await expectAccessibleDialog(page, 'Add a member');
});

test('data, a cut and its records', async ({ page }) => {
  const study = await openStudy(page, 'wetWork');
  await study.goTo('Data');
  await expectAccessible(page, 'Data');
  await page.getByRole('link', { name: 'Cut 2', exact: true }).click();
  await expectAccessible(page, /^Staff survey, cut 2$/);
  await page.getByRole('button', { name: 'Show records' }).click();
  await page.getByRole('columnheader', { name: 'Row', exact: true }).waitFor();
  await expectAccessible(page, /^Staff survey, cut 2$/);
});

test('every step of a new cut', async ({ page }) => {
  test.setTimeout(240_000);
  const study = await openStudy(page, 'wetWork');
  await study.goTo('Data');
  await page.getByRole('link', { name: 'New cut' }).click();
  await expectAccessible(page, 'New data cut');
  const cut = new NewCutPage(page);
  await cut.upload('seeds/data/wet-work-second-cut.csv');
  await expect(cut.read).toBeVisible();
  await expectAccessible(page, 'New data cut');
  for (const step of ['Columns', 'Code book', 'Check'] as const) {
    await cut.goTo(step);
    await expectAccessible(page, 'New data cut');
  }
  await expectAccessibleDialog(page, 'Discard');
});

test('counts typed in', async ({ page }) => {
  const study = await openStudy(page, 'wetWork');
  await study.goTo('Data');
  await page.getByRole('link', { name: 'Type counts in' }).click();
  await page.getByRole('button', { name: 'Split by a stratum' }).click();
  await expectAccessible(page, 'Type counts in');
  await page.getByRole('banner').getByRole('button', { name: 'Make the cut' }).click();
  await expectAccessible(page, 'Type counts in');
});

test('code books', async ({ page }) => {
  const study = await openStudy(page, 'wetWork');
  await study.goTo('Code book');
  await page.getByRole('heading', { level: 1, name: /^Code book/ }).waitFor();
  await expectAccessible(page, /^Code book/);
});

test('analyses and the bench', async ({ page }) => {
  test.setTimeout(240_000);
  const study = await openStudy(page, 'wetWork');
  await study.goTo('Analyses');
  await expectAccessible(page, 'Analyses');
  await page.getByRole('link', { name: 'Hand eczema by wet work, within workplace' }).click();
  await page
    .getByRole('table', { name: /^Every level against/ })
    .first()
    .waitFor();
  await expectAccessible(page, /^Analysis A1/);
  await page.getByRole('button', { name: /^Exposure:/ }).click();
  await page.getByRole('menu').waitFor();
  await expectAccessible(page, /^Analysis A1/);
  await page.keyboard.press('Escape');
  await expectAccessibleDialog(page, 'Use in a report');
});

test('bench of cases and controls', async ({ page }) => {
  const study = await openStudy(page, 'screenUse');
  await study.goTo('Analyses');
  await page.getByRole('link', { name: /^New spectacles by/ }).click();
  await page
    .getByRole('table', { name: /^Every level against/ })
    .first()
    .waitFor();
  await expectAccessible(page, /^Analysis A1/);
});

test('reports, and a report', async ({ page }) => {
  test.setTimeout(240_000);
  const study = await openStudy(page, 'wetWork');
  await study.goTo('Report');
  await expectAccessible(page, 'Reports');
  const report = await openReport(page, 'wetWork');
  await report.printed();
  await expectAccessible(page, 'Twelve-month results');
});

test('a report in hand: editors, menus and dialogs', async ({ page }) => {
  test.setTimeout(300_000);
  const report = await openReport(page, 'wetWork');
  await report.openWords(report.block('Prose', 0));
  await expectAccessible(page, 'Twelve-month results');
  await page.getByRole('button', { name: 'Insert value' }).click();
  await page.getByRole('dialog', { name: 'Which value?' }).getByRole('list').waitFor();
  await expectAccessible(page);
  await page.keyboard.press('Escape');
  await expect(page.getByRole('dialog')).toHaveCount(0);
  await report.leaveBlock();

  for (const name of ['Table 1', 'Figure 1', 'Effect sentence', 'Heading']) {
    await report.takeInHand(report.block(name, 0));
    await page.keyboard.press('Enter');
    await page.getByRole('combobox').or(report.words).first().waitFor();
    await expectAccessible(page, 'Twelve-month results');
    await report.leaveBlock();
  }
  await report.takeInHand(report.block('Effect sentence', 0));
  await page.keyboard.press('x');
  await page.getByRole('dialog').waitFor();
  await expectAccessible(page);
  await page.keyboard.press('Escape');
  await page.getByRole('banner').getByRole('button', { name: 'Download' }).click();
  await page.getByRole('menu').waitFor();
  await expectAccessible(page);
});

test('account and help', async ({ page }) => {
  await page.goto('/account');
  await expectAccessible(page, /account/i);
  await page.goto('/help');
  await expectAccessible(page, /Begin here/);
  await page.goto('/nothing/here');
  await expectAccessible(page);
});

test.describe('a reader', () => {
  test.use({ signedIn: demonstrator('reader') });

  test('reads a report and its code book', async ({ page }) => {
    const report = await openReport(page, 'reminderLetters');
    await report.printed();
    await expectAccessible(page, 'Main outcome');
  });
});

test.describe('an administrator', () => {
  test.use({ signedIn: demonstrator('administrator') });

  test('administration, with its dialog', async ({ page }) => {
    await page.goto('/administration');
    await page.getByRole('table').waitFor();
    await expectAccessible(page, 'Administration');
    await expectAccessibleDialog(page, 'Invite somebody');
  });
});

/** Opens a dialog by its button, looks at it, and leaves it. */
async function expectAccessibleDialog(page: Page, button: string): Promise<void> {
  await page.setViewportSize({ width: WIDTHS[0], height: 900 });
  await page.getByRole('button', { name: button }).first().click();
  await page.getByRole('dialog').or(page.getByRole('alertdialog')).waitFor();
  await expectAccessible(page);
  await page.keyboard.press('Escape');
  await expect(page.getByRole('dialog')).toHaveCount(0);
}

/** Holds the page as it stands to the standard: both themes, wide and narrow. */
async function expectAccessible(page: Page, heading?: string | RegExp): Promise<void> {
  if (heading !== undefined) {
    await page.getByRole('heading', { level: 1, name: heading }).waitFor();
  }
  for (const width of WIDTHS) {
    await page.setViewportSize({ width, height: 900 });
    for (const colorScheme of THEMES) {
      await page.emulateMedia({ colorScheme, reducedMotion: 'reduce' });
      expect(await violations(page), `${width} wide, ${colorScheme}`).toEqual([]);
    }
  }
  await page.setViewportSize({ width: WIDTHS[0], height: 900 });
  await page.emulateMedia({ colorScheme: 'light', reducedMotion: null });
}

async function violations(page: Page): Promise<readonly string[]> {
  const found = await new AxeBuilder({ page }).withTags(STANDARD).analyze();
  return found.violations.flatMap(({ id, nodes }) =>
    nodes.map(
      ({ target, failureSummary }) => `${id}: ${target.join(' ')}. ${failureSummary ?? ''}`,
    ),
  );
}
