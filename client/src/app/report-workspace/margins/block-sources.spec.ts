import {
  addressKey,
  type AddressFacet,
  type ResultScope,
  type ValueAddress,
} from '#shared/analysis';
import type { PinnedAnalysis } from '#shared/report';
import { describe, expect, it } from 'vitest';
import { NOTHING_PRINTED, type PrintedBlock } from '../proof/printed-block';
import { blockSources, countWords, inStepWith } from './block-sources';

const WARD: ResultScope = { kind: 'stratum', stratumId: 'ward' };
const level = (id: string, label: string) => ({ id, label, sentenceLabel: label });
const PIN = {
  analysisId: 'a2',
  number: 'A2',
  name: 'within workplace',
  resultId: 'r2',
  cut: { id: 'c3', number: 3, dataDate: '2025-11-14' },
  result: {
    specification: { methods: { risk: 'wilson', riskDifference: 'newcombe', riskRatio: 'katz' } },
    frame: {
      peopleNoun: 'workers',
      exposure: {
        levels: [level('none', 'None'), level('over6', 'Over 6 h')],
        referenceLevelId: 'none',
      },
      strata: [level('ward', 'Hospital ward')],
    },
    pooled: [],
  },
} as unknown as PinnedAnalysis;
const PINS = new Map([['a2', PIN]]);

function effect(facet: AddressFacet, scope = WARD): ValueAddress {
  return { analysisId: 'a2', quantity: 'riskDifference', levelId: 'over6', scope, facet };
}

function printed(
  numbers: readonly (readonly [ValueAddress, string])[],
  changes = {},
): PrintedBlock {
  return {
    ...NOTHING_PRINTED,
    bound: numbers.map(([address, text]) => ({ blockId: 'b', address, text })),
    figures: new Map(numbers.map(([address, text]) => [addressKey(address), text])),
    ...changes,
  };
}

describe('the sources of a block', () => {
  it('name the one contrast that it speaks of, and the cut', () => {
    const block = printed([
      [effect('value'), '16.2'],
      [effect('lower'), '9.7'],
    ]);
    expect(blockSources(block, PINS)).toMatchObject({
      name: 'A2, hospital ward',
      lines: ['Over 6 h against none', 'Cut 3, 14 Nov 2025'],
    });
  });

  it('name the analysis and its methods when it speaks of several', () => {
    const block = printed([
      [effect('lower'), '9.7'],
      [effect('upper', { kind: 'crude' }), '23.4'],
    ]);
    expect(blockSources(block, PINS)).toMatchObject({
      name: 'A2, within workplace',
      lines: ['Cut 3, 14 Nov 2025', 'Differences: Newcombe'],
    });
  });

  it('are none for a block without numbers', () => {
    expect(blockSources(NOTHING_PRINTED, PINS)).toBeNull();
  });

  it('count what has a source and what has none', () => {
    const block = printed([[effect('value'), '16.2']], { typed: ['22%'], missing: 1 });
    expect(countWords(blockSources(block, PINS)!.count)).toBe('1 of 3 numbers bound');
  });
});

describe('being in step', () => {
  const caption = { label: 'Table', number: 2, runs: [] } as const;
  const sentence = printed([[effect('value'), '16.2']]);
  const places = new Map([[addressKey(effect('value')), 't']]);
  const stepOf = (text: string): string | null =>
    inStepWith(
      's',
      new Map([
        ['s', sentence],
        ['t', printed([[effect('value'), text]], { caption })],
      ]),
      places,
    );

  it('names the table that prints the same figures', () => {
    expect(stepOf('16.2')).toBe('Table 2');
  });

  it('is not claimed of other figures for the same value', () => {
    expect(stepOf('16')).toBeNull();
  });
});
