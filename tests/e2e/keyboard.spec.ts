import { demonstrator, openReport } from './demonstration';
import { expect, test } from './test';

test.use({ startingData: 'demonstration', signedIn: demonstrator('lead') });

test('a report is written by keys alone', async ({ page }) => {
  test.setTimeout(240_000);
  const report = await openReport(page, 'wetWork');
  const keys = page.keyboard;
  const names = async (): Promise<readonly string[]> =>
    (await report.printed()).map(({ name }) => name);
  const start = await names();

  await tabTo(/^Heading$/);
  await expect(report.block('Heading', 0)).toBeFocused();
  for (let turn = 0; turn < start.indexOf('Effect sentence'); turn += 1)
    await keys.press('ArrowDown');
  const sentence = report.block('Effect sentence', 0);
  await expect(sentence).toBeFocused();

  await keys.press('a');
  await expect(sentence).toContainText(/percentage points/);
  const absolute = await sentence.getByRole('paragraph').first().innerText();
  await keys.press('r');
  await expect(sentence.getByRole('paragraph').first()).not.toHaveText(absolute);
  await keys.press('b');
  await keys.press('a');
  await expect(sentence.getByRole('paragraph').first()).toHaveText(absolute);

  await keys.press('Alt+ArrowUp');
  await expect(sentence).toBeFocused();
  const moved = await names();
  expect(moved.indexOf('Effect sentence')).toBe(start.indexOf('Effect sentence') - 1);
  await keys.press('ControlOrMeta+z');
  expect(await names()).toEqual(start);
  await keys.press('ControlOrMeta+Shift+z');
  expect(await names()).toEqual(moved);
  await keys.press('ControlOrMeta+z');

  await keys.press('ArrowUp');
  await keys.press('ArrowUp');
  await keys.press('Enter');
  await expect(report.words).toBeFocused();
  await keys.press('ControlOrMeta+End');
  await keys.type(' Written by keys.');
  await keys.press('Escape');
  const prose = report.block('Prose', 0);
  await expect(prose).toBeFocused();
  await expect(prose).toContainText('Written by keys.');

  await keys.press('Delete');
  expect((await names()).filter((name) => name === 'Prose')).toHaveLength(
    start.filter((name) => name === 'Prose').length - 1,
  );
  await keys.press('ControlOrMeta+z');
  await expect(report.block('Prose', 0)).toContainText('Written by keys.');
  await report.untilSaved();

  /** Presses Tab until a block of this name has the focus. */
  async function tabTo(name: RegExp): Promise<void> {
    for (let turn = 0; turn < 60; turn += 1) {
      await keys.press('Tab');
      if (await page.getByRole('group', { name }).and(page.locator(':focus')).count()) return;
    }
    throw new Error('The Tab key does not lead to the blocks.');
  }
});
