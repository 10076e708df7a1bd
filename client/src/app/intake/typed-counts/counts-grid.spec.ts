import { expect, it } from 'vitest';
import { checkedRows, placeOfPath } from './checked-grid';
import {
  type CountsGrid,
  emptyGrid,
  withoutRow,
  withoutStratum,
  withStratum,
  withStratumName,
  withText,
} from './counts-grid';
import { isBlock, pastedInto } from './pasted-counts';

const START = { row: 0, column: 0 };

function pasted(text: string): CountsGrid {
  return pastedInto(emptyGrid(), START, text).grid;
}

it('spreads a pasted block over levels and counts, adding rows', () => {
  const grid = pasted('None\t11\t236\nUnder 2 h\t27\t402\r\n2–4 h\t43\t418\n');
  expect(grid.rows).toEqual([
    { level: 'None', cells: ['11', '236'] },
    { level: 'Under 2 h', cells: ['27', '402'] },
    { level: '2–4 h', cells: ['43', '418'] },
  ]);
});

it('leaves a line of headings out', () => {
  expect(pasted('Level\tEvents\tTotal\nNone\t11\t236\nSome\t27\t402').rows).toHaveLength(2);
});

it('says how many pasted columns found no place', () => {
  const { grid, columnsLeftOver } = pastedInto(emptyGrid(), { row: 0, column: 1 }, '1\t2\t3\t4');
  expect(columnsLeftOver).toBe(2);
  expect(grid.rows[0]?.cells).toEqual(['1', '2']);
});

it('takes a single word as text of one cell', () => {
  expect(isBlock('None\n')).toBe(false);
  expect(isBlock('None\t4')).toBe(true);
});

it('gives one row for each level and stratum', () => {
  const grid = withStratumName(
    withStratumName(withStratum(pasted('A\t1\t2\nB\t3\t4')), 0, 'East'),
    1,
    'West',
  );
  const full = pastedInto(grid, { row: 0, column: 3 }, '5\t6\n7\t8').grid;
  expect(checkedRows(full, 'eventsAndTotal')).toEqual({
    ok: true,
    value: [
      { level: 'A', stratum: 'East', events: 1, other: 2 },
      { level: 'A', stratum: 'West', events: 5, other: 6 },
      { level: 'B', stratum: 'East', events: 3, other: 4 },
      { level: 'B', stratum: 'West', events: 7, other: 8 },
    ],
  });
});

it('names every problem at its place', () => {
  const grid = pasted('A\t5\t2\nA\tx\t');
  expect(checkedRows(grid, 'eventsAndTotal')).toEqual({
    ok: false,
    issue: [
      { place: { row: 1, column: 0 }, message: '"A" is here already.' },
      { place: { row: 0, column: 1 }, message: '5 with the event cannot be among 2 in all.' },
      { place: { row: 1, column: 1 }, message: '"x" is not a count.' },
      { place: { row: 1, column: 2 }, message: 'Type a count, or 0.' },
    ],
  });
});

it('lets cases outnumber controls', () => {
  expect(checkedRows(pasted('A\t5\t2\nB\t1\t1'), 'casesAndControls').ok).toBe(true);
});

it('finds the text that a refused path speaks of', () => {
  const grid = withStratum(pasted('A\t1\t2\nB\t3\t4'));
  expect(placeOfPath(grid, 'rows.3.other')).toEqual({ row: 1, column: 4 });
  expect(placeOfPath(grid, 'rows.2.level')).toEqual({ row: 1, column: 0 });
  expect(placeOfPath(grid, 'rows.1.stratum')).toEqual({ row: -1, column: 3 });
  expect(placeOfPath(grid, 'dataSetName')).toBeNull();
});

it('keeps two rows and one stratum at least', () => {
  const grid = withText(emptyGrid(), START, 'A');
  expect(withoutRow(grid, 0)).toBe(grid);
  expect(withoutStratum(grid, 0)).toBe(grid);
  const back = withoutStratum(withStratum(grid), 1);
  expect(back).toEqual({ ...grid, stratified: false });
});
