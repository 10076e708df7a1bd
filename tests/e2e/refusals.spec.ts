import { mkdtemp, rm, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import type { Page } from '@playwright/test';
import { demonstrator, openReport, openStudy } from './demonstration';
import { BenchPage } from './pages/bench-page';
import { NewCutPage } from './pages/new-cut-page';
import type { ReportPage } from './pages/report-page';
import { expect, test } from './test';

test.use({ startingData: 'demonstration', signedIn: demonstrator('lead'), refusals: [409, 422] });

let folder: string;

test.beforeAll(async () => {
  folder = await mkdtemp(join(tmpdir(), 'evenhand-files-'));
});

test.afterAll(async () => {
  await rm(folder, { recursive: true, force: true });
});

/** Writes a file and gives its path. */
async function fileOf(name: string, content: string | Uint8Array): Promise<string> {
  const path = join(folder, name);
  await writeFile(path, content);
  return path;
}

const PNG = Uint8Array.from([0x89, 0x50, 0x4e, 0x47, 0x0d, 0x0a, 0x1a, 0x0a, 0, 0, 0, 13]);

for (const { says, name, content } of [
  { name: 'empty.csv', content: '', says: 'The file is empty.' },
  { name: 'picture.csv', content: PNG, says: /The name says .+, but the content is .+\./ },
  { name: 'words.pdf', content: 'a,b\n1,2\n', says: /Files ending in .+pdf.+ can't be read\./ },
  { name: 'book.xlsx', content: 'a,b\n1,2\n', says: /The name says .+, but the content is .+\./ },
  {
    name: 'ragged.csv',
    content: 'sex,ill\nf,yes\nm,no,perhaps\nf,no\n',
    says: /Line 3 has 3 cells, and the row of column names has 2\./,
  },
  { name: 'heads.csv', content: 'sex,ill\n', says: /column names but no row of data/ },
]) {
  test(`a file that cannot be read says why: ${name}`, async ({ page }) => {
    await startCut(page);
    const cut = new NewCutPage(page);
    await cut.upload(await fileOf(name, content));
    await expect(cut.refusal).toContainText(says);
    await cut.upload(await fileOf('good.csv', 'sex,ill\nf,yes\nm,no\nf,no\n'));
    await expect(cut.read).toBeVisible();
    await expect(cut.refusal).toHaveCount(0);
  });
}

test('a level that new data lack is told before the cut is made, and on the bench', async ({
  page,
}) => {
  const study = await openStudy(page, 'harbourSupper');
  await study.goTo('Data');
  await page.getByRole('link', { name: 'New cut' }).click();
  const cut = new NewCutPage(page);
  await cut.upload(await fileOf('guests.csv', GUESTS_WHO_ALL_ATE));
  await expect(cut.read).toBeVisible();
  await cut.goTo('Code book');
  await expect(cut.note(/no/).first()).toBeVisible();
  await expect(page.getByRole('complementary', { name: 'To settle' })).toContainText(/fish/i);
  await cut.makeNext('2026-07-01');

  await study.goTo('Analyses');
  await page.getByRole('link', { name: 'Illness by mussels' }).click();
  const bench = new BenchPage(page);
  await bench.pickOne('Data cut', 'cut 2');
  await expect(page.getByRole('main')).toContainText(
    /no (?:records|guests)|not estimable|one level/i,
  );
});

test('two people change the same words: both versions stay, and one is chosen', async ({
  page,
  openBrowser,
}) => {
  test.setTimeout(240_000);
  const lead = await openReport(page, 'wetWork');
  const other = await openBrowser(demonstrator('writer'));
  const otherPage = await other.newPage();
  const writer = await openReport(otherPage, 'wetWork');

  await rewrite(page, lead, 'The lead wrote this.');
  await startRewriting(otherPage, writer, 'The writer wrote that.');
  await lead.untilSaved();
  await writer.leaveBlock();

  const both = otherPage.getByRole('alert').filter({ hasText: 'Choose the version that stands' });
  await expect(both).toContainText('The lead wrote this.');
  await expect(both).toContainText('The writer wrote that.');
  await both.getByRole('button', { name: 'Keep mine' }).click();
  await expect(writer.block('Prose', 0)).toContainText('The writer wrote that.');
  await writer.untilSaved();

  await page.reload();
  await expect(lead.block('Prose', 0)).toContainText('The writer wrote that.');
});

async function startCut(page: Page): Promise<void> {
  const study = await openStudy(page, 'harbourSupper');
  await study.goTo('Data');
  await new NewCutPage(page).open();
}

/** Replaces all words of the first prose of the report, and leaves them open. */
async function startRewriting(page: Page, report: ReportPage, words: string): Promise<void> {
  await report.openWords(report.block('Prose', 0));
  await page.keyboard.press('ControlOrMeta+a');
  await page.keyboard.type(words);
}

async function rewrite(page: Page, report: ReportPage, words: string): Promise<void> {
  await startRewriting(page, report, words);
  await report.leaveBlock();
}

const GUESTS_WHO_ALL_ATE = [
  'guest,sitting,fish_pie,mussels,potato_salad,berry_trifle,ill_72h',
  'G901,early,yes,yes,yes,no,ill',
  'G902,early,yes,yes,no,yes,well',
  'G903,late,yes,yes,yes,yes,ill',
  'G904,late,yes,yes,no,no,well',
].join('\n');
