import { describe, expect, it } from 'vitest';
import type { AnalysisResult } from '#shared/analysis';
import {
  balanceOf,
  claimOf,
  phraseOfClaim,
  phraseText,
  tableNotes,
  type Claim,
  type Framing,
} from '#shared/wording';
import { houseStyle, phrasebook } from '../builders/house-styles';
import { ageByClass } from './stratified-scenarios';
import {
  BALANCE_TRAINING,
  LIFTING,
  NIGHT_WORK,
  REMINDERS,
  SCREENS,
  twoGroups,
  UPTAKE,
} from './two-group-scenarios';

/*
 * The numbers were worked out apart from this code, in R 4.2.2, from the formulas of Wilson,
 * Newcombe (method 10), Katz and Woolf, and prop.test without continuity correction:
 *
 *   night work       RD  0.0449 ( 0.0099 to 0.0802)  RR 1.4950 (1.0901 to 2.0503)  p 0.01182
 *   balance training RD -0.0605 (-0.1109 to -0.0099) RR 0.7560 (0.5974 to 0.9566)  p 0.01916
 *   lifting          OR  2.7843 (1.9666 to 3.9420)
 *   screens          RD  0.1524 ( 0.1070 to 0.1970)  RR 1.6154 (1.3961 to 1.8691)
 *   reminders        RD -0.0221 (-0.0849 to 0.0406)  RR 0.8539 (0.5469 to 1.3332)  p 0.48662
 *   uptake           RD  0.1387 ( 0.0701 to 0.2055)  RR 1.3266 (1.1512 to 1.5288)
 *
 * Numbers needed, 1/RD and its limits: -16.520 (-9.017 to -101.435), 7.209 (4.867 to 14.259),
 * -45.261 (-11.774 through infinity to 24.617).
 */

const BOOK = phrasebook();
const STYLE = houseStyle();

function claim(result: AnalysisResult): Claim {
  const made = claimOf(result, {
    analysisId: 'a1',
    indexLevelId: 'index',
    scope: { kind: 'crude' },
  });
  if (!made.ok) {
    throw new Error(JSON.stringify(made.issue));
  }
  return made.value;
}

function sentence(result: AnalysisResult, framing: Framing, style = STYLE): string {
  return phraseText(phraseOfClaim(claim(result), framing, style, BOOK)).replaceAll('\u00a0', ' ');
}

function neededOf(result: AnalysisResult): string | null {
  const { absolute } = balanceOf(claim(result), STYLE, BOOK);
  return absolute.available ? (absolute.secondText?.replaceAll('\u00a0', ' ') ?? null) : null;
}

describe('worked examples', () => {
  it('cohort, both', () => {
    expect(sentence(twoGroups(NIGHT_WORK), 'both')).toBe(
      'The risk of new hypertension within 5 years was 4.5 percentage points higher ' +
        '(95% CI 1.0 to 8.0) among workers with night shifts (84 of 620, 13.5%) than among those ' +
        'with day shifts only (58 of 640, 9.1%), that is, 49% higher ' +
        '(risk ratio 1.49; 95% CI 1.09 to 2.05).',
    );
  });

  it('trial, relative, never without the difference', () => {
    expect(sentence(twoGroups(BALANCE_TRAINING), 'relative')).toBe(
      'The risk of any fall within 12 months was 24% lower (risk ratio 0.76; 95% CI 0.60 to 0.96) ' +
        'among participants assigned to balance training (96 of 512, 18.8%) than among those ' +
        'assigned to usual advice (126 of 508, 24.8%); the difference was −6.1 percentage points ' +
        '(95% CI −11.1 to −1.0).',
    );
  });

  it('trial, unclear: both directions in words', () => {
    expect(sentence(twoGroups(REMINDERS), 'absolute')).toContain(
      'the risk was 2.2 percentage points lower, and the 95% CI is compatible with from ' +
        '8.5 percentage points lower to 4.1 higher.',
    );
    expect(sentence(twoGroups(REMINDERS), 'relative')).toContain(
      'the risk was 15% lower (risk ratio 0.85), and the 95% CI is compatible with from ' +
        '45% lower to 33% higher',
    );
  });

  it('case–control: odds, from twofold on in times', () => {
    expect(sentence(twoGroups(LIFTING), 'absolute')).toBe(
      'Workers who lifted heavy loads made up 142 of 210 cases of back injury (67.6%) and ' +
        '180 of 420 controls (42.9%), and those who did not lift heavy loads the rest; the odds ' +
        'of being in the first group rather than the second were 2.78 times as high ' +
        '(95% CI 1.97 to 3.94) among cases as among controls.',
    );
  });

  it('cross-section: prevalence', () => {
    expect(sentence(twoGroups(SCREENS), 'relative')).toContain(
      'The prevalence of dry-eye symptoms was 62% higher (prevalence ratio 1.62; 95% CI 1.40 to 1.87)',
    );
  });

  it('p-values where the style prints them, on their side of the level', () => {
    const compact = houseStyle('compact-clinical');
    const bracketed = houseStyle('bracketed-social-health');
    expect(sentence(twoGroups(NIGHT_WORK), 'absolute', compact)).toContain('; P = .01)');
    expect(sentence(twoGroups(NIGHT_WORK), 'absolute', bracketed)).toContain(
      '(95% CI [1.0, 8.0], p = .012)',
    );
    expect(sentence(twoGroups(REMINDERS), 'absolute', compact)).toContain('(P = .49)');
  });

  it('numbers needed: up, limits outward, through infinity', () => {
    expect(neededOf(twoGroups(BALANCE_TRAINING))).toBe('NNTB 17 (9 to 102)');
    expect(neededOf(twoGroups(REMINDERS))).toBe('NNTB 46 (NNTB 11 to ∞ to NNTH 24)');
    expect(neededOf(twoGroups(UPTAKE))).toBe('NNTB 8 (4 to 15)');
    expect(neededOf(twoGroups(NIGHT_WORK))).toBe('1 more for every 23 (12 to 102)');
  });

  it('numbers needed are not said of a cross-section, nor where the style says none', () => {
    expect(neededOf(twoGroups(SCREENS))).toBeNull();
    const bulletin = balanceOf(
      claim(twoGroups(BALANCE_TRAINING)),
      houseStyle('public-bulletin'),
      BOOK,
    );
    expect(bulletin.absolute).toMatchObject({ secondText: null });
  });
});

describe('notes', () => {
  const contents = {
    risk: true,
    riskDifference: true,
    riskRatio: true,
    oddsRatio: false,
    crude: true,
    pooled: true,
    trend: true,
  };
  const notesOf = (result: AnalysisResult) =>
    tableNotes({ analysisId: 'a1', result }, contents, STYLE, BOOK).map(phraseText);

  it('name a stratum that the pooled estimates leave out, and why', () => {
    expect(notesOf(ageByClass())).toContain(
      'Crew: there were no children, so the stratum is left out of the pooled estimates.',
    );
  });

  it('say so when the printed difference is not that of the printed shares', () => {
    const rounding = 'Differences were calculated before rounding.';
    // 18.8 - 24.8 would print as 6.0; the exact difference is 6.05.
    expect(notesOf(twoGroups(BALANCE_TRAINING))).toContain(rounding);
    // 40.0 - 24.8 is 15.2, as printed.
    expect(notesOf(twoGroups(SCREENS))).not.toContain(rounding);
  });

  it('say how many records are left out, and why', () => {
    const result = {
      ...twoGroups(SCREENS),
      leftOut: [
        { columnId: 'exposure', reason: 'not answered', count: 31 },
        { columnId: 'outcome', reason: 'lost before 12 months', count: 7 },
      ],
    };
    expect(notesOf(result)).toContain(
      'Left out: 38 records (31 not answered; 7 lost before 12 months).',
    );
  });
});
