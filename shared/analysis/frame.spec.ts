import { describe, expect, it } from 'vitest';
import { combinations } from './factor-levels';
import { frameOf } from './frame';
import type { AnalysisSpecification } from './specification';
import { TEST_OUTCOME, inputsOf, testColumn } from './testing/counts-analysis';

const { codeBook, specification, study } = inputsOf({
  levels: ['low', 'middle', 'high'],
  counts: {
    A: [
      [1, 2],
      [1, 2],
      [1, 2],
    ],
    B: [
      [1, 2],
      [1, 2],
      [1, 2],
    ],
  },
});

function frameWith(changes: Partial<AnalysisSpecification>): unknown {
  return frameOf(codeBook, { ...specification, ...changes }, TEST_OUTCOME, study);
}

describe('frameOf', () => {
  it('takes words and order from the code book', () => {
    expect(frameWith({})).toMatchObject({
      ok: true,
      value: {
        design: 'cohort',
        exposure: { label: 'The exposure', ordered: false, referenceLevelId: 'low' },
        strata: [{ id: 'A' }, { id: 'B' }],
        strataLabel: 'The stratum',
      },
    });
  });

  it('leaves out levels that a restriction of the same column takes away', () => {
    const restrictions = [{ columnId: 'exposure', levelIds: ['high', 'low'] }];
    expect(frameWith({ restrictions })).toMatchObject({
      value: { exposure: { levels: [{ id: 'low' }, { id: 'high' }] } },
    });
  });

  it('combines several stratifying columns', () => {
    const sites = testColumn('site', 'category', ['X', 'Y']);
    const wider = { ...codeBook, columns: [...codeBook.columns, sites] };
    const stratumColumnIds = ['stratum', 'site'];
    const frame = frameOf(wider, { ...specification, stratumColumnIds }, TEST_OUTCOME, study);
    expect(frame.ok && frame.value.strata.map(({ id, label }) => [id, label])).toEqual([
      ['A|X', 'A, X'],
      ['A|Y', 'A, Y'],
      ['B|X', 'B, X'],
      ['B|Y', 'B, Y'],
    ]);
    expect(frame.ok && frame.value.strataLabel).toBe('The stratum, The site');
  });

  it('takes bands of a number as ordered levels', () => {
    const bands = [
      { id: 'b1', lower: null, upper: 10, label: '< 10', sentenceLabel: 'under 10' },
      { id: 'b2', lower: 10, upper: null, label: '10+', sentenceLabel: '10 or more' },
    ];
    const hours = { ...testColumn('exposure', 'number', []), bands, unit: 'h/week' };
    const columns = codeBook.columns.map((column) => (column.id === 'exposure' ? hours : column));
    const exposure = { columnId: 'exposure', referenceLevelId: 'b1' };
    const changed = { ...specification, exposure };
    expect(frameOf({ ...codeBook, columns }, changed, TEST_OUTCOME, study)).toMatchObject({
      value: { exposure: { ordered: true, unit: 'h/week', levels: [{ id: 'b1' }, { id: 'b2' }] } },
    });
  });

  it.each<[string, Partial<AnalysisSpecification>]>([
    ['columnMissing', { stratumColumnIds: ['gone'] }],
    ['columnUsedTwice', { stratumColumnIds: ['exposure'] }],
    ['columnWithoutLevels', { restrictions: [{ columnId: 'stratum', levelIds: ['gone'] }] }],
    ['levelMissing', { exposure: { columnId: 'exposure', referenceLevelId: 'gone' } }],
    ['levelMissing', { restrictions: [{ columnId: 'exposure', levelIds: ['high'] }] }],
    ['fewerThanTwoExposureLevels', { restrictions: [{ columnId: 'exposure', levelIds: ['low'] }] }],
    ['noEventLevel', { outcome: { ...specification.outcome, eventLevelIds: [] } }],
    ['levelMissing', { outcome: { ...specification.outcome, eventLevelIds: ['gone'] } }],
    ['everyLevelIsEvent', { outcome: { ...specification.outcome, eventLevelIds: ['yes', 'no'] } }],
  ])('refuses: %s', (code, changes) => {
    expect(frameWith(changes)).toMatchObject({ ok: false, issue: { code } });
  });
});

describe('combinations', () => {
  it('of nothing are none', () => {
    expect(combinations([])).toEqual([]);
  });
});
