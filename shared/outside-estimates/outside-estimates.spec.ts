import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { criticalValue, normalUpperTail } from '#shared/stats';
import { resultOf } from '../analysis/testing/counts-analysis';
import {
  checkNumbers,
  checkOutsideEstimate,
  crudeBeside,
  isRefused,
  readImportedRows,
  readPrintedNumber,
  readPrintedPValue,
} from './index';
import type { OutsideEstimateEntry } from './index';

const RESULT = resultOf({
  levels: ['none', 'some'],
  counts: [
    [20, 200],
    [44, 200],
  ],
});

const ENTRY: OutsideEstimateEntry = {
  levelId: 'some',
  referenceLevelId: 'none',
  measure: 'oddsRatio',
  value: '2.02',
  lower: '1.08',
  upper: '3.78',
  level: 0.95,
  pValue: '0.028',
  method: 'logistic regression',
  covariates: ['age'],
  numberAnalysed: 400,
  source: 'Statistics group',
  computedOn: '2026-05-12',
  note: null,
};

const idsOf = (change: Partial<OutsideEstimateEntry>): readonly string[] =>
  checkOutsideEstimate({ ...ENTRY, ...change }, RESULT).map(({ id }) => id);

describe('printed numbers', () => {
  it.each([
    ['1.50', 1.5, 1.495, 1.505],
    ['.85', 0.85, 0.845, 0.855],
    ['\u22124.2', -4.2, -4.25, -4.15],
    [' 12 ', 12, 11.5, 12.5],
  ])('%s', (text, value, lowest, highest) => {
    const read = readPrintedNumber(text);
    expect(read?.value).toBe(value);
    expect(read?.lowest).toBeCloseTo(lowest, 12);
    expect(read?.highest).toBeCloseTo(highest, 12);
  });

  it.each(['', '1,5', '1e3', '1.', 'NaN', '1 000', '--2', 'Infinity', '1.5%'])('not %j', (text) => {
    expect(readPrintedNumber(text)).toBeNull();
  });

  it.each([
    ['0.03', 0.025, 0.035],
    ['<0.001', 0, 0.001],
    ['p < .05', 0, 0.05],
    ['>0.99', 0.99, 1],
    ['1', 0.5, 1],
  ])('p of %s', (text, lowest, highest) => {
    const read = readPrintedPValue(text);
    expect(read?.lowest).toBeCloseTo(lowest, 12);
    expect(read?.highest).toBeCloseTo(highest, 12);
  });

  it.each(['1.2', '-0.1', '0,05', 'ns', '', '*'])('no p: %j', (text) => {
    expect(readPrintedPValue(text)).toBeNull();
  });
});

describe('the numbers of an estimate', () => {
  it('that agree give no finding', () => {
    expect(idsOf({})).toEqual([]);
  });

  /** Rounds an exact Wald estimate and its limits as a paper would, and checks the print. */
  it('rounded from an exact Wald interval never meet a caution', () => {
    const property = fc.property(
      fc.double({ min: -2, max: 2, noNaN: true }),
      fc.double({ min: 0.02, max: 1.2, noNaN: true }),
      fc.integer({ min: 1, max: 4 }),
      fc.constantFrom(0.9, 0.95, 0.99),
      fc.constantFrom('oddsRatio' as const, 'riskDifference' as const),
      (centre, error, decimals, level, measure) => {
        const printed = [
          centre,
          centre - criticalValue(level) * error,
          centre + criticalValue(level) * error,
        ]
          .map((number) => (measure === 'oddsRatio' ? Math.exp(number) : number))
          .map((number) => number.toFixed(decimals));
        const pValue = (2 * normalUpperTail(Math.abs(centre) / error)).toFixed(3);
        const [value = '', lower = '', upper = ''] = printed;
        const entry = { measure, value, lower, upper, level, pValue };
        const ids = checkNumbers(entry).map(({ id }) => id);
        expect(ids.filter((id) => id !== 'ratioNotPositive')).toEqual([]);
      },
    );
    fc.assert(property, { seed: 20251204, numRuns: 2000 });
  });

  it.each([
    ['a wrong digit of a limit', { upper: '3.87', pValue: null }, ['notSymmetric']],
    [
      'limits that were symmetric on the plain scale',
      { lower: '0.26' },
      ['notSymmetric', 'pDisagrees'],
    ],
    ['a p-value of another estimate', { pValue: '0.28' }, ['pDisagrees']],
    ['a p-value below what limits allow', { pValue: '<0.001' }, ['pDisagrees']],
    ['limits without the estimate', { value: '4.02' }, ['limitsWithoutValue']],
    ['limits in the wrong order', { lower: '3.78', upper: '1.08' }, ['limitsReversed']],
    ['a ratio that is not above 0', { lower: '-1.08' }, ['ratioNotPositive']],
    ['a decimal comma', { value: '2,02' }, ['numberNotReadable']],
    ['a p-value in words', { pValue: 'ns' }, ['pValueNotReadable']],
  ] as const)('%s', (_, change, ids) => {
    expect(idsOf(change)).toEqual(ids);
  });

  it('says where the middle of the limits lies', () => {
    const [found] = checkOutsideEstimate({ ...ENTRY, upper: '3.87' }, RESULT);
    expect(found?.facts.middle).toBeCloseTo(Math.sqrt(1.08 * 3.87), 12);
    expect(found?.severity).toBe('caution');
  });

  it('of a difference are symmetric on the plain scale', () => {
    const difference = { measure: 'riskDifference', pValue: null } as const;
    expect(idsOf({ ...difference, value: '11.9', lower: '4.6', upper: '19.2' })).toEqual([]);
    expect(idsOf({ ...difference, value: '11.9', lower: '4.6', upper: '20.2' })).toEqual([
      'notSymmetric',
    ]);
  });

  it('are refused only where they cannot be', () => {
    expect(isRefused(checkOutsideEstimate({ ...ENTRY, value: '4' }, RESULT))).toBe(true);
    expect(isRefused(checkOutsideEstimate({ ...ENTRY, pValue: '0.28' }, RESULT))).toBe(false);
  });
});

describe('an estimate beside its analysis', () => {
  it('stands beside the crude number of its measure, or of the nearest one', () => {
    expect(crudeBeside(ENTRY, RESULT)).toBeCloseTo((44 * 180) / (156 * 20), 12);
    expect(crudeBeside({ ...ENTRY, measure: 'hazardRatio' }, RESULT)).toBeCloseTo(2.2, 12);
    expect(crudeBeside({ ...ENTRY, measure: 'riskDifference' }, RESULT)).toBeCloseTo(12, 12);
    expect(crudeBeside({ ...ENTRY, levelId: null }, RESULT)).toBeNull();
  });

  it.each([
    ['another number of people', { numberAnalysed: 390 }, ['otherNumber']],
    ['no number of people', { numberAnalysed: null }, []],
    [
      'another reference',
      { levelId: 'none', referenceLevelId: 'some' },
      ['levelGone', 'referenceChanged'],
    ],
    ['a level that is gone', { levelId: 'many' }, ['levelGone']],
    ['all levels together', { levelId: null }, []],
    ['another level of confidence', { level: 0.9, pValue: null }, ['otherLevel']],
    [
      'the other side of 1',
      { value: '0.50', lower: '0.26', upper: '0.96', pValue: null },
      ['otherSide'],
    ],
  ] as const)('%s', (_, change, ids) => {
    expect(idsOf(change)).toEqual(ids);
  });

  it('of a risk ratio, where cases and controls were sampled', () => {
    const sampled = resultOf({
      design: 'caseControl',
      levels: ['none', 'some'],
      counts: [
        [20, 200],
        [44, 200],
      ],
    });
    const found = checkOutsideEstimate({ ...ENTRY, measure: 'riskRatio' }, sampled);
    expect(found.map(({ id }) => id)).toEqual(['notGivenByDesign']);
  });
});

const HEADER = [
  'Level',
  'Measure',
  'Estimate',
  'Lower',
  'Upper',
  'P',
  'Method',
  'Covariates',
  'N',
  'Source',
];
const ROW = [
  'some',
  'odds ratio',
  '2.02',
  '1.08',
  '3.78',
  '0.028',
  'logistic regression',
  'age; sex',
  '1,204',
  'R, main model',
];

describe('a file of estimates', () => {
  const read = (...rows: readonly (readonly string[])[]) =>
    readImportedRows(
      rows.map((cells, place) => ({ line: place + 1, cells })),
      RESULT,
    );
  const withCell = (place: number, text: string): readonly string[] => ROW.with(place, text);
  const problemsOf = (...rows: readonly (readonly string[])[]): readonly string[] => {
    const result = read(...rows);
    return result.ok ? [] : result.issue.map(({ line, code }) => `${line} ${code}`);
  };

  it('is read by its headers, in any order', () => {
    const result = read(HEADER.toReversed(), ROW.toReversed());
    expect(result).toEqual({
      ok: true,
      value: [
        {
          ...ENTRY,
          covariates: ['age', 'sex'],
          numberAnalysed: 1204,
          source: 'R, main model',
          computedOn: null,
        },
      ],
    });
  });

  it('takes short names, all levels and another level of confidence', () => {
    const result = read(
      [...HEADER, 'Confidence level', 'Date'],
      [...ROW.with(0, 'All levels').with(1, 'HR'), '90%', '2026-05-12'],
    );
    expect(result).toMatchObject({
      value: [{ levelId: null, measure: 'hazardRatio', level: 0.9, computedOn: '2026-05-12' }],
    });
  });

  it.each([
    ['no rows', [HEADER], ['1 noRows']],
    ['a column missing', [HEADER.slice(1), ROW.slice(1)], ['1 columnMissing']],
    [
      'a column unknown',
      [
        [...HEADER, 'Colour'],
        [...ROW, 'x'],
      ],
      ['1 columnUnknown'],
    ],
    [
      'a column twice',
      [
        [...HEADER, 'estimate'],
        [...ROW, 'x'],
      ],
      ['1 columnTwice'],
    ],
    ['a level unknown', [HEADER, ROW, withCell(0, 'many')], ['3 levelUnknown']],
    ['the reference', [HEADER, withCell(0, 'None')], ['2 levelIsReference']],
    ['a measure unknown', [HEADER, withCell(1, 'beta')], ['2 measureUnknown']],
    ['an empty cell', [HEADER, withCell(9, ' ')], ['2 cellEmpty']],
    ['a long cell', [HEADER, withCell(9, 'x'.repeat(501))], ['2 cellTooLong']],
    ['half a person', [HEADER, withCell(8, '12.5')], ['2 numberNotWhole']],
    ['numbers that cannot be', [HEADER, withCell(2, '4.02')], ['2 numbersRefused']],
    ['a row twice', [HEADER, ROW, ROW], ['3 rowTwice']],
    [
      'a date',
      [
        [...HEADER, 'date'],
        [...ROW, '2026-02-30'],
      ],
      ['2 dateNotReadable'],
    ],
    [
      'a confidence',
      [
        [...HEADER, 'confidence'],
        [...ROW, '12%'],
      ],
      ['2 levelNotPercent'],
    ],
  ] as const)('is refused whole, line by line: %s', (_, rows, problems) => {
    expect(problemsOf(...rows)).toEqual(problems);
  });

  it('names every line that is wrong', () => {
    expect(problemsOf(HEADER, withCell(0, 'many'), ROW, withCell(1, 'beta'))).toEqual([
      '2 levelUnknown',
      '4 measureUnknown',
    ]);
  });
});
