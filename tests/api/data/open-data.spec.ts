import { describe, expect, it } from 'vitest';
import type { CutView } from '#shared/api';
import { COUNTED_OUTCOME_COLUMN_ID, factorLevels } from '#shared/code-book';
import { columnOf, useDataStudy } from '../../builders/data-study';
import { loadFile, openData } from '../../builders/uploads';

const data = useDataStudy();

/** Counts by labels, outer to inner, as in a printed table. */
type Table = readonly (readonly [labels: string, count: number])[];

/**
 * Tables of the open data sets of `tests/data`, as R 4.2.2 and scipy 1.10.1 count them (the strata
 * of the reference values of the same sets).
 */
const ADMISSIONS: Table = [
  ...department('A', [512, 313], [89, 19]),
  ...department('B', [353, 207], [17, 8]),
  ...department('C', [120, 205], [202, 391]),
  ...department('D', [138, 279], [131, 244]),
  ...department('E', [53, 138], [94, 299]),
  ...department('F', [22, 351], [24, 317]),
];

const SURVIVAL: Table = [
  ...survivors('1st', [6, 0], [197, 122]),
  ...survivors('2nd', [24, 0], [94, 167]),
  ...survivors('3rd', [27, 52], [151, 476]),
  ...survivors('Crew', [0, 0], [212, 673]),
];

const ALCOHOL = [
  ['0-39g/day', 29, 386],
  ['40-79', 75, 280],
  ['80-119', 51, 87],
  ['120+', 45, 22],
] as const;
const TOBACCO = [
  ['0-9g/day', 78, 447],
  ['10-19', 58, 178],
  ['20-29', 33, 99],
  ['30+', 31, 51],
] as const;
const AGE = [
  ['25-34', 1, 115],
  ['35-44', 9, 190],
  ['45-54', 46, 167],
  ['55-64', 76, 166],
  ['65-74', 55, 106],
  ['75+', 13, 31],
] as const;

describe('the admissions', () => {
  it.each(['UCBAdmissions_rows.csv', 'UCBAdmissions_aggregated.csv'])('in %s', async (file) => {
    const cut = await load(file);
    expect(await table(cut, 'dept', 'gender', 'admit')).toEqual(filled(ADMISSIONS));
    expect(await levels(cut, 'dept')).toEqual(['A', 'B', 'C', 'D', 'E', 'F']);
  });
});

describe('the survival data', () => {
  it.each(['Titanic_rows.csv', 'Titanic_aggregated.csv'])('in %s', async (file) => {
    const cut = await load(file);
    expect(await table(cut, 'class', 'age', 'survived')).toEqual(filled(SURVIVAL));
    expect(await levels(cut, 'class')).toEqual(['1st', '2nd', '3rd', 'Crew']);
    expect((await data.tally(cut.id, 'class')).counted).toBe(2201);
  });
});

describe('the oesophageal data', () => {
  it.each([
    ['esoph_rows.csv', 'status', 'case', 'control'],
    ['esoph_aggregated.csv', 'status', 'case', 'control'],
    ['esoph_wide_cases_controls.csv', COUNTED_OUTCOME_COLUMN_ID, 'Case', 'Control'],
  ])('in %s', async (file, outcome, event, nonEvent) => {
    const cut = await load(file);
    const columns = { alcgp: ALCOHOL, tobgp: TOBACCO, agegp: AGE };
    for (const [column, expected] of Object.entries(columns)) {
      const rows = expected.flatMap(([level, cases, controls]): Table => [
        [`${level} / ${event}`, cases],
        [`${level} / ${nonEvent}`, controls],
      ]);
      expect(await table(cut, column, outcome)).toEqual(filled(rows));
      expect(await levels(cut, column)).toEqual(expected.map(([level]) => level));
      const { content } = await data.codeBook(cut.dataSetId);
      expect(columnOf(content, column)).toMatchObject({ kind: 'orderedCategory' });
    }
  });
});

async function load(file: string): Promise<CutView> {
  return loadFile(data.browser, data.study, { bytes: await openData(file), fileName: file });
}

async function levels(cut: CutView, columnId: string): Promise<readonly string[]> {
  const { content } = await data.codeBook(cut.dataSetId);
  return factorLevels(columnOf(content, columnId)).map(({ label }) => label);
}

/** The counts of a cut by labels, cells of 0 left out. */
async function table(cut: CutView, ...columnIds: readonly string[]): Promise<object> {
  const tally = await data.tally(cut.id, ...columnIds);
  const labels = await Promise.all(columnIds.map((id) => levels(cut, id)));
  return Object.fromEntries(
    tally.cells.map(({ at, count }) => [
      at.map((place, axis) => labels[axis]?.[place]).join(' / '),
      count,
    ]),
  );
}

function filled(rows: Table): object {
  return Object.fromEntries(rows.filter(([, count]) => count > 0));
}

function department(
  name: string,
  [maleIn, maleOut]: readonly [number, number],
  [femaleIn, femaleOut]: readonly [number, number],
): Table {
  return [
    [`${name} / Male / Admitted`, maleIn],
    [`${name} / Male / Rejected`, maleOut],
    [`${name} / Female / Admitted`, femaleIn],
    [`${name} / Female / Rejected`, femaleOut],
  ];
}

function survivors(
  name: string,
  [childYes, childNo]: readonly [number, number],
  [adultYes, adultNo]: readonly [number, number],
): Table {
  return [
    [`${name} / Child / Yes`, childYes],
    [`${name} / Child / No`, childNo],
    [`${name} / Adult / Yes`, adultYes],
    [`${name} / Adult / No`, adultNo],
  ];
}
