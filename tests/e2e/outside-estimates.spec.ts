import { demonstrator, openReport, openStudy } from './demonstration';
import { readDocx } from './readers/docx';
import { expect, test } from './test';

test.use({ startingData: 'demonstration', signedIn: demonstrator('analyst') });

const CSV = [
  'Level,Measure,Estimate,Lower,Upper,P,Method,Covariates,N,Source',
  '6 h or more,hazard ratio,2.10,1.40,3.15,<0.001,Cox regression,age; sex,1180,Statistics group',
].join('\r\n');

test('an adjusted estimate from elsewhere is checked, listed, printed and exported', async ({
  page,
}) => {
  test.setTimeout(240_000);
  const study = await openStudy(page, 'wetWork');
  await study.goTo('Analyses');
  await page.getByRole('main').getByRole('link').first().click();
  const panel = page.locator('eh-outside-panel');
  await panel.getByRole('button', { name: 'Enter an estimate' }).click();
  const dialog = page.getByRole('dialog');
  const fill = (label: string, text: string) => dialog.getByLabel(label).fill(text);
  await dialog.getByLabel('Level, against').selectOption({ label: '6 h or more' });
  await dialog.getByLabel('Measure').selectOption({ label: 'odds ratio' });
  await fill('Lower limit', '1.42');
  await fill('Upper limit', '3.31');
  await dialog.getByRole('textbox', { name: /^Estimate/ }).fill('4.17');
  await expect(dialog.getByText('do not hold the estimate 4.17')).toBeVisible();
  await dialog.getByRole('textbox', { name: /^Estimate/ }).fill('2.17');
  await expect(dialog.getByText('do not hold')).toHaveCount(0);
  await fill('p-value', '0.5');
  await expect(dialog.getByText(/The limits stand for a p-value/)).toBeVisible();
  await fill('p-value', '<0.001');
  await expect(dialog.getByText(/The limits stand for a p-value/)).toHaveCount(0);
  await fill('Model', 'logistic regression');
  await fill('Adjusted for', 'age; sex');
  await fill('N analysed', '1,180');
  await fill('Computed by', 'Statistics group, main model');
  await dialog.getByRole('button', { name: 'Keep the estimate' }).click();
  const row = panel.getByRole('row').filter({ hasText: '2.17' });
  await expect(row).toContainText('odds ratio');
  await expect(row).toContainText('1.42 to 3.31');

  await panel.getByRole('button', { name: 'Load a CSV file' }).click();
  const bytes = (text: string) => ({
    name: 'cox.csv',
    mimeType: 'text/csv',
    buffer: Buffer.from(text),
  });
  await page.getByLabel('CSV file').setInputFiles(bytes(CSV));
  const loaded = panel.getByRole('row').filter({ hasText: 'hazard ratio' });
  await expect(loaded).toContainText('2.10');
  await loaded.getByRole('button', { name: /^Remove/ }).click();
  await expect(loaded).toHaveCount(0);
  await page.getByRole('button', { name: 'Undo', exact: true }).click();
  await expect(loaded).toContainText('2.10');

  const report = await openReport(page, 'wetWork');
  const table = report.block('Table 1');
  await report.takeInHand(table);
  await page.keyboard.press('Enter');
  await page.getByLabel('Adjusted, computed elsewhere').check();
  await report.leaveBlock();
  await expect(table).toContainText('Adjusted, computed elsewhere');
  await expect(table).toContainText('2.17');
  await expect(table).toContainText('Logistic regression, adjusted for age and sex');
  await report.untilSaved();
  const { parts, text } = readDocx(await report.download('DOCX'));
  const cells = parts.flatMap((part) => (part.kind === 'table' ? part.rows.flat() : []));
  expect(cells.some((cell) => cell.startsWith('2.17'))).toBe(true);
  expect(cells).toContain('Adjusted, computed elsewhere');
  expect(text).toContain('Source: Statistics group, main model');
});
