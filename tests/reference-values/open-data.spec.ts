import { describe, expect, it } from 'vitest';
import openData from './open-data.json';
import { computed } from './quantities';

describe('values on which statistics libraries agree, for open data', () => {
  it.each(openData.cases)('$quantity of $counts$strata ($data, $query)', (reference) => {
    const values = computed(reference);
    expect(values).toHaveLength(reference.expected.length);
    values.forEach((value, place) => {
      const expected = reference.expected[place]!;
      const band = Math.max(reference.absolute, reference.relative * Math.abs(expected));
      expect(Math.abs(value - expected)).toBeLessThanOrEqual(band);
    });
  });
});
