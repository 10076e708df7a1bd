import { describe, expect, it } from 'vitest';
import { readValue, numberOf } from '#shared/analysis';
import { intervalLabel } from '#shared/format';
import type { HouseStyle } from '#shared/house-style';
import {
  addressesOfPart,
  claimOf,
  FRAMINGS,
  phraseOfClaim,
  phraseText,
  type Claim,
  type Direction,
  type Framing,
  type Phrase,
  type PhrasePart,
} from '#shared/wording';
import { HOUSE_STYLE_IDS, houseStyle, phrasebook } from '../builders/house-styles';
import { SCENARIOS, type Scenario } from './scenarios';

const BOOK = phrasebook();

interface Said {
  readonly name: string;
  readonly scenario: Scenario;
  readonly claim: Claim;
  readonly framing: Framing;
  readonly style: HouseStyle;
  readonly phrase: Phrase;
}

function everythingSaid(): readonly Said[] {
  return SCENARIOS.flatMap((scenario) =>
    scenario.targets.flatMap((target) => {
      const claim = claimOf(scenario.result, { analysisId: 'a1', ...target });
      if (!claim.ok) {
        throw new Error(JSON.stringify(claim.issue));
      }
      return HOUSE_STYLE_IDS.flatMap((id) =>
        FRAMINGS.map((framing) => ({
          name: `${scenario.name}, ${target.indexLevelId}, ${target.scope.kind}, ${id}, ${framing}`,
          scenario,
          claim: claim.value,
          framing,
          style: houseStyle(id),
          phrase: phraseOfClaim(claim.value, framing, houseStyle(id), BOOK),
        })),
      );
    }),
  );
}

const SAID = everythingSaid();
const text = ({ phrase }: Said) => phraseText(phrase);

/** What is wrong, with the sentence it is wrong in; an empty list is what every rule wants. */
function breaches(rule: (said: Said) => boolean, among = SAID): readonly string[] {
  return among.filter((said) => !rule(said)).map((said) => `${said.name}: ${text(said)}`);
}

/** Words that come from the study, not from the phrasebook. */
function ownWords({ claim }: Said): readonly string[] {
  const { outcome, index, reference, exposureSentenceLabel, stratum } = claim;
  return [
    outcome.noun,
    outcome.verbPhrase,
    outcome.timeFrame ?? '',
    index.level.sentenceLabel,
    reference.level.sentenceLabel,
    exposureSentenceLabel,
    stratum?.sentenceLabel ?? '',
  ].filter((words) => words !== '');
}

function generatedText(said: Said): string {
  return ownWords(said).reduce((left, words) => left.replaceAll(words, '…'), text(said));
}

describe('every generated sentence', () => {
  it('is a whole sentence', () => {
    expect(breaches((said) => /^[A-Z].*[^.]\.$/s.test(text(said)))).toEqual([]);
    expect(
      breaches((said) => !/ {2}| [,.;)]|\( |[{}~]|undefined|NaN|null|\.\./.test(text(said))),
    ).toEqual([]);
  });

  it('begins with no numeral', () => {
    expect(breaches((said) => !/^\d/.test(text(said)))).toEqual([]);
  });

  it('has no hyphen for a minus, and no dash beside one', () => {
    expect(breaches((said) => !/(^|[\s([])-\d|–\s*−|−[\d.,]+–/.test(text(said)))).toEqual([]);
  });

  it('keeps both groups’ counts, and their shares where the groups are large enough', () => {
    const counts = ({ claim, phrase }: Said) =>
      [claim.index, claim.reference].every(({ level }) =>
        claim.design === 'caseControl'
          ? phrase.parts.some((part) => part.kind === 'group' && part.levelId === level.id)
          : (['events', 'total', 'risk'] as const).every(
              (quantity) =>
                (quantity === 'risk' && tooSmall(claim, level.id)) ||
                phrase.parts.some((part) =>
                  addressesOfPart(part).some(
                    (address) => address.quantity === quantity && address.levelId === level.id,
                  ),
                ),
            ),
      );
    expect(breaches(counts)).toEqual([]);
  });

  it('gives cases and controls with their wholes and shares', () => {
    const among = SAID.filter(({ claim }) => claim.design === 'caseControl');
    const wanted = ['events', 'comparedCases', 'controls', 'comparedControls'];
    expect(
      breaches(
        ({ phrase }) =>
          wanted.every((quantity) =>
            phrase.parts.some((part) =>
              addressesOfPart(part).some((address) => address.quantity === quantity),
            ),
          ),
        among,
      ),
    ).toEqual([]);
  });

  it('names the time frame where the outcome has one', () => {
    expect(breaches((said) => text(said).includes(said.claim.outcome.timeFrame ?? ''))).toEqual([]);
  });

  it('never mixes percent and percentage points', () => {
    const mixed = /%[\s\u00a0]*(percentage )?points|points (higher|lower) \d+%/;
    expect(breaches((said) => !mixed.test(text(said)))).toEqual([]);
    const bound = ({ phrase }: Said) =>
      phrase.parts.every((part) => {
        const quantities = addressesOfPart(part).map(({ quantity }) => quantity);
        return !quantities.includes('riskDifference') || !part.text.includes('%');
      });
    expect(breaches(bound)).toEqual([]);
  });

  it('says times as high, never times higher', () => {
    const wrong = /(times|fold)[\s\u00a0-]+(higher|greater|more|lower|less|fewer|smaller)/i;
    expect(breaches((said) => !wrong.test(text(said)))).toEqual([]);
  });

  it('claims no absence of a difference', () => {
    const claims =
      /no (effect|association)|no difference|did not differ|ineffective|\b(same|equal|equivalent|comparable|similar|safe)\b/i;
    const said = (one: Said) =>
      generatedText(one)
        .replace('no clear evidence of a difference', '')
        .replace(/compatible with from no difference|to no difference/, '');
    expect(breaches((one) => !claims.test(said(one)))).toEqual([]);
  });

  it('leans on no near-significance and on no cause', () => {
    const significance =
      /trend toward|trending|marginal|borderline|nearly|almost|approach|narrowly|suggestive|hint of|numerically|tended|tendency|significan|underpowered|n\.s\.|\bNS\b/i;
    const cause =
      /\b(caused?|due to|led to|result(ed|s) in|because of|attributable|reduced|increased|prevented|protective|impact|influence|went with|went from|rose|fell)\b/i;
    expect(breaches((said) => !significance.test(generatedText(said)))).toEqual([]);
    expect(breaches((said) => !cause.test(generatedText(said)))).toEqual([]);
  });

  it('speaks of odds as odds', () => {
    const among = SAID.filter(({ claim }) => claim.design === 'caseControl');
    const wrong = /risk|likel|probab|chance|incidence|prevalence|percentage point/i;
    expect(breaches((said) => !wrong.test(generatedText(said)), among)).toEqual([]);
    expect(breaches((said) => /\bodds\b|\bOR\b/.test(text(said)), among)).toEqual([]);
  });

  it('speaks of prevalence in a cross-section, and of risk only where people were followed', () => {
    const among = SAID.filter(({ claim }) =>
      ['crossSectional', 'surveillance'].includes(claim.design),
    );
    const wrong = /\b(risk|incidence|rate|developed|led)\b/i;
    expect(breaches((said) => !wrong.test(generatedText(said)), among)).toEqual([]);
  });

  it('of a trial never gives the relative effect without the absolute one', () => {
    const among = SAID.filter(({ claim }) => claim.design === 'trial');
    const hasDifference = ({ phrase }: Said) =>
      ['value', 'lower', 'upper'].every((facet) =>
        phrase.parts.some((part) =>
          addressesOfPart(part).some(
            (address) => address.quantity === 'riskDifference' && address.facet === facet,
          ),
        ),
      );
    expect(breaches(hasDifference, among)).toEqual([]);
  });

  it('says that it is post hoc, pooled, crude among strata, or within a stratum', () => {
    const says = (said: Said) => {
      const { claim } = said;
      const words = text(said);
      return (
        (claim.planned !== 'postHoc' || words.startsWith('In a post hoc analysis, ')) &&
        (claim.scope.kind !== 'pooled' || words.includes('(Mantel–Haenszel)')) &&
        (claim.scope.kind !== 'crude' ||
          claim.strataLabel === null ||
          words.startsWith(`Without stratifying by ${claim.strataLabel}`)) &&
        (claim.stratum === null || words.includes(claim.stratum.sentenceLabel))
      );
    };
    expect(breaches(says)).toEqual([]);
  });

  it('ends on both limits where the interval holds no effect', () => {
    const unclear = SAID.filter(({ claim, framing }) => {
      const measure =
        claim.design === 'caseControl'
          ? 'oddsRatio'
          : framing === 'relative'
            ? 'riskRatio'
            : 'riskDifference';
      const estimate = claim.measures[measure];
      const none = measure === 'riskDifference' ? 0 : 1;
      return (
        estimate.ok &&
        estimate.value.interval.lower <= none &&
        estimate.value.interval.upper >= none &&
        estimate.value.interval.lower < estimate.value.interval.upper
      );
    });
    expect(unclear.length).toBeGreaterThan(20);
    const bothWays = /no clear evidence of a difference .* is compatible with from .* to /;
    expect(breaches((said) => bothWays.test(text(said)), unclear)).toEqual([]);
  });

  it('points where the estimate points', () => {
    const agrees = ({ phrase, claim }: Said) =>
      phrase.parts.every((part, place) => {
        if (part.kind !== 'direction') {
          return true;
        }
        const size = lastNumberBefore(phrase.parts, place);
        return size === null || part.direction === directionAt(claim, size);
      });
    expect(breaches(agrees)).toEqual([]);
  });

  it('binds every number', () => {
    const bound = (said: Said) =>
      said.phrase.parts
        .filter((part) => part.kind === 'text')
        .every((part) => !/\d/.test(withoutGivenWords(part.text, said)));
    expect(breaches(bound)).toEqual([]);
  });

  it('prints what its addresses hold, correctly rounded', () => {
    const wrong = SAID.flatMap((said) =>
      said.phrase.parts.flatMap((part) => wrongNumbers(part, said)),
    );
    expect(wrong).toEqual([]);
  });
});

function tooSmall({ index, reference, precision }: Claim, levelId: string): boolean {
  const group = [index, reference].find(({ level }) => level.id === levelId);
  return precision.groups.length > 0 && (group?.count.total ?? 0) < 20;
}

function lastNumberBefore(parts: readonly PhrasePart[], place: number) {
  const before = parts.slice(0, place).findLast((part) => part.kind === 'value');
  return before?.kind === 'value' ? before.address : null;
}

function directionAt(
  { measures }: Claim,
  { quantity, facet }: NonNullable<ReturnType<typeof lastNumberBefore>>,
): Direction | null {
  if (quantity !== 'riskDifference' && quantity !== 'riskRatio' && quantity !== 'oddsRatio') {
    return null;
  }
  const estimate = measures[quantity];
  if (!estimate.ok) {
    return null;
  }
  const { value, interval } = estimate.value;
  const number = facet === 'lower' || facet === 'upper' ? interval[facet] : value;
  const none = quantity === 'riskDifference' ? 0 : 1;
  return number > none ? 'higher' : number < none ? 'lower' : 'same';
}

/** Digits that stand for no result: level, time frame, units, the study's own words. */
function withoutGivenWords(words: string, said: Said): string {
  const given = [intervalLabel(said.claim.level, said.style), 'per\u00a01,000', ...ownWords(said)];
  return given.reduce((left, one) => left.replaceAll(one, ''), words);
}

function wrongNumbers(part: PhrasePart, { scenario, claim, name }: Said): readonly string[] {
  const printed = part.text.match(/−?[\d.,\u202f]*\d/g) ?? [];
  return addressesOfPart(part).flatMap((address, place) => {
    const read = readValue(scenario.result, address);
    const figure = printed[place];
    if (!read.ok || figure === undefined) {
      return [`${name}: nothing at ${JSON.stringify(address)} for "${part.text}"`];
    }
    const number = Number(figure.replace('−', '-').replace(/[\u202f,]/g, ''));
    const decimals = (figure.split('.')[1] ?? '').length;
    const wanted = wantedNumber(numberOf(read.value), part.text, address.quantity);
    const half = 0.5 * 10 ** -decimals + 1e-9;
    const near = wanted.some(
      (candidate) => Math.abs(Math.abs(number) - Math.abs(candidate)) <= half,
    );
    const isBound = address.facet === 'pValue' && (number <= 0.01 || number >= 0.9);
    return near || isBound
      ? []
      : [`${name}: ${figure} for ${wanted.join(' or ')} of ${claim.analysisId}`];
  });
}

/** A ratio in percent comes from its printed value, of one to three decimals. */
function wantedNumber(value: number, words: string, quantity: string): readonly number[] {
  if (quantity === 'riskRatio' || quantity === 'oddsRatio') {
    const printed = [10, 100, 1000].map((unit) => Math.round(value * unit) / unit);
    return words.includes('%') ? printed.map((ratio) => (ratio - 1) * 100) : [value];
  }
  if (quantity === 'riskDifference') {
    return [value * 100, value * 1000];
  }
  const isShare = quantity === 'risk' || quantity.startsWith('shareOf');
  return [isShare ? value * 100 : value];
}
