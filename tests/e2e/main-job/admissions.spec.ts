import { fromFileToReport, type Journey } from '../journey';
import { numbersIn } from '../readers/numbers';
import { asRatios, inPoints, referenceOf } from '../reference';
import { expect, test } from '../test';
import { checkedExports, expectSaid, expectValues } from './checked-exports';

/**
 * Applications to six departments of a university. Over all of them men are admitted more often;
 * within departments they are not. Source: Bickel, Hammel and O'Connell 1975, Science 187:398-404.
 */
const CRUDE = 'Gender (Male=exposed, Female=reference) x Admit (Admitted=event)';
const POOLED = 'Gender x Admit by Dept';

const crude = {
  difference: referenceOf(CRUDE, 'riskDifference.value'),
  limits: referenceOf(CRUDE, 'riskDifference.newcombe'),
  ratio: [1198 / 2691 / (557 / 1835)],
  ratioLimits: referenceOf(CRUDE, 'riskRatio.katz'),
};
const pooled = {
  difference: referenceOf(POOLED, 'pooledRiskDifference.value'),
  limits: referenceOf(POOLED, 'pooledRiskDifference.satoLimits'),
  ratio: referenceOf(POOLED, 'pooledRiskRatio.value'),
  ratioLimits: referenceOf(POOLED, 'pooledRiskRatio.limits'),
};

const OF_WOMEN = `${inPoints([557 / 1835])[0]!}%`;

const ADMISSIONS: Omit<Journey, 'file' | 'layout'> = {
  study: { title: 'Graduate admissions', design: 'Cross-sectional', people: 'applicants' },
  outcome: { noun: 'admission', verbPhrase: 'were admitted', event: 'Beneficial' },
  describe: async (codeBook) => {
    await codeBook.show('Dept');
    await codeBook.word({ table: 'Department', sentence: 'department' });
    await codeBook.show('Gender');
    await codeBook.setPatterns('{level} {people}');
    await codeBook.wordLevel('Male', 'Men', 'male');
    await codeBook.wordLevel('Female', 'Women', 'female');
  },
  contrast: {
    outcome: 'admission',
    outcomeColumn: 'Admit',
    event: 'Admitted',
    exposure: 'Gender',
    reference: 'Women',
    strata: ['Department'],
  },
  onBench: async (bench) => {
    const guard = bench.guard('Crude and pooled point opposite ways');
    await expect(guard).toBeVisible();
    expect(numbersIn(await guard.innerText())).toEqual(['+14.2', '-1.8']);
  },
  report: 'Admission by gender',
};

test('the numbers that the guard states are the reference values', () => {
  expect(inPoints(crude.difference)).toEqual(['14.2']);
  expect(inPoints(pooled.difference)).toEqual(['1.8']);
  expect([Math.sign(crude.difference[0]!), Math.sign(pooled.difference[0]!)]).toEqual([1, -1]);
});

for (const [file, layout] of [
  ['UCBAdmissions_rows.csv', 'A record a row'],
  ['UCBAdmissions_aggregated.csv', 'One count column'],
] as const) {
  test(`${file}: from the file to DOCX and XLSX`, async ({ page }) => {
    test.setTimeout(300_000);
    const report = await fromFileToReport(page, { ...ADMISSIONS, file, layout });
    await report.addSentence('Effect sentence', 'All applicants, crude');
    await report.addWords('Effect sentence', 'Of the women, ', 'prevalence women', OF_WOMEN);
    await report.untilSaved();
    await expect(report.check('Crude and pooled point opposite ways').first()).toContainText(
      '+14.2',
    );

    const exports = await checkedExports(report);
    const words = exports.printed.map(({ paragraphs }) => paragraphs.join(' '));
    const [sentence = '', prose = '', crudeSentence = ''] = words.slice(2);
    expectSaid(
      sentence,
      inPoints([...pooled.difference, ...pooled.limits]),
      asRatios(...pooled.ratio, ...pooled.ratioLimits),
    );
    expectSaid(
      crudeSentence,
      inPoints([...crude.difference, ...crude.limits]),
      asRatios(...crude.ratio, ...crude.ratioLimits),
    );
    expect(prose).toBe(`Of the women, ${OF_WOMEN} is bound.`);
    expectValues(exports, ...Object.values(crude), ...Object.values(pooled));
  });
}
