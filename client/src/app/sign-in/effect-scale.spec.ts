import { expect, it } from 'vitest';
import { multipleMarks, peopleMarks, placeOf, SHOWN_EFFECT } from './effect-scale';

it('reads the same end as people above and as multiples below', () => {
  const { reference, exposed, width } = SHOWN_EFFECT;
  expect((exposed - reference).toFixed(1)).toBe('16.2');
  expect((exposed / reference).toFixed(1)).toBe('4.5');
  const one = multipleMarks().find(({ label }) => label === '1×');
  expect(one?.x).toBe(placeOf(reference));
  expect(peopleMarks().at(-1)?.x).toBe(width);
});
