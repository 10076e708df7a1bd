import { describe, expect, it } from 'vitest';
import { orderCodes } from './level-order';

const CASES: readonly {
  readonly codes: string[];
  readonly ordered: string[];
  readonly ground: string;
}[] = [
  {
    codes: ['120+', '0-39g/day', '80-119', '40-79'],
    ordered: ['0-39g/day', '40-79', '80-119', '120+'],
    ground: 'bounds',
  },
  {
    codes: ['10-19', '0-9g/day', '30+', '20-29'],
    ordered: ['0-9g/day', '10-19', '20-29', '30+'],
    ground: 'bounds',
  },
  { codes: ['75+', '25-34', '65-74'], ordered: ['25-34', '65-74', '75+'], ground: 'bounds' },
  {
    codes: ['2\u20134 h', '< 2 h', 'over 6 h', 'None', '4 to 6 h'],
    ordered: ['None', '< 2 h', '2\u20134 h', '4 to 6 h', 'over 6 h'],
    ground: 'bounds',
  },
  {
    codes: ['≥ 65', '18 to < 65', 'under 18'],
    ordered: ['under 18', '18 to < 65', '≥ 65'],
    ground: 'bounds',
  },
  { codes: ['10', '9', '-1'], ordered: ['-1', '9', '10'], ground: 'numbers' },
  { codes: ['Site 12', 'Site 2'], ordered: ['Site 2', 'Site 12'], ground: 'numbers' },
  {
    codes: ['Crew', '3rd', '1st', '2nd'],
    ordered: ['1st', '2nd', '3rd', 'Crew'],
    ground: 'partly',
  },
  { codes: ['B', 'C', 'A'], ordered: ['A', 'B', 'C'], ground: 'letters' },
  {
    codes: ['Severe', 'None', 'Moderate', 'Mild'],
    ordered: ['None', 'Mild', 'Moderate', 'Severe'],
    ground: 'words',
  },
  { codes: ['III', 'I', 'II'], ordered: ['I', 'II', 'III'], ground: 'words' },
  { codes: ['Child', 'Adult'], ordered: ['Child', 'Adult'], ground: 'appearance' },
  {
    codes: ['Kitchen', 'Ward 3', 'Office'],
    ordered: ['Kitchen', 'Ward 3', 'Office'],
    ground: 'appearance',
  },
  { codes: ['none', 'low', '9'], ordered: ['none', 'low', '9'], ground: 'appearance' },
  { codes: ['only'], ordered: ['only'], ground: 'appearance' },
];

describe('orderCodes', () => {
  it.each(CASES)('puts $codes in order by $ground', ({ codes, ordered, ground }) => {
    expect(orderCodes(codes)).toEqual({ codes: ordered, ground });
  });

  it('keeps every code, whatever the order of appearance', () => {
    const codes = ['30+', '0-9', '10-19', '20-29'];
    expect(orderCodes([...codes].reverse()).codes).toEqual(orderCodes(codes).codes);
  });
});
