import { expect, it } from 'vitest';
import { nameColumns } from './column-names';

it('trims names, numbers the unnamed and tells repeated ones apart', () => {
  expect(nameColumns([' age ', '', 'sex', 'age', 'age (2)', 'age'])).toEqual({
    names: ['age', 'Column 2', 'sex', 'age (3)', 'age (2)', 'age (4)'],
    repeated: ['age'],
    unnamed: [2],
  });
});
