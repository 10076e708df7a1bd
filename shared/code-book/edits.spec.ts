import { describe, expect, it } from 'vitest';
import type { CodeBookColumn } from './code-book';
import { bandColumn, cutPointsOf, removeBands } from './edit-bands';
import { changeKind, renameColumn, replaceColumn, setLayout } from './edit-column';
import {
  mergeLevels,
  moveLevel,
  renameLevel,
  setReference,
  splitLevel,
  type EditedColumn,
} from './edit-levels';
import { codeBookEditMessage } from './edit-messages';
import { markMissing, unmarkMissing } from './edit-missing';
import { proposeCodeBook } from './propose-code-book';
import { contentsOf, profileOf } from './testing/contents';

const book = proposeCodeBook(
  profileOf({ dose: ['none', 'low', 'high', '9'], age: ['33', '45.5', '61', '27'] }),
);
const dose = { ...book.columns[0]!, referenceLevelId: 'none' };
const age = { ...book.columns[1]!, unit: 'years' };

describe('levels', () => {
  it('take other words and keep their ids', () => {
    const renamed = edited(
      renameLevel(dose, 'low', { label: 'Low dose', sentenceLabel: 'low dose' }),
    );
    expect(renamed.levels[1]).toEqual({
      id: 'low',
      codes: ['low'],
      label: 'Low dose',
      sentenceLabel: 'low dose',
    });
  });

  it('move within the print order, and no further than its ends', () => {
    expect(idsOf(edited(moveLevel(dose, '9', 0)))).toEqual(['9', 'none', 'low', 'high']);
    expect(idsOf(edited(moveLevel(dose, 'none', 99)))).toEqual(['low', 'high', '9', 'none']);
    expect(idsOf(edited(moveLevel(dose, 'low', -1)))).toEqual(['low', 'none', 'high', '9']);
  });

  it('merge into one that keeps the first id named, and its reference', () => {
    const merged = edited(mergeLevels(dose, ['low', 'none'], {}));
    expect(merged.levels[0]).toEqual({
      id: 'low',
      codes: ['none', 'low'],
      label: 'none or low',
      sentenceLabel: 'none or low',
    });
    expect(idsOf(merged)).toEqual(['low', 'high', '9']);
    expect(merged.referenceLevelId).toBe('low');
  });

  it('come apart again under the ids they had', () => {
    const merged = edited(mergeLevels(dose, ['low', 'none', 'high'], { label: 'Any' }));
    expect(edited(splitLevel(merged, 'low')).levels).toEqual(dose.levels);
  });

  it('keep the id of a merged level when none of its codes made it', () => {
    const renamed: CodeBookColumn = {
      ...dose,
      levels: [{ id: 'group-1', codes: ['none', 'low'], label: 'G', sentenceLabel: 'g' }],
    };
    expect(idsOf(edited(splitLevel(renamed, 'group-1')))).toEqual(['group-1', 'low']);
  });

  it('may be the reference, and no level need be', () => {
    expect(edited(setReference(dose, 'high')).referenceLevelId).toBe('high');
    expect(edited(setReference(dose, null)).referenceLevelId).toBeNull();
  });

  it.each([
    [renameLevel(dose, 'gone', {}), 'unknownLevel'],
    [moveLevel(dose, 'gone', 0), 'unknownLevel'],
    [mergeLevels(dose, ['low', 'gone'], {}), 'unknownLevel'],
    [mergeLevels(dose, ['low', 'low'], {}), 'tooFewLevelsToMerge'],
    [splitLevel(dose, 'gone'), 'unknownLevel'],
    [splitLevel(dose, 'low'), 'levelIsNotMerged'],
    [setReference(dose, 'gone'), 'unknownReference'],
    [markMissing(dose, '9', ' '), 'reasonNeeded'],
    [unmarkMissing(dose, 'low'), 'unknownCode'],
    [bandColumn(age, [], 'anyNumbers'), 'cutPointsNeeded'],
    [bandColumn(age, [40, 40], 'anyNumbers'), 'cutPointsNotAscending'],
    [bandColumn(age, [40, NaN], 'anyNumbers'), 'cutPointsNotAscending'],
  ])('refuse what cannot be done, in words: %#', (outcome, code) => {
    expect(outcome).toMatchObject({ ok: false, issue: { code } });
    expect(outcome.ok ? '' : codeBookEditMessage(outcome.issue)).toMatch(/^[A-Z].+\.$/);
  });
});

describe('missing codes', () => {
  it('leave their level, which goes when it has no codes left', () => {
    const marked = edited(markMissing(dose, '9', 'Not answered'));
    expect(idsOf(marked)).toEqual(['none', 'low', 'high']);
    expect(marked.missingCodes).toContainEqual({ code: '9', reason: 'Not answered' });
  });

  it('leave a merged level that stays, and take a lost reference with them', () => {
    const merged = edited(mergeLevels(dose, ['high', '9'], {}));
    expect(edited(markMissing(merged, '9', 'x')).levels[2]?.codes).toEqual(['high']);
    expect(edited(markMissing(dose, 'none', 'x')).referenceLevelId).toBeNull();
  });

  it('change their reason when marked again, and become levels again', () => {
    const twice = edited(markMissing(edited(markMissing(dose, '9', 'x')), '9', 'y'));
    expect(twice.missingCodes.filter(({ code }) => code === '9')).toEqual([
      { code: '9', reason: 'y' },
    ]);
    expect(edited(unmarkMissing(twice, '9')).levels).toEqual(dose.levels);
  });
});

describe('bands', () => {
  it('of whole numbers say both ends', () => {
    const banded = edited(bandColumn(age, [40, 41, 60], 'wholeNumbers'));
    expect(banded.bands.map(({ label, sentenceLabel }) => [label, sentenceLabel])).toEqual([
      ['<40', 'under 40 years'],
      ['40', '40 years'],
      ['41\u201359', '41 to 59 years'],
      ['≥60', '60 years or more'],
    ]);
    expect(banded.referenceLevelId).toBe('below-40');
    expect(cutPointsOf(banded)).toEqual([40, 41, 60]);
  });

  it('of other numbers say that the upper end is not in', () => {
    const banded = edited(bandColumn({ ...age, unit: null }, [-2.5, 0], 'anyNumbers'));
    expect(banded.bands.map(({ label, sentenceLabel }) => [label, sentenceLabel])).toEqual([
      ['<\u22122.5', 'under \u22122.5'],
      ['\u22122.5 to <0', '\u22122.5 to under 0'],
      ['≥0', '0 or more'],
    ]);
  });

  it('with the same limits keep id, words and reference', () => {
    const once = edited(bandColumn(age, [40, 60], 'wholeNumbers'));
    const named = edited(renameLevel(once, 'from-60', { label: 'Old' }));
    const again = edited(
      bandColumn(edited(setReference(named, 'from-60')), [50, 60], 'wholeNumbers'),
    );
    expect(again.bands.map(({ label }) => label)).toEqual(['<50', '50\u201359', 'Old']);
    expect(again.referenceLevelId).toBe('from-60');
  });

  it('can be removed', () => {
    expect(removeBands(edited(bandColumn(age, [40], 'wholeNumbers')))).toEqual(age);
  });
});

describe('columns', () => {
  it('take other words', () => {
    expect(renameColumn(age, { label: 'Age', unit: null })).toMatchObject({
      label: 'Age',
      unit: null,
    });
  });

  it('get levels when they become a category, and keep them when they change back', () => {
    const contents = profileOf({ age: ['3', '20', '3', ''] }).columns[0]!;
    const asCategory = changeKind(age, 'orderedCategory', contents);
    expect(idsOf(asCategory)).toEqual(['3', '20']);
    expect(idsOf(changeKind(asCategory, 'number', contents))).toEqual(['3', '20']);
    expect(changeKind(age, 'category', null)).toEqual({ ...age, kind: 'category' });
  });

  it('mark words when they become a number', () => {
    const contents = {
      ...contentsOf('dose', ['1', 'two']),
      columnId: 'dose',
      guessedKind: 'category',
    } as const;
    const asCategory = changeKind({ ...age, id: 'dose' }, 'category', contents);
    const asNumber = changeKind(asCategory, 'number', contents);
    expect(asNumber.missingCodes).toContainEqual({ code: 'two', reason: 'Not a number' });
    expect(idsOf(asNumber)).toEqual(['1']);
    expect(idsOf(changeKind({ ...asNumber, levels: [] }, 'category', contents))).toEqual([
      '1',
      'two',
    ]);
  });

  it('are exchanged by id', () => {
    expect(replaceColumn(book, { ...age, label: 'Years' }).columns[1]?.label).toBe('Years');
  });
});

describe('the layout', () => {
  const counted = proposeCodeBook(
    profileOf({ g: ['a', 'b', 'c'], n1: ['1', '2', '3'], n2: ['4', '5', '6'] }),
  );
  const layout = { kind: 'eventsAndTotal', eventsColumnId: 'n1', totalColumnId: 'n2' } as const;

  it('makes its columns counts and brings the outcome they stand for', () => {
    const both = setLayout(counted, layout);
    expect(both.columns.map(({ id, kind }) => [id, kind])).toEqual([
      ['g', 'category'],
      ['n1', 'count'],
      ['n2', 'count'],
      ['counted-outcome', 'category'],
    ]);
  });

  it('keeps the words of that outcome, and takes it away again', () => {
    const both = setLayout(counted, layout);
    const worded = replaceColumn(both, renameColumn(both.columns[3]!, { label: 'Infection' }));
    const turned = setLayout(worded, { ...layout, eventsColumnId: 'n2', totalColumnId: 'n1' });
    expect(turned.columns[3]?.label).toBe('Infection');
    const records = setLayout(turned, { kind: 'records' });
    expect(records.columns.map(({ id, kind }) => [id, kind])).toEqual([
      ['g', 'category'],
      ['n1', 'number'],
      ['n2', 'number'],
    ]);
  });
});

function edited(outcome: EditedColumn): CodeBookColumn {
  if (!outcome.ok) throw new Error(outcome.issue.code);
  return outcome.value;
}

function idsOf(column: CodeBookColumn): readonly string[] {
  return column.levels.map(({ id }) => id);
}
