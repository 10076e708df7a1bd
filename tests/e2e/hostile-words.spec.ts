import { mkdtemp, rm, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { BenchPage } from './pages/bench-page';
import { DeskPage } from './pages/desk-page';
import { NewCutPage } from './pages/new-cut-page';
import { ReportPage } from './pages/report-page';
import { StudyPage } from './pages/study-page';
import { expectSameDocument, expectSameWorkbook } from './readers/agreement';
import { readDocx } from './readers/docx';
import { readXlsx } from './readers/xlsx';
import { expect, test } from './test';

/** Words that would do harm wherever they were taken for more than words. */
const MARKUP = '<img src=x onerror=window.harmed=1>';
const SCRIPT = '</script><script>window.harmed=1</script>';
const FORMULA = '=HYPERLINK("http://example.org";"a")';
const FIELD = '{ DATE } @SUM(1+1)';

test('hostile titles, columns and levels stay words, on page and in files', async ({ page }) => {
  test.setTimeout(240_000);
  const folder = await mkdtemp(join(tmpdir(), 'evenhand-files-'));
  const file = join(folder, "it's =1+1 & more.csv");
  await writeFile(file, hostileFile());

  await new DeskPage(page).open();
  await new DeskPage(page).beginStudy({ title: MARKUP, design: 'Cohort', people: SCRIPT });
  const study = new StudyPage(page);
  await study.wordOutcome({ noun: FIELD, verbPhrase: `had ${MARKUP}`, event: 'Harmful' });
  await study.goTo('Data');
  const cut = new NewCutPage(page);
  await cut.open();
  await cut.upload(file);
  await expect(cut.read).toBeVisible();
  await cut.make({ name: SCRIPT, date: '2026-03-31' });
  await cut.startAnalysis();

  const bench = new BenchPage(page);
  await bench.pick({
    outcome: FIELD,
    outcomeColumn: 'ill',
    event: 'yes',
    exposure: SCRIPT,
    reference: MARKUP,
  });
  await bench.save(MARKUP);
  await bench.beginReport(SCRIPT);
  const report = new ReportPage(page);
  await expect(report.block('Table 1')).toContainText(MARKUP);
  await expect(report.block('Table 1')).toContainText(FORMULA);

  const printed = await report.printed();
  expect(printed[1]!.figures[0]!.texts.join(' ')).toContain('onerror');
  expectSameDocument(printed, readDocx(await report.download('DOCX')));
  const workbook = readXlsx(await report.download('XLSX'));
  expectSameWorkbook(printed, workbook);
  const words = [...workbook.values()].flat(2).map(({ shown }) => shown);
  expect(words.some((text) => text.includes(FORMULA))).toBe(true);

  for (const section of ['Study', 'Data', 'Code book', 'Analyses', 'Report', 'Desk'] as const) {
    await study.goTo(section);
    await expect(page.getByRole('heading', { level: 1 })).toBeVisible();
    await expect(
      page
        .getByRole('main')
        .getByText(MARKUP.slice(0, 12))
        .or(page.getByRole('main').getByText('</script>'))
        .first(),
    ).toBeVisible();
  }
  expect(await page.evaluate(() => 'harmed' in window)).toBe(false);
  await rm(folder, { recursive: true, force: true });
});

function hostileFile(): string {
  const quoted = (text: string): string => `"${text.replaceAll('"', '""')}"`;
  const rows = [MARKUP, FORMULA].flatMap((level, place) =>
    Array.from({ length: 40 }, (_, row) => [level, row % (place + 3) === 0 ? 'yes' : 'no']),
  );
  return [[SCRIPT, 'ill'], ...rows].map((cells) => cells.map(quoted).join(',')).join('\n');
}
