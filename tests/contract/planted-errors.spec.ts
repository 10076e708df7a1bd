import { describe, expect, it } from 'vitest';
import { bundledTests, someFailure, plant } from '../builders/bundled-specs';
import { PLANTED_ERRORS } from './planted-errors/planted-errors';

/*
 * Do the reference values see a wrong formula? One after the other is planted into a copy of the
 * sources, and the spec files that compare with the reference values run over it as they stand.
 */

const SLOW = 60_000;

const errors = PLANTED_ERRORS.flatMap(([, planted]) => planted);
const specs = [...new Set(errors.flatMap((error) => error.specs))];

describe('without a wrong formula', () => {
  it.each(specs)(
    '%s refuses nothing',
    async (spec) => {
      const tests = await bundledTests([spec], null);
      expect(tests.length).toBeGreaterThan(3);
      expect(someFailure(tests)).toBeNull();
    },
    SLOW,
  );
});

describe.each(PLANTED_ERRORS)('a wrong formula in %s', (_, planted) => {
  it.each(planted)(
    'is refused by reference values: $method',
    async (error) => {
      const tests = await bundledTests(error.specs, error);
      expect(someFailure(tests), `${error.file}: nobody sees "${error.wrong}"`).not.toBeNull();
    },
    SLOW,
  );
});

describe('planting', () => {
  it('covers every family', () => {
    expect(PLANTED_ERRORS.length).toBeGreaterThanOrEqual(26);
    expect(PLANTED_ERRORS.every(([, planted]) => planted.length > 0)).toBe(true);
  });

  const error = { file: 'a.ts', text: 'one + two', wrong: 'one - two' };

  it('changes the one place', () => {
    expect(plant('const sum = one + two;', error)).toBe('const sum = one - two;');
  });

  it('says so when the text has moved on, or is there twice', () => {
    expect(() => plant('const sum = two + one;', error)).toThrow(
      'a.ts: the planted text is not there any more.',
    );
    expect(() => plant('[one + two, one + two]', error)).toThrow('is there more than once');
  });

  it(
    'says so when the spec files do not use the planted file',
    async () => {
      const elsewhere = { ...error, file: 'shared/nowhere.ts' };
      await expect(bundledTests([specs[0]!], elsewhere)).rejects.toThrow('do not use it');
    },
    SLOW,
  );
});
