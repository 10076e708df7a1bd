import { fromFileToReport, type Journey } from '../journey';
import { asRatios, inPoints, referenceOf } from '../reference';
import { expect, test } from '../test';
import { checkedExports, expectSaid, expectValues } from './checked-exports';

/**
 * People on board a ship, by class and age. The crew had no children, so that it cannot compare
 * them with adults. Source: Dawson 1995, Journal of Statistics Education 3(3).
 */
const CRUDE = 'Age (Child=exposed, Adult=reference) x Survived (Yes=event)';
const POOLED = 'Age (Child exposed) x Survived (Yes) by Class (Crew has no children)';

const crude = {
  difference: referenceOf(CRUDE, 'riskDifference.value'),
  limits: referenceOf(CRUDE, 'riskDifference.newcombe'),
  ratio: [57 / 109 / (654 / 2092)],
  ratioLimits: referenceOf(CRUDE, 'riskRatio.katz'),
};
const pooled = {
  difference: referenceOf(POOLED, 'pooledRiskDifference.value'),
  limits: referenceOf(POOLED, 'pooledRiskDifference.satoLimits'),
  ratio: referenceOf(POOLED, 'pooledRiskRatio.value'),
  ratioLimits: referenceOf(POOLED, 'pooledRiskRatio.limits'),
};

const SURVIVAL: Omit<Journey, 'file' | 'layout'> = {
  study: { title: 'Survival of a shipwreck', design: 'Cohort', people: 'people' },
  outcome: { noun: 'survival', verbPhrase: 'survived', event: 'Beneficial' },
  describe: async (codeBook) => {
    await codeBook.show('Age');
    await codeBook.setPatterns('{level}');
    await codeBook.wordLevel('Child', 'Children', 'children');
    await codeBook.wordLevel('Adult', 'Adults', 'adults');
    await codeBook.show('Class');
    await codeBook.setPatterns('{people} of {level}', 'in {level}');
    await codeBook.wordLevel('Crew', 'Crew', 'the crew');
  },
  contrast: {
    outcome: 'survival',
    outcomeColumn: 'Survived',
    event: 'Yes',
    exposure: 'Age',
    reference: 'Adults',
    strata: ['Class'],
  },
  onBench: async (bench) => {
    await expect(bench.pooledNote(/^Crew: there were no children/)).toBeVisible();
  },
  report: 'Survival by age',
};

for (const [file, layout] of [
  ['Titanic_rows.csv', 'A record a row'],
  ['Titanic_aggregated.csv', 'One count column'],
] as const) {
  test(`${file}: from the file to DOCX and XLSX`, async ({ page }) => {
    test.setTimeout(300_000);
    const report = await fromFileToReport(page, { ...SURVIVAL, file, layout });
    await report.addSentence('Effect sentence', 'All people, crude');
    await report.untilSaved();

    const exports = await checkedExports(report);
    const { notes } = exports.printed[0]!.tables[0]!;
    expect(notes.join(' ')).toMatch(/Crew: .*no children.* left out/);
    const words = exports.printed.map(({ paragraphs }) => paragraphs.join(' '));
    const [sentence = '', crudeSentence = ''] = words.slice(2);
    expectSaid(
      sentence,
      inPoints([...pooled.difference, ...pooled.limits], 2),
      asRatios(...pooled.ratio, ...pooled.ratioLimits),
    );
    expectSaid(
      crudeSentence,
      inPoints([...crude.difference, ...crude.limits], 2),
      asRatios(...crude.ratio, ...crude.ratioLimits),
    );
    expectValues(exports, ...Object.values(crude), ...Object.values(pooled));
  });
}
