import { expect, it } from 'vitest';
import { outcomeReads } from './outcome-reads';

const WORDS = {
  id: 'o1',
  noun: 'hand eczema',
  verbPhrase: 'developed hand eczema',
  timeFrame: '12 months',
  desirability: 'harmful',
} as const;

it('puts the words into a sentence', () => {
  expect(outcomeReads(WORDS, 'workers')).toBe(
    '… of every 100 workers developed hand eczema within 12 months.',
  );
});

it('leaves time out where it has no meaning', () => {
  expect(outcomeReads({ ...WORDS, timeFrame: null }, 'guests')).toBe(
    '… of every 100 guests developed hand eczema.',
  );
});
