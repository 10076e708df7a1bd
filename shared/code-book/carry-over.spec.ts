import { describe, expect, it } from 'vitest';
import { adoptIds } from './adopt-ids';
import { carryOver } from './carry-over';
import { bandColumn } from './edit-bands';
import { renameColumn, replaceColumn } from './edit-column';
import { mergeLevels } from './edit-levels';
import { proposeCodeBook } from './propose-code-book';
import { profileOf } from './testing/contents';

const before = { band: ['0-9', '20-29'], sex: ['Female', 'Male'], age: ['31.5', '62.25'] };
const previous = proposeCodeBook(profileOf(before));

describe('carryOver', () => {
  it('keeps everything when the data hold the same', () => {
    expect(carryOver(previous, profileOf(before))).toEqual({ codeBook: previous, differences: [] });
  });

  it('keeps words, bands and merges', () => {
    const banded = bandColumn(
      renameColumn(previous.columns[2]!, { label: 'Age' }),
      [50],
      'anyNumbers',
    );
    const merged = mergeLevels(previous.columns[1]!, ['male', 'female'], { label: 'All' });
    const edited = [banded, merged].reduce(
      (book, outcome) => (outcome.ok ? replaceColumn(book, outcome.value) : book),
      previous,
    );
    expect(carryOver(edited, profileOf(before)).codeBook).toEqual(edited);
  });

  it('adds a new value as a level where it belongs, and says so', () => {
    const { codeBook, differences } = carryOver(
      previous,
      profileOf({ ...before, band: ['20-29', '10-19', '0-9', '10-19'] }),
    );
    expect(codeBook.columns[0]?.levels.map(({ id }) => id)).toEqual(['0-9', '10-19', '20-29']);
    expect(differences).toEqual([
      {
        code: 'levelNew',
        columnId: 'band',
        levelId: '10-19',
        message: '"10-19" in the column "Band" is new, in 2 rows. It was added as a level.',
      },
    ]);
  });

  it('adds a new value last when a person has put the levels in an order of their own', () => {
    const levels = [...previous.columns[0]!.levels].reverse();
    const turned = replaceColumn(previous, { ...previous.columns[0]!, levels });
    const { codeBook } = carryOver(
      turned,
      profileOf({ ...before, band: ['20-29', '10-19', '0-9'] }),
    );
    expect(codeBook.columns[0]?.levels.map(({ id }) => id)).toEqual(['20-29', '0-9', '10-19']);
  });

  it('marks new words for no answer, and words among numbers', () => {
    const { codeBook, differences } = carryOver(
      previous,
      profileOf({ ...before, sex: ['Male', 'unknown', 'Female'], age: ['31.5', 'old', '62'] }),
    );
    expect(codeBook.columns[1]?.missingCodes).toContainEqual({
      code: 'unknown',
      reason: 'Unknown',
    });
    expect(codeBook.columns[2]?.missingCodes).toContainEqual({
      code: 'old',
      reason: 'Not a number',
    });
    expect(differences.map(({ code }) => code)).toEqual(['missingNew', 'missingNew']);
  });

  it('keeps levels and columns that are gone, proposes new ones, and says all of it', () => {
    const { codeBook, differences } = carryOver(
      previous,
      profileOf({ band: ['0-9'], sex: ['Female', 'Male'], ward: ['A', 'B'] }),
    );
    expect(codeBook.columns.map(({ id }) => id)).toEqual(['band', 'sex', 'age', 'ward']);
    expect(codeBook.columns[0]).toEqual(previous.columns[0]);
    expect(differences.map(({ code, columnId }) => [code, columnId])).toEqual([
      ['levelGone', 'band'],
      ['columnGone', 'age'],
      ['columnNew', 'ward'],
    ]);
  });

  it('says when a column holds no numbers any more, and when a count is gone', () => {
    const data = {
      sex: ['Female', 'Male', 'Male'],
      age: ['31.5', '62.25', '40'],
      n: ['4', '5', '6'],
    };
    const later = profileOf({ sex: data.sex, age: ['old', 'young', 'old'] });
    const { differences } = carryOver(proposeCodeBook(profileOf(data)), later);
    expect(differences.map(({ code }) => code)).toEqual(['noLongerNumbers', 'countColumnGone']);
  });
});

describe('adoptIds', () => {
  const known = replaceColumn(previous, {
    ...previous.columns[1]!,
    levels: [
      { id: 'f', codes: ['Female', 'F'], label: 'Women', sentenceLabel: 'women' },
      { id: 'm', codes: ['Male'], label: 'Men', sentenceLabel: 'men' },
    ],
  });
  const owned = {
    ...known,
    columns: known.columns.map((one) => ({ ...one, id: `own-${one.id}` })),
  };

  it('takes the ids of columns of the same name and levels of the same codes', () => {
    const described = proposeCodeBook(
      profileOf({ sex: ['Male', 'Female', 'Other'], new: ['a', 'b'] }),
    );
    const adopted = adoptIds(described, owned);
    expect(adopted.columns.map(({ id }) => id)).toEqual(['own-sex', 'new']);
    expect(adopted.columns[0]?.levels.map(({ id }) => id)).toEqual(['m', 'f', 'other']);
  });

  it('changes nothing where the ids agree, even after a merge', () => {
    const merged = mergeLevels(owned.columns[1]!, ['f', 'm'], {});
    const edited = merged.ok ? replaceColumn(owned, merged.value) : owned;
    expect(adoptIds(edited, owned)).toEqual(edited);
  });

  it('renames what the layout counts by, and a reference', () => {
    const data = { g: ['no', 'yes', 'no'], n: ['4', '5', '6'] };
    const book = proposeCodeBook(profileOf(data));
    const other = {
      ...book,
      columns: book.columns.map((column) => ({
        ...column,
        id: `own-${column.id}`,
        levels: column.levels.map((level) => ({ ...level, id: `own-${level.id}` })),
      })),
    };
    const adopted = adoptIds(book, other);
    expect(adopted.layout).toEqual({ kind: 'count', columnId: 'own-n' });
    expect(adopted.columns[0]?.referenceLevelId).toBe('own-no');
  });
});
