import { fromFileToReport, type Journey } from '../journey';
import type { CodeBookEditor } from '../pages/code-book-editor';
import { asRatios, referenceOf } from '../reference';
import { expect, test } from '../test';
import { type CheckedExports, checkedExports, expectSaid, expectValues } from './checked-exports';

/**
 * Oesophageal cancer by alcohol: 200 cases and 775 controls, so that only odds can be compared. By
 * alphabet the levels stand in a wrong order. Source: Breslow and Day 1980, Statistical Methods in
 * Cancer Research I, as in R since 4.0.4.
 */
const BY_LEVEL = 'alcgp x case/control, reference 0-39g/day';
const BY_AGE = 'alcohol >=80 g/day v <80 x case/control by agegp';
const LEVELS = ['0-39g/day', '40-79', '80-119', '120+'];

/** Cases and controls at each level. Source: the table of the reference values. */
const COUNTS = [
  [29, 386],
  [75, 280],
  [51, 87],
  [45, 22],
] as const;
const ODDS_RATIOS = COUNTS.slice(1).map(
  ([cases, controls]) => cases / controls / (COUNTS[0][0] / COUNTS[0][1]),
);
const LIMITS = [0, 1, 2].map((place) => referenceOf(BY_LEVEL, 'oddsRatio.woolf', place));

const CANCER: Omit<Journey, 'file' | 'layout'> = {
  study: { title: 'Oesophageal cancer', design: 'Case–control', people: 'men' },
  outcome: {
    noun: 'oesophageal cancer',
    verbPhrase: 'had oesophageal cancer',
    event: 'Harmful',
  },
  describe: async (codeBook) => {
    await nameAlcohol(codeBook);
    await codeBook.order(LEVELS);
    expect(await codeBook.levelsInFile()).toEqual(LEVELS);
  },
  contrast: {
    outcome: 'oesophageal cancer',
    outcomeColumn: 'status',
    event: 'case',
    exposure: 'Alcohol',
    reference: '0-39g/day',
  },
  onBench: async (bench) => {
    const rows = await bench.rowsOf('estimates');
    expect(rows.map(([label]) => label)).toEqual(['Against 0-39g/day', ...LEVELS.slice(1)]);
  },
  report: 'Cancer by alcohol',
};

test('rows: levels in their true order, and odds only', async ({ page }) => {
  test.setTimeout(300_000);
  const report = await fromFileToReport(page, {
    ...CANCER,
    file: 'esoph_rows.csv',
    layout: 'A record a row',
  });
  await report.untilSaved();
  const exports = await checkedExports(report);
  expectReferenceOdds(exports);
  expectOddsOnly(exports);
});

test('cases and controls in two columns: the same numbers', async ({ page }) => {
  test.setTimeout(300_000);
  const report = await fromFileToReport(page, {
    ...CANCER,
    file: 'esoph_wide_cases_controls.csv',
    layout: 'Cases and controls',
    contrast: { outcome: 'oesophageal cancer', exposure: 'Alcohol', reference: '0-39g/day' },
  });
  await report.untilSaved();
  const exports = await checkedExports(report);
  expectReferenceOdds(exports);
  expectOddsOnly(exports);
});

test('a count column: merged levels, pooled over age', async ({ page }) => {
  test.setTimeout(300_000);
  const report = await fromFileToReport(page, {
    ...CANCER,
    file: 'esoph_aggregated.csv',
    layout: 'One count column',
    describe: async (codeBook) => {
      await nameAlcohol(codeBook);
      await codeBook.merge('80-119', '120+');
      await codeBook.merge('0-39g/day', '40-79');
      await codeBook.nameLevels('Under 80 g/day', '80 g/day and more');
      await codeBook.show('agegp');
      await codeBook.word({ table: 'Age', sentence: 'age' });
    },
    contrast: { ...CANCER.contrast, reference: 'Under 80 g/day', strata: ['Age'] },
    onBench: undefined,
  });
  await report.untilSaved();
  const exports = await checkedExports(report);
  const ratio = referenceOf(BY_AGE, 'pooledOddsRatio.value');
  const limits = referenceOf(BY_AGE, 'pooledOddsRatio.limits');
  expectSaid(exports.printed[2]!.paragraphs.join(' '), asRatios(...ratio, ...limits));
  expectValues(exports, ratio, limits);
  expectOddsOnly(exports);
});

async function nameAlcohol(codeBook: CodeBookEditor): Promise<void> {
  await codeBook.show('alcgp');
  await codeBook.word({ table: 'Alcohol', sentence: 'alcohol' });
  await codeBook.setKind('Ordered category');
  await codeBook.setPatterns('{people} drinking {level}');
}

/** Odds ratios against the lowest level, in the order of the levels, on page and in files. */
function expectReferenceOdds(exports: CheckedExports): void {
  const { rows } = exports.printed[0]!.tables[0]!;
  const labels = rows.map(([label = '']) => label).filter((label) => LEVELS.includes(label));
  expect(labels).toEqual(LEVELS);
  for (const [place, level] of LEVELS.slice(1).entries()) {
    const row = rows.find(([label]) => label === level)!;
    expectSaid(row.slice(1).join(' '), asRatios(ODDS_RATIOS[place]!, ...LIMITS[place]!));
  }
  expectValues(exports, ODDS_RATIOS, ...LIMITS);
}

/** The usual caution under whiskers is no statement about a difference of risks. */
const OVERLAP = 'whether they overlap is no test of a difference';

/** Sampling fixed how many cases there are: nothing but odds may be said of them. */
function expectOddsOnly({ document, workbook }: CheckedExports): void {
  const sheets = [...workbook].filter(([name]) => /^(?:Table|Figure)/.test(name));
  const cells = sheets.flatMap(([, rows]) => rows.flat().map(({ shown }) => shown));
  for (const text of [
    document.text,
    ...document.pictures.map(({ altText }) => altText),
    ...cells,
  ]) {
    expect(text.replaceAll(OVERLAP, '')).not.toMatch(
      /\brisks?\b|prevalence|percentage point|difference/i,
    );
  }
  expect(document.text).toMatch(/odds ratio/i);
}
