import { describe, expect, it } from 'vitest';
import { checkOutsideEstimate, OUTSIDE_FINDINGS } from '#shared/outside-estimates';
import type { OutsideEstimateEntry } from '#shared/outside-estimates';
import { outsideFindingWords } from '#shared/wording';
import { HOUSE_STYLE_IDS, houseStyle, phrasebook } from '../builders/house-styles';
import { wardResult, wetWorkResult } from '../builders/results';

const BOOK = phrasebook();
const RESULT = wardResult();

const ENTRY: OutsideEstimateEntry = {
  levelId: 'over6',
  referenceLevelId: 'none',
  measure: 'oddsRatio',
  value: '5.39',
  lower: '2.64',
  upper: '11.00',
  level: 0.95,
  pValue: '<0.001',
  method: 'logistic regression',
  covariates: ['age'],
  numberAnalysed: 801,
  source: 'Statistics group',
  computedOn: null,
  note: null,
};

/** A change of the entry, and what is said of it. */
const SAID: readonly (readonly [string, Partial<OutsideEstimateEntry>, string])[] = [
  [
    'numberNotReadable',
    { value: '5,39' },
    '“5,39” cannot be read as a number. Write digits with a decimal point, as in 1.50.',
  ],
  [
    'pValueNotReadable',
    { pValue: 'significant' },
    '“significant” cannot be read as a p-value. Write it as in 0.03 or <0.001.',
  ],
  ['ratioNotPositive', { lower: '-2.64' }, 'A ratio and its limits must lie above 0.'],
  [
    'limitsReversed',
    { lower: '11.00', upper: '2.64' },
    'The lower limit, 11.00, lies above the upper limit, 2.64.',
  ],
  [
    'limitsWithoutValue',
    { value: '2.39' },
    'The limits 2.64 and 11.00 do not hold the estimate 2.39.',
  ],
  [
    'notSymmetric',
    { value: '5.93' },
    'The estimate does not stand in the middle of its limits, which on its scale is 5.39; rounding cannot explain it. Check the digits. Exact and profile-likelihood limits may be uneven.',
  ],
  [
    'pDisagrees',
    { pValue: '0.04' },
    'The limits stand for a p-value below 0.001, and 0.04 was entered. Check the digits. A likelihood-ratio or an exact test may differ a little.',
  ],
  [
    'pDisagrees',
    { value: '1.5', lower: '1.0', upper: '2.2', pValue: '0.4' },
    'The limits stand for a p-value between 0.017 and 0.091, and 0.4 was entered. Check the digits. A likelihood-ratio or an exact test may differ a little.',
  ],
  [
    'referenceChanged',
    { referenceLevelId: 'under2' },
    'It compares with Under 2 h, which is not the reference of this analysis now. No report shows it until it is entered against the present reference.',
  ],
  [
    'levelGone',
    { levelId: 'over9' },
    'This analysis does not compare its level. No report shows it until another level is picked.',
  ],
  [
    'otherSide',
    { value: '0.50', lower: '0.20', upper: '1.25', pValue: null },
    '0.50 points the other way than the crude estimate, 5.39. Where both are shown, say what the adjustment changed.',
  ],
  [
    'otherNumber',
    { numberAnalysed: 790 },
    'The model analysed 790, the counts here hold 801. Say who is missing or added.',
  ],
  [
    'otherLevel',
    { level: 0.9, pValue: null },
    'Its limits are at 90%, those of the analysis at 95%.',
  ],
];

describe('findings about estimates from elsewhere', () => {
  it.each(SAID)('%s of %j', (id, change, words) => {
    const found = checkOutsideEstimate({ ...ENTRY, ...change }, RESULT);
    const finding = found.find((one) => one.id === id);
    expect(finding && outsideFindingWords(finding, houseStyle(), BOOK)).toBe(words);
  });

  it('are none where all agrees', () => {
    expect(checkOutsideEstimate(ENTRY, RESULT)).toEqual([]);
  });

  it('each have words in every style', () => {
    const sampled = wetWorkResult({ design: 'caseControl' });
    const noRisk = checkOutsideEstimate({ ...ENTRY, measure: 'riskRatio' }, sampled);
    const found = [
      ...noRisk,
      ...SAID.flatMap(([, change]) => checkOutsideEstimate({ ...ENTRY, ...change }, RESULT)),
    ];
    expect(new Set(found.map(({ id }) => id))).toEqual(new Set(Object.keys(OUTSIDE_FINDINGS)));
    for (const style of HOUSE_STYLE_IDS.map((id) => houseStyle(id))) {
      for (const finding of found) {
        const words = outsideFindingWords(finding, style, BOOK);
        expect(words).toMatch(/^[“A-Z0-9].*\.$/);
        expect(words).not.toMatch(/undefined|NaN|\{|\}/);
      }
    }
  });
});
