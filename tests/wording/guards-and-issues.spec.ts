import { describe, expect, it } from 'vitest';
import {
  findGuards,
  GUARDS,
  type AnalysisResult,
  type GuardFinding,
  type GuardId,
} from '#shared/analysis';
import { guardWords, issueWords, type WordedIssueCode } from '#shared/wording';
import { REASON_SLOTS } from '#shared/wording/phrasebook/reason-slots';
import { analysisOfCounts, level } from '../builders/analysis-of-counts';
import { HOUSE_STYLE_IDS, houseStyle, phrasebook } from '../builders/house-styles';
import { SCENARIOS } from './scenarios';
import { NIGHT_WORK, twoGroups } from './two-group-scenarios';

const BOOK = phrasebook();

const REPEATED = {
  repeatedIdentifiers: {
    columnId: 'person',
    columnLabel: 'Person number',
    identifiers: 12,
    records: 27,
  },
};

function bandsOf(ordered: boolean): AnalysisResult {
  return analysisOfCounts({
    frame: {
      design: 'cohort',
      peopleNoun: 'workers',
      population: '',
      outcome: {
        id: 'o',
        noun: 'new hypertension',
        verbPhrase: 'developed hypertension',
        timeFrame: null,
        desirability: 'harmful',
      },
      exposure: {
        columnId: 'hours',
        label: 'Hours',
        sentenceLabel: 'hours',
        unit: 'h',
        ordered,
        levels: [level('c', '80+'), level('a', '0-39'), level('b', '40-79')],
        referenceLevelId: 'a',
      },
    },
    counts: { '': { a: [10, 100], b: [12, 100], c: [15, 100] } },
  });
}

interface Found {
  readonly result: AnalysisResult;
  readonly finding: GuardFinding;
}

function found(result: AnalysisResult): readonly Found[] {
  return findGuards(result, REPEATED).map((finding) => ({ result, finding }));
}

const FOUND = [
  ...SCENARIOS.flatMap(({ result }) => found(result)),
  ...found(bandsOf(true)),
  ...found(bandsOf(false)),
  ...found(twoGroups({ ...NIGHT_WORK, reference: ['day shifts only', 0, 0] })),
];

function say({ result, finding }: Found, style = houseStyle()) {
  return guardWords(finding, { analysisId: 'a1', result }, style, BOOK);
}

describe('the words of the guards', () => {
  it('exist for every guard that there is, and every one was found here', () => {
    const ids = [...new Set(FOUND.map(({ finding }) => finding.guardId))];
    expect(ids.toSorted()).toEqual((Object.keys(GUARDS) as GuardId[]).toSorted());
  });

  it.each(HOUSE_STYLE_IDS)('are whole sentences under %s', (id) => {
    for (const one of FOUND) {
      const { title, sentence, source } = say(one, houseStyle(id));
      expect(title).toMatch(/^[A-Z][^.]*$/);
      expect(sentence).toMatch(/^[^\s\d].*[^.]\.$/s);
      expect(sentence).not.toMatch(/NaN|undefined|null|[{}~]| {2}|(^|\s)-\d|: \.|\(\)/);
      expect(source).not.toBe('');
    }
  });

  it('state both numbers where pooling turns an effect round', () => {
    const turned = FOUND.find(({ finding }) => finding.guardId === 'turnedRound');
    const sentence = turned && say(turned).sentence.replaceAll('\u00a0', ' ');
    expect(sentence).toContain('+14.2 percentage points without stratification');
    expect(sentence).toContain('−1.8 percentage points after stratifying by department');
  });

  it('say how much further from 1 an odds ratio lies', () => {
    const common = FOUND.find(
      ({ finding, result }) =>
        finding.guardId === 'commonOutcome' && result.frame.design === 'crossSectional',
    );
    expect(common && say(common).sentence).toContain(
      'the odds ratio 2.03 lies 25% further from 1 than the prevalence ratio 1.62',
    );
  });
});

describe('the words of the issues', () => {
  const codes = Object.keys(REASON_SLOTS)
    .filter((key) => key.startsWith('issue.'))
    .map((key) => key.slice('issue.'.length) as WordedIssueCode);

  it.each(codes)('%s follows "because"', (code) => {
    const words = issueWords({ code, facts: { role: 'exposure' } }, BOOK);
    expect(words).toMatch(/^[a-z].*[^.]$/);
    expect(words).not.toMatch(/[{}~]|undefined/);
  });
});
