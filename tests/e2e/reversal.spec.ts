import { demonstrator, openReport } from './demonstration';
import type { Framing, ReportPage } from './pages/report-page';
import { expectSameDocument, expectSameWorkbook } from './readers/agreement';
import { readDocx } from './readers/docx';
import { numbersIn } from './readers/numbers';
import type { PrintedBlock } from './readers/proof';
import { readXlsx } from './readers/xlsx';
import { expect, test } from './test';

test.use({ startingData: 'demonstration', signedIn: demonstrator('lead') });

test('reversing turns table, figure and sentence together, and the files', async ({ page }) => {
  test.setTimeout(240_000);
  const report = await openReport(page, 'reminderLetters');
  const before = await agreed(report);
  await report.reverse(report.block('Effect sentence'), 'The letter is what is usual by now.');
  await expect(report.block('Effect sentence')).toContainText(/lower/);
  await report.untilSaved();
  const after = await agreed(report);

  expect(sentenceOf(before)).toMatch(/higher/);
  expect(sentenceOf(after)).toMatch(/lower/);
  expect(groupsIn(sentenceOf(after))).toEqual(groupsIn(sentenceOf(before)).toReversed());

  const [one, other] = [effectsOf(before), effectsOf(after)];
  expect(one.length).toBeGreaterThan(3);
  expect(other.map(({ difference }) => difference.map(Number))).toEqual(
    one.map(({ difference: [value, lower, upper] }) =>
      [value, upper, lower].map((number) => 0 - Number(number)),
    ),
  );
  for (const [place, { ratio }] of other.entries()) {
    expect(1 / Number(ratio[0])).toBeCloseTo(Number(one[place]!.ratio[0]), 1);
    expect(1 / Number(ratio[1])).toBeCloseTo(Number(one[place]!.ratio[2]), 1);
  }
  expect(referenceRows(after)).not.toEqual(referenceRows(before));
  expect(figureReference(before)).toMatch(/the usual invitation/);
  expect(figureReference(after)).toMatch(/a reminder letter/);

  const difference = other.at(-1)!.difference[0]!;
  const [absolute, relative] = [
    sentenceOf(await under(report, 'Absolute')),
    sentenceOf(await under(report, 'Relative')),
  ];
  expect(difference).toMatch(/^-/);
  expect(absolute).toContain(`${difference.slice(1)} percentage points lower`);
  expect(relative).toMatch(/\d% lower \(/);
  expect(numbersIn(relative.slice(relative.indexOf('difference was')))).toContain(difference);
});

async function under(report: ReportPage, framing: Framing): Promise<readonly PrintedBlock[]> {
  await report.say(framing);
  await report.untilSaved();
  return agreed(report);
}

/** What the page prints, once both files have been held to it. */
async function agreed(report: ReportPage): Promise<readonly PrintedBlock[]> {
  const printed = await report.printed();
  expectSameDocument(printed, readDocx(await report.download('DOCX')));
  expectSameWorkbook(printed, readXlsx(await report.download('XLSX')));
  return printed;
}

function blockNamed(blocks: readonly PrintedBlock[], name: string): PrintedBlock {
  return blocks.find((block) => block.name === name)!;
}

function sentenceOf(blocks: readonly PrintedBlock[]): string {
  return blockNamed(blocks, 'Effect sentence').paragraphs.join(' ');
}

/** The two groups, in the order in which the sentence names them. */
function groupsIn(sentence: string): readonly string[] {
  return sentence.match(/the usual invitation|a reminder letter/g) ?? [];
}

interface Effect {
  readonly difference: readonly string[];
  readonly ratio: readonly string[];
}

/** The rows of the table that hold effects: a difference and a ratio, each with its limits. */
function effectsOf(blocks: readonly PrintedBlock[]): readonly Effect[] {
  const { rows } = blockNamed(blocks, 'Table 1').tables[0]!;
  return rows.flatMap((cells) => {
    const [difference = [], ratio = []] = cells
      .slice(-2)
      .map((cell) => numbersIn(cell.replace(/ to /, ' ')));
    return difference.length === 3 && ratio.length === 3 ? [{ difference, ratio }] : [];
  });
}

/** Rows whose effect cells say that they are what the others are held against. */
function referenceRows(blocks: readonly PrintedBlock[]): readonly string[] {
  const { rows } = blockNamed(blocks, 'Table 1').tables[0]!;
  return rows
    .filter((cells) => cells.some((cell) => /\bref(?:erence)?\b/i.test(cell)))
    .map(([label]) => label!);
}

/** The figure's note on the group that the others are held against. */
function figureReference(blocks: readonly PrintedBlock[]): string {
  const { notes } = blockNamed(blocks, 'Figure 1').figures[0]!;
  return notes.find((words) => words.includes('reference group')) ?? notes.join(' ');
}
