import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { AnalysisResult } from '#shared/analysis';
import type { StudyDesign } from '#shared/effects';
import {
  claimOf,
  FRAMINGS,
  phraseOfClaim,
  phraseText,
  type Claim,
  type Direction,
  type Framing,
  type Phrase,
} from '#shared/wording';
import { HOUSE_STYLE_IDS, houseStyle, phrasebook } from '../builders/house-styles';
import { wetWork } from './stratified-scenarios';
import { BALANCE_TRAINING, NIGHT_WORK, REMINDERS, twoGroups, UPTAKE } from './two-group-scenarios';
import type { TwoGroups } from './two-group-scenarios';

const BOOK = phrasebook();
const STYLES = HOUSE_STYLE_IDS.map((id) => houseStyle(id));

function claim(result: AnalysisResult, indexLevelId: string, scope: Claim['scope']): Claim {
  const made = claimOf(result, { analysisId: 'a1', indexLevelId, scope });
  if (!made.ok) {
    throw new Error(JSON.stringify(made.issue));
  }
  return made.value;
}

interface Pair {
  readonly name: string;
  readonly claim: Claim;
  readonly reversed: Claim;
}

function pairOf(name: string, groups: TwoGroups): Pair {
  const crude = { kind: 'crude' } as const;
  return {
    name,
    claim: claim(twoGroups(groups), 'index', crude),
    reversed: claim(
      twoGroups({ ...groups, index: groups.reference, reference: groups.index }),
      'index',
      crude,
    ),
  };
}

const PAIRS: readonly Pair[] = [
  pairOf('cohort', NIGHT_WORK),
  pairOf('trial', BALANCE_TRAINING),
  pairOf('unclear trial', REMINDERS),
  pairOf('beneficial trial', UPTAKE),
  ...[{ kind: 'stratum', stratumId: 'kitchen' } as const, { kind: 'pooled' } as const].map(
    (scope) => ({
      name: `wet work, ${scope.kind}`,
      claim: claim(wetWork('none'), 'over6', scope),
      reversed: claim(wetWork('over6'), 'none', scope),
    }),
  ),
];

function directions(phrase: Phrase): readonly Direction[] {
  return phrase.parts.flatMap((part) => (part.kind === 'direction' ? [part.direction] : []));
}

/** Sizes and limits of the difference as printed, in ascending order: what a reader compares. */
function differenceSizes(phrase: Phrase): readonly string[] {
  return phrase.parts
    .flatMap((part) => {
      const address =
        part.kind === 'value' ? part.address : part.kind === 'limits' ? part.lower : null;
      return address?.quantity === 'riskDifference' ? (part.text.match(/[\d.]+/g) ?? []) : [];
    })
    .toSorted();
}

const OPPOSITE: Readonly<Record<Direction, Direction>> = {
  higher: 'lower',
  lower: 'higher',
  same: 'same',
};

describe('reversing a contrast', () => {
  it.each(PAIRS)('$name: turns every direction word', ({ claim: one, reversed }) => {
    for (const style of STYLES) {
      const said = directions(phraseOfClaim(one, 'absolute', style, BOOK));
      const back = directions(phraseOfClaim(reversed, 'absolute', style, BOOK));
      expect(said.length).toBeGreaterThan(0);
      expect(back[0]).toBe(OPPOSITE[said[0]!]);
      expect(back.toSorted()).toEqual(said.map((direction) => OPPOSITE[direction]).toSorted());
    }
  });

  it.each(PAIRS)('$name: keeps every magnitude of the difference', ({ claim: one, reversed }) => {
    for (const style of STYLES) {
      const said = differenceSizes(phraseOfClaim(one, 'absolute', style, BOOK));
      const back = differenceSizes(phraseOfClaim(reversed, 'absolute', style, BOOK));
      expect(said).toHaveLength(3);
      expect(back).toEqual(said);
    }
  });

  it.each(PAIRS)('$name: exchanges the groups', ({ claim: one, reversed }) => {
    const groups = (from: Claim) =>
      phraseOfClaim(from, 'both', STYLES[1]!, BOOK).parts.flatMap((part) =>
        part.kind === 'group' ? [part.levelId] : [],
      );
    expect(reversed.index.level.sentenceLabel).toBe(one.reference.level.sentenceLabel);
    expect(groups(reversed)).toEqual([reversed.index.level.id, reversed.reference.level.id]);
  });

  it('swaps signed limits and their signs', () => {
    const pair = PAIRS[1]!;
    const tail = (from: Claim) =>
      phraseText(phraseOfClaim(from, 'relative', STYLES[1]!, BOOK))
        .replaceAll('\u00a0', ' ')
        .split('; the difference was ')[1];
    expect(tail(pair.claim)).toBe('−6.1 percentage points (95% CI −11.1 to −1.0).');
    expect(tail(pair.reversed)).toBe('+6.1 percentage points (95% CI 1.0 to 11.1).');
  });

  it('inverts the ratio, and says a rise from twofold on in times', () => {
    const pair = PAIRS[4]!;
    const said = (from: Claim) =>
      phraseText(phraseOfClaim(from, 'relative', STYLES[1]!, BOOK)).replaceAll('\u00a0', ' ');
    expect(said(pair.claim)).toContain('was 6.33 times as high (95% CI 2.34 to 17.14)');
    expect(said(pair.reversed)).toContain('was 84% lower (risk ratio 0.16; 95% CI 0.06 to 0.43)');
  });
});

describe('a sentence of any counts', () => {
  const counted = fc
    .integer({ min: 0, max: 400 })
    .chain((total) => fc.tuple(fc.integer({ min: 0, max: total }), fc.constant(total)));
  const design = fc.constantFrom<StudyDesign>(
    'cohort',
    'trial',
    'caseControl',
    'crossSectional',
    'surveillance',
  );

  function wellFormed(text: string): boolean {
    return (
      /^[A-Z].*[^.]\.$/s.test(text) &&
      !/NaN|Infinity|undefined|null|[{}~]| {2}|\.\.|(^|[\s([])-\d/.test(text)
    );
  }

  it('is well formed, keeps the counts and points the right way', () => {
    fc.assert(
      fc.property(
        counted,
        counted,
        design,
        fc.constantFrom<Framing>(...FRAMINGS),
        fc.constantFrom(...STYLES),
        ([events, total], [referenceEvents, referenceTotal], studyDesign, framing, style) => {
          fc.pre(total + referenceTotal > 0);
          const result = twoGroups({
            ...NIGHT_WORK,
            design: studyDesign,
            index: ['night shifts', events, total],
            reference: ['day shifts only', referenceEvents, referenceTotal],
          });
          const made = claim(result, 'index', { kind: 'crude' });
          const phrase = phraseOfClaim(made, framing, style, BOOK);
          const text = phraseText(phrase);
          expect(wellFormed(text), text).toBe(true);
          const difference = made.measures.riskDifference;
          const first = directions(phrase)[0];
          if (difference.ok && framing === 'absolute' && first !== undefined) {
            const points = difference.value.value > 0 ? 'higher' : 'lower';
            const unclear = text.includes('no clear evidence');
            expect(unclear || first === points, text).toBe(true);
          }
        },
      ),
      { numRuns: 400 },
    );
  });
});
