import { expect, it } from 'vitest';
import { listValues } from '#shared/analysis';
import type { ValueAddress } from '#shared/analysis';
import { phrasebook } from '../builders/house-styles';
import { pinned } from '../builders/reports';
import { wetWorkResult } from '../builders/results';
import { valueWords } from '#shared/report';

const PIN = pinned(wetWorkResult());

function wordsAt(changes: Partial<ValueAddress>): string {
  const address: ValueAddress = {
    analysisId: 'a1',
    quantity: 'risk',
    levelId: 'over6',
    scope: { kind: 'crude' },
    facet: 'value',
    ...changes,
  };
  const { what, whom, where } = valueWords(address, PIN, phrasebook());
  return [what, whom, where].join(' | ');
}

it('names what a value is, of whom, and where', () => {
  expect(wordsAt({ quantity: 'riskDifference', facet: 'lower' })).toBe(
    'Risk difference, lower limit | Wet work per shift: Over 6 h against None | All strata together',
  );
  expect(wordsAt({ scope: { kind: 'stratum', stratumId: 'ward' } })).toBe(
    'Risk | Wet work per shift: Over 6 h | hospital wards',
  );
  expect(wordsAt({ quantity: 'counted', levelId: null })).toBe(
    'Records counted | All levels | All strata together',
  );
});

it('tells every value of a result from every other', () => {
  const words = listValues(PIN.result, 'a1').map(({ address }) =>
    JSON.stringify(valueWords(address, PIN, phrasebook())),
  );
  expect(new Set(words).size).toBe(words.length);
});
