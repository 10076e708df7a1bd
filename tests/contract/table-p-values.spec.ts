import { describe, expect, it } from 'vitest';
import type { AnalysisResult } from '#shared/analysis';
import type { TableElement } from '#shared/layout';
import { composed, blockOf, pinned, reportOf, textOf } from '../builders/reports';
import { wardResult, wetWorkResult } from '../builders/results';

/** The table of a result with a column of p-values. */
function tableOf(result: AnalysisResult, pValues: string): TableElement {
  const pin = pinned(result);
  const block = blockOf('t', 'stratifiedTable', pin, { pValues });
  const [element] = composed(reportOf([block], [pin]), [pin]).elements;
  if (element?.kind !== 'table') throw new Error('No table');
  return element;
}

/** What the last cell of each level's row prints, with the number behind it. */
function lastCells(table: TableElement): readonly { text: string; value: number | null }[] {
  return table.rows
    .filter(({ kind }) => kind === 'level')
    .map(({ cells }) => cells.at(-1)!)
    .map(({ runs, numbers }) => ({ text: textOf(runs), value: numbers[0]?.value ?? null }));
}

function notesOf(table: TableElement): string {
  return table.notes.map(textOf).join(' ');
}

describe('p-values in a table', () => {
  it('have a column of their own, none for the reference, with the tests in a note', () => {
    const table = tableOf(wardResult(), 'unadjusted');
    expect(textOf(table.head.at(-1)!.at(-1)!.runs)).toBe('P');
    const [none, under2, over6] = lastCells(table);
    expect(none).toEqual({ text: '', value: null });
    // R 4.2.2: chisq.test(matrix(c(27, 375, 11, 225), 2), correct = FALSE)$p.value
    expect(under2?.value).toBeCloseTo(0.2895859, 6);
    expect(over6?.text).toBe('<0.001');
    expect(notesOf(table)).toContain('P values are from: Pearson chi-square test.');
    expect(notesOf(table)).toContain('not adjusted for the number of contrasts (2)');
  });

  it('are adjusted over all contrasts of the table together', () => {
    const [, raw] = lastCells(tableOf(wardResult(), 'unadjusted'));
    const [, single] = lastCells(tableOf(wardResult(), 'bonferroni'));
    expect(single?.value).toBeCloseTo(2 * raw!.value!, 12);
    const [, holm] = lastCells(tableOf(wardResult(), 'holm'));
    expect(holm?.value).toBeCloseTo(raw!.value!, 12);
    expect(notesOf(tableOf(wardResult(), 'holm'))).toMatch(
      /adjusted for 2 contrasts together: Holm/,
    );
    const strata = notesOf(tableOf(wetWorkResult(), 'holm'));
    expect(strata).toContain('adjusted for 6 contrasts together');
  });

  it('come from the test over strata beside pooled estimates', () => {
    const notes = notesOf(tableOf(wetWorkResult(), 'unadjusted'));
    expect(notes).toContain('Cochran–Mantel–Haenszel test');
  });

  it('are not there unless they are asked for', () => {
    expect(notesOf(tableOf(wardResult(), 'none'))).not.toContain('P values are from');
  });
});
