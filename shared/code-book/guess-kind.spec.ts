import { describe, expect, it } from 'vitest';
import { guessKind } from './guess-kind';
import { contentsOf } from './testing/contents';

describe('guessKind', () => {
  it.each([
    ['sex', ['Female', 'Male', 'Female'], 'category'],
    ['answer', ['0', '1', '1', '0'], 'category'],
    ['alcgp', ['120+', '0-39g/day', '40-79', '80-119'], 'orderedCategory'],
    ['severity', ['Mild', 'Severe', 'None'], 'orderedCategory'],
    ['class', ['1st', '3rd', 'Crew'], 'category'],
    ['seen', ['2026-01-31', '2026-02-01', ''], 'date'],
    ['seen', ['31.1.2026', '1.2.2026'], 'date'],
    ['nothing', ['', ' ', 'NA'], 'ignored'],
    ['count', ['3', '0', '12'], 'count'],
    ['case', ['1', '0', '1'], 'category'],
    ['nCases', ['3', '0', '12'], 'count'],
    ['n_controls', ['3', '0', '12'], 'count'],
    ['count', ['3', 'many', '12'], 'category'],
    ['person_years', ['3.5', '0.2', '12'], 'personTime'],
    ['pair', ['1', '1', '2', '2'], 'pairIdentifier'],
    ['cluster_id', ['1', '1', '2', '2'], 'clusterIdentifier'],
    ['id', ['1', '2', '3', '4'], 'identifier'],
    ['Person ID', ['a1', 'a2', 'a3'], 'identifier'],
    ['weight', ['70.5', '81.25', '64'], 'number'],
  ])('takes %s with %j for %s', (name, values, kind) => {
    expect(guessKind(contentsOf(name, values), values.length)).toBe(kind);
  });

  it('takes many whole numbers for a number', () => {
    const ages = Array.from({ length: 40 }, (_, index) => String(20 + index));
    expect(guessKind(contentsOf('age', ages), 40)).toBe('number');
  });

  it('takes numbers with a few words among them for a number', () => {
    const hours = [...Array.from({ length: 40 }, (_, index) => String(index)), 'about two'];
    expect(guessKind(contentsOf('hours', hours), 41)).toBe('number');
  });

  it('takes text that hardly repeats for an identifier, and repeating long lists for neither', () => {
    const names = Array.from(
      { length: 100 },
      (_, index) => `name ${String(index)}x${String(index)}`,
    );
    expect(guessKind(contentsOf('remark', names), 100)).toBe('identifier');
    expect(guessKind(contentsOf('remark', [...names, ...names]), 200)).toBe('ignored');
  });

  it('leaves long remarks out', () => {
    expect(guessKind(contentsOf('remark', ['so'.repeat(150), 'short']), 2)).toBe('ignored');
  });

  it('does not take a repeating number for an identifier because of its name', () => {
    const values = ['1', '2', '1', '2', '1', '2', '1', '2'];
    expect(guessKind(contentsOf('case no', values), 8)).toBe('category');
    expect(guessKind(contentsOf('code', values), 8)).toBe('category');
  });
});
