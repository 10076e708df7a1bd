import { describe, expect, it } from 'vitest';
import type { CutView } from '#shared/api';
import { COUNTED_OUTCOME_COLUMN_ID } from '#shared/code-book';
import { columnOf, useDataStudy } from '../../builders/data-study';

const data = useDataStudy();

describe('typed counts', () => {
  const typed = {
    dataSetName: 'Supper',
    dataDate: '2026-03-31',
    exposureLabel: 'Mussels',
    outcomeLabel: 'Stomach upset',
    stratumLabel: null,
    layout: 'eventsAndTotal',
    rows: [
      { level: 'Ate', stratum: null, events: 12, other: 40 },
      { level: 'Did not eat', stratum: null, events: 3, other: 60 },
    ],
  };

  it('are stored as a cut and counted like any other', async () => {
    const response = await data.browser.post(data.at('/typed-counts'), typed);
    expect(response.status).toBe(201);
    const cut = response.body as CutView;
    expect(cut).toMatchObject({
      number: 1,
      rows: 2,
      fileName: 'Typed counts',
      dataSetName: 'Supper',
    });
    const { content } = await data.codeBook(cut.dataSetId);
    expect(columnOf(content, COUNTED_OUTCOME_COLUMN_ID).label).toBe('Stomach upset');
    expect((await data.tally(cut.id, 'mussels', COUNTED_OUTCOME_COLUMN_ID)).cells).toEqual([
      { at: [0, 0], count: 12 },
      { at: [0, 1], count: 28 },
      { at: [1, 0], count: 3 },
      { at: [1, 1], count: 57 },
    ]);
  });

  it('may be cases and controls in strata, in the order in which they were typed', async () => {
    const rows = ['Old', 'Young'].flatMap((stratum) =>
      ['None', 'Some'].map((level, at) => ({ level, stratum, events: at + 1, other: 10 })),
    );
    const response = await data.browser.post(data.at('/typed-counts'), {
      ...typed,
      layout: 'casesAndControls',
      stratumLabel: 'Age',
      rows,
    });
    const counted = await data.tally(
      (response.body as CutView).id,
      'age',
      'mussels',
      COUNTED_OUTCOME_COLUMN_ID,
    );
    expect(counted.axes[0]?.levelIds).toEqual(['old', 'young']);
    expect(counted.counted).toBe(2 * (1 + 2) + 4 * 10);
  });

  describe('POST /api/studies/:studyId/typed-counts rejects', () => {
    it.each<[string, object, string, string]>([
      [
        'more events than people',
        { rows: [{ ...typed.rows[0], events: 41 }, typed.rows[1]] },
        'rows.0.events',
        'There are more events (41) than people in total (40).',
      ],
      [
        'a negative count',
        { rows: [{ ...typed.rows[0], events: -1 }, typed.rows[1]] },
        'rows.0.events',
        'A count cannot be negative.',
      ],
      [
        'a count that is not whole',
        { rows: [{ ...typed.rows[0], other: 1.5 }, typed.rows[1]] },
        'rows.0.other',
        'Counts are whole numbers.',
      ],
      [
        'a group twice',
        { rows: [typed.rows[0], typed.rows[0], typed.rows[1]] },
        'rows.1.level',
        'Row 1 has the same group already.',
      ],
      [
        'a single group',
        { rows: [typed.rows[0], { ...typed.rows[0] }] },
        'rows',
        'Type at least two groups, so that they can be compared.',
      ],
      [
        'a stratum without saying what it is',
        { rows: [{ ...typed.rows[0], stratum: 'x' }, typed.rows[1]] },
        'rows.0.stratum',
        'Say what the strata are, or leave them out.',
      ],
      [
        'a stratum without a name',
        { stratumLabel: 'Age' },
        'rows.0.stratum',
        'Name the stratum of this row.',
      ],
      [
        'no date',
        { dataDate: 'yesterday' },
        'dataDate',
        'Give the date of the data, such as 2026-03-31.',
      ],
    ])('%s', async (_, change, path, message) => {
      const response = await data.browser.post(data.at('/typed-counts'), { ...typed, ...change });
      expect(response.status).toBe(422);
      expect((response.body as { fields: object[] }).fields).toContainEqual({ path, message });
      expect(await data.dataSets()).toEqual([]);
    });
  });
});

