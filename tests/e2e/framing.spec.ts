import { demonstrator, openReport } from './demonstration';
import type { Framing, ReportPage } from './pages/report-page';
import { expectSameDocument, expectSameWorkbook } from './readers/agreement';
import { readDocx } from './readers/docx';
import { numbersIn } from './readers/numbers';
import { readXlsx } from './readers/xlsx';
import { expect, test } from './test';

test.use({ startingData: 'demonstration', signedIn: demonstrator('lead') });

test('toggling the rail turns words, units and limits on screen and in the next files', async ({
  page,
}) => {
  test.setTimeout(240_000);
  const report = await openReport(page, 'wetWork');
  const said = {
    Absolute: await sentencesUnder(report, 'Absolute'),
    Relative: await sentencesUnder(report, 'Relative'),
    Both: await sentencesUnder(report, 'Both'),
  };
  expect(said.Absolute.length).toBeGreaterThan(3);
  for (const [place, absolute] of said.Absolute.entries()) {
    const relative = said.Relative[place]!;
    const both = said.Both[place]!;
    if (absolute.includes('no clear evidence')) expectUnclear(absolute, relative);
    else expectClear(absolute, relative, both);
    expect(risksIn(absolute)).not.toHaveLength(0);
    expect(risksIn(relative)).toEqual(risksIn(absolute));
    expect(risksIn(both)).toEqual(risksIn(absolute));
  }
});

/** Verb, unit and limits of what leads; the other framing follows where both are said. */
function expectClear(absolute: string, relative: string, both: string): void {
  expect(leadOf(absolute)).toMatch(/percentage points (?:higher|lower)$/);
  expect(leadOf(relative)).toMatch(/times as high$|% (?:higher|lower)$/);
  expect(leadOf(both)).toBe(leadOf(absolute));
  expect(both).toMatch(/that is, .*(?:times as high|% (?:higher|lower))/);
  expect(firstLimits(absolute)).not.toEqual(firstLimits(relative));
  expect(firstLimits(both)).toEqual(firstLimits(absolute));
}

/** Limits on both sides of no difference, each with its own direction. */
function expectUnclear(absolute: string, relative: string): void {
  expect(absolute).toMatch(
    /was \S+ percentage points higher,.* from \S+ percentage points lower to \S+ higher/,
  );
  expect(relative).toMatch(/was \d+% higher \(risk ratio \S+\),.* from \d+% lower to /);
}

test('a sentence may differ from the report, and follows it again', async ({ page }) => {
  const report = await openReport(page, 'wetWork');
  await report.say('Absolute');
  const before = await sentencesOf(report);
  const block = report.block('Effect sentence', 0);
  await report.takeInHand(block);
  const balance = block.getByRole('group', { name: 'This sentence says' });
  await balance.getByText('Relative').first().click();
  await expect(
    block.getByText('This sentence says relative; the report says absolute.'),
  ).toBeVisible();
  const differing = await sentencesOf(report);
  expect(differing[0]).not.toBe(before[0]);
  expect(differing.slice(1)).toEqual(before.slice(1));
  await expect(page.getByRole('banner').getByText('1 block differs')).toBeVisible();

  await page.getByRole('banner').getByRole('button', { name: 'Follow the report' }).click();
  await expect(page.getByRole('banner').getByText('1 block differs')).toHaveCount(0);
  expect(await sentencesOf(report)).toEqual(before);
});

/** Sets the framing, and holds both files to what the page then says. */
async function sentencesUnder(report: ReportPage, framing: Framing): Promise<readonly string[]> {
  await report.say(framing);
  await report.untilSaved();
  const printed = await report.printed();
  expectSameDocument(printed, readDocx(await report.download('DOCX')));
  expectSameWorkbook(printed, readXlsx(await report.download('XLSX')));
  return sentencesOf(report);
}

async function sentencesOf(report: ReportPage): Promise<readonly string[]> {
  const printed = await report.printed();
  return printed
    .filter(({ name }) => name === 'Effect sentence')
    .map(({ paragraphs }) => paragraphs.join(' '));
}

/** The part that says the effect first: up to its interval. */
function leadOf(sentence: string): string {
  return sentence.slice(0, sentence.search(/ \((?:risk ratio|95)/));
}

/** The limits of the effect that leads. */
function firstLimits(sentence: string): readonly string[] {
  const [interval = ''] = /(?<=CI\]? )\S+ to [^\s)]+/.exec(sentence) ?? [];
  expect(interval, sentence).not.toBe('');
  return numbersIn(interval);
}

/** What is said of each group: "84 of 620, 13.5%". */
function risksIn(sentence: string): readonly string[] {
  return sentence.match(/\d+ of \d+,? \(?\d+(?:\.\d+)?%/g) ?? [];
}
