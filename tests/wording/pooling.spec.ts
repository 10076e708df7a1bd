import { describe, expect, it } from 'vitest';
import type { AnalysisResult } from '#shared/analysis';
import { claimOf, phraseOfClaim, phraseText, tableNotes } from '#shared/wording';
import { resultOf } from '../../shared/analysis/testing/counts-analysis';
import { houseStyle, phrasebook } from '../builders/house-styles';

/** Invented: two strata, pooled as it is named. */
function pooledBy(poolings: Readonly<Record<string, string>>): AnalysisResult {
  const counts = {
    young: [
      [5, 120],
      [8, 106],
    ],
    old: [
      [16, 85],
      [22, 98],
    ],
  } as const;
  return resultOf({ levels: ['no', 'yes'], counts, specification: { otherMethods: { poolings } } });
}

function sentenceOf(result: AnalysisResult): string {
  const target = { analysisId: 'a', indexLevelId: 'yes', scope: { kind: 'pooled' } } as const;
  const claim = claimOf(result, target);
  if (!claim.ok) throw new Error(claim.issue.code);
  const phrase = phraseOfClaim(claim.value, 'both', houseStyle(), phrasebook());
  return phraseText(phrase).replaceAll('\u00a0', ' ');
}

function notesOf(result: AnalysisResult): string {
  const contents = { risk: true, riskDifference: true, riskRatio: true, oddsRatio: false };
  const rows = { crude: false, pooled: true, trend: false };
  const analysis = { analysisId: 'a', result };
  const notes = tableNotes(analysis, { ...contents, ...rows }, houseStyle(), phrasebook());
  return notes.map(phraseText).join(' ');
}

describe('the way in which strata were pooled', () => {
  it.each([
    [{}, '(Mantel–Haenszel)'],
    [
      { riskDifference: 'standardisedToAll', riskRatio: 'standardisedToAll' },
      '(direct standardisation)',
    ],
    [{ riskRatio: 'standardisedToIndex' }, '(Mantel–Haenszel; direct standardisation)'],
  ])('%j is said by the sentence', (poolings, words) => {
    expect(sentenceOf(pooledBy(poolings))).toContain(words);
  });

  it('is said with its population by the notes', () => {
    expect(notesOf(pooledBy({ riskRatio: 'standardisedToReference' }))).toContain(
      'Mantel–Haenszel (Sato) for the risk difference; ' +
        'standardised to the reference group for the risk ratio.',
    );
  });
});
