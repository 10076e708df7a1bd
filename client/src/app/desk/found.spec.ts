import { expect, it } from 'vitest';
import type { ShelvedStudy } from './desk-store';
import { found } from './found';

function shelved(id: string, title: string, reports: readonly string[]): ShelvedStudy {
  return {
    study: { id, title },
    reports: reports.map((each) => ({ id: `${id}-${each}`, title: each })),
  } as unknown as ShelvedStudy;
}

const SHELF = [
  shelved('s1', 'Wet work and hand eczema', ['Twelve-month results', 'Board summary']),
  shelved('s2', 'Harbour supper outbreak', ['Results for the board']),
];

function titles(text: string): string[] {
  return found(text, SHELF).map(({ title }) => title);
}

it('finds titles that have every word, in any order and any case', () => {
  expect(titles('eczema WET')).toEqual(['Wet work and hand eczema']);
  expect(titles('board')).toEqual(['Board summary', 'Results for the board']);
});

it('finds parts of words, and nothing for nothing', () => {
  expect(titles('outbr')).toEqual(['Harbour supper outbreak']);
  expect(titles('  ')).toEqual([]);
  expect(titles('board eczema')).toEqual([]);
});

it('leads to what was found', () => {
  expect(found('summary', SHELF)[0]!.link).toEqual([
    '/studies',
    's1',
    'reports',
    's1-Board summary',
  ]);
});
