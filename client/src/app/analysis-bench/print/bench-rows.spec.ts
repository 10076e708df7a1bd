import { POOLED_RISK_DIFFERENCES } from '#shared/stats';
import { expect, it } from 'vitest';
import { CODE_BOOK, wetWorkPrint, wetWorkResult } from '../testing/wet-work';
import { type PrintedEstimate, shownMeasures } from './bench-print';
import { countsTable } from './counts-rows';
import { estimateRows } from './estimate-rows';
import { measureGroups, poolingGroups, riskGroup } from '../methods/method-groups';
import { answerTo } from '../methods/method-question';
import { pooledRows } from './pooled-rows';
import { isSparse } from './sparse-places';

const print = wetWorkPrint();
const printedNumber = (cell: PrintedEstimate | undefined) =>
  cell?.ok === true ? Number(cell.value.replace('+', '')) : NaN;
const KITCHEN = { kind: 'stratum', stratumId: 'kitchen' } as const;

it('lays levels down and layers across, with totals', () => {
  const table = countsTable(print);
  expect(table.layers).toEqual(['Ward', 'Kitchen']);
  expect(table.groups[0]?.rows.map(({ label, isReference }) => [label, isReference])).toEqual([
    ['None', true],
    ['Some', false],
    ['Much', false],
  ]);
  expect(
    table.groups[0]?.rows[0]?.cells.map((cell) => [cell.with, cell.without, cell.risk]),
  ).toEqual([
    ['10', '90', '10'],
    ['5', '45', '10'],
  ]);
  expect(table.totals[1]?.with).toBe('17');
});

it('shows no risk of cases and controls', () => {
  const caseControl = wetWorkPrint('caseControl');
  expect(countsTable(caseControl).groups[0]?.rows[0]?.cells[0]?.risk).toBeNull();
  expect(shownMeasures(caseControl.result)).toEqual(['oddsRatio']);
});

it('marks cells with a small expected count', () => {
  const [ward, kitchen] = print.result.strata;
  expect(isSparse(print.result, ward!, 'none')).toBe(false);
  expect(isSparse(print.result, kitchen!, 'much')).toBe(true);
});

it('prints each level against the reference, difference and ratio from the same counts', () => {
  const [some, much] = estimateRows(print, { kind: 'stratum', stratumId: 'ward' }, 'a1');
  expect(printedNumber(some?.measures.riskDifference)).toBe(10);
  expect(printedNumber(some?.measures.riskRatio)).toBe(2);
  expect(printedNumber(much?.measures.riskDifference)).toBe(20);
  expect(much?.balance?.gauge?.kind).toBe('risks');
});

it('says why what is not estimable is not', () => {
  const [some] = estimateRows(wetWorkPrint('caseControl'), { kind: 'crude' }, 'a1');
  expect(some?.measures.riskRatio).toEqual({
    ok: false,
    reason: 'Not estimable: the study design does not give it.',
  });
});

it('pools over strata with a test for each measure', () => {
  const rows = pooledRows(print, ['riskDifference', 'riskRatio']);
  expect(rows.map(({ label }) => label)).toEqual(['Some', 'Much']);
  expect(rows[0]?.estimates).toHaveLength(2);
  expect(rows[0]?.homogeneity).toHaveLength(2);
  expect(printedNumber(rows[0]?.estimates[0])).toBe(10);
  expect(rows[0]?.crude.map((beside) => beside?.shift)).toEqual([
    expect.stringMatching(/percentage points?$/),
    expect.stringMatching(/%$/),
  ]);
});

it('lays every method of a measure on one axis, the chosen one marked', () => {
  const [difference, ratio] = measureGroups(
    print,
    ['riskDifference', 'riskRatio'],
    { scope: KITCHEN, levelId: 'some' },
    () => null,
  );
  expect(difference?.rows.map(({ methodId }) => methodId)).toContain('wald');
  expect(difference?.rows.filter(({ isChosen }) => isChosen)).toHaveLength(1);
  for (const group of [difference, ratio]) {
    for (const { drawn, question } of group?.rows ?? []) {
      if (question !== null) continue;
      expect(drawn!.from).toBeGreaterThanOrEqual(0);
      expect(drawn!.from).toBeLessThan(drawn!.at);
      expect(drawn!.at).toBeLessThan(drawn!.to);
      expect(drawn!.to).toBeLessThanOrEqual(1);
    }
  }
});

it('leaves a method that takes its time to be asked for, and shows what it gave', () => {
  const place = { scope: KITCHEN, levelId: 'some' };
  const [open] = measureGroups(print, ['riskDifference'], place, () => null);
  const row = open?.rows.find(({ question }) => question !== null);
  expect(row).toMatchObject({ limits: null, drawn: null, isChosen: false });
  const [known] = measureGroups(print, ['riskDifference'], place, answerTo);
  const answered = known?.rows.find(({ methodId }) => methodId === row?.methodId);
  expect(answered?.limits).toMatch(/^\S+ to \S+$/);
});

it('lays the ways to pool a measure on one axis', () => {
  const [difference, ratio] = poolingGroups(print, ['riskDifference', 'riskRatio'], 'some');
  expect(difference?.rows.map(({ methodId }) => methodId)).toEqual(
    Object.keys(POOLED_RISK_DIFFERENCES),
  );
  expect(Number(difference?.value)).toBe(10);
  expect(ratio?.rows.filter(({ isChosen }) => isChosen)).toHaveLength(1);
});

it('offers the methods of the risk of the level in view', () => {
  const group = riskGroup(print, KITCHEN, 'some');
  expect(group?.value).toBe('20');
  expect(group?.rows.find(({ isChosen }) => isChosen)?.methodId).toBe('wilson');
});

it('knows its fixture: the kitchen turns the trend round', () => {
  expect(wetWorkResult().strata[1]?.levels.map(({ count }) => count.events)).toEqual([5, 10, 2]);
  expect(CODE_BOOK.columns).toHaveLength(3);
});
