import { describe, expect, it } from 'vitest';
import { findGuards } from '#shared/analysis';
import { EFFECT_MEASURE_IDS } from '#shared/effects';
import {
  altTextOf,
  balanceOf,
  claimOf,
  contrastSentence,
  figureNotes,
  figureTitle,
  guardWords,
  homogeneityWords,
  methodsNoteOf,
  phraseOfClaim,
  phraseText,
  tableNotes,
  tableTitle,
  availableFramings,
  type Balance,
  type Claim,
  type ContrastWords,
} from '#shared/wording';
import { HOUSE_STYLE_IDS, houseStyle, phrasebook } from '../builders/house-styles';
import { SCENARIOS, type Scenario } from './scenarios';

const BOOK = phrasebook();
const PLAIN = 'open-clinical';

/** No-break spaces are shown as an open box, so that a reader of the table sees them. */
function shown(text: string): string {
  return text.replaceAll('\u00a0', '␣').replaceAll('\u202f', '␣');
}

function claimsOf({ result, targets }: Scenario): readonly Claim[] {
  return targets.map((target) => {
    const claim = claimOf(result, { analysisId: 'a1', ...target });
    if (!claim.ok) {
      throw new Error(JSON.stringify(claim.issue));
    }
    return claim.value;
  });
}

function scopeName({ scope, stratum }: Claim): string {
  return stratum ? `stratum ${stratum.label}` : scope.kind;
}

function sentencesOf(scenario: Scenario): string {
  return claimsOf(scenario)
    .map((claim) => {
      const groups = `${claim.index.level.label} against ${claim.reference.level.label}`;
      const head = `### ${groups}, ${scopeName(claim)}`;
      const lines = HOUSE_STYLE_IDS.map((id) => {
        const said = availableFramings(claim).map((framing) => {
          const phrase = phraseOfClaim(claim, framing, houseStyle(id), BOOK);
          return `- ${framing}: ${shown(phraseText(phrase))}`;
        });
        return [id, ...said].join('\n');
      });
      return [head, ...lines, balanceLine(balanceOf(claim, houseStyle(PLAIN), BOOK))].join('\n\n');
    })
    .join('\n\n');
}

function balanceLine(balance: Balance): string {
  const side = (name: 'absolute' | 'relative') => {
    const one = balance[name];
    return one.available
      ? [`${one.sizeText} ${one.unitText}`, one.intervalText, one.secondText]
          .filter(Boolean)
          .join(' · ')
      : one.reason;
  };
  return shown(`balance\n- ${side('absolute')}\n- ${side('relative')}\n- ${balance.name}`);
}

const SHOW_ALL = {
  risk: true,
  riskDifference: true,
  riskRatio: true,
  oddsRatio: true,
  crude: true,
  pooled: true,
  trend: true,
};

function contrastWords({ result }: Scenario): ContrastWords {
  const { outcome, exposure, strata } = result.frame;
  const reference = exposure.levels.find(({ id }) => id === exposure.referenceLevelId);
  return {
    outcome: outcome.noun,
    timeFrame: outcome.timeFrame,
    exposure: exposure.sentenceLabel,
    reference: reference?.sentenceLabel ?? '',
    strata: strata[0]?.within?.[0]?.columnLabel ?? null,
  };
}

function printOf(scenario: Scenario): string {
  const { result } = scenario;
  const analysis = { analysisId: 'a1', result };
  const style = houseStyle(PLAIN);
  const guards = findGuards(result).map((finding) => {
    const { title, sentence } = guardWords(finding, analysis, style, BOOK);
    return `- guard: ${title}. ${sentence}`;
  });
  const contrast = contrastSentence(contrastWords(scenario), BOOK)
    .map((part) => (part.kind === 'picker' ? `[${part.text}]` : part.text))
    .join('');
  return shown(
    [
      `- contrast: ${contrast}`,
      ...(result.pooled.length === 0
        ? []
        : [`- homogeneity: ${homogeneityWords(result, EFFECT_MEASURE_IDS, BOOK)}`]),
      `- table: ${phraseText(tableTitle(analysis, style, BOOK))}`,
      ...tableNotes(analysis, SHOW_ALL, style, BOOK).map((note) => `- note: ${phraseText(note)}`),
      `- figure: ${phraseText(figureTitle(analysis, style, BOOK))}`,
      ...figureNotes(analysis, style, BOOK).map((note) => `- note: ${phraseText(note)}`),
      `- alt: ${altTextOf(analysis, style, BOOK)}`,
      ...methodsNoteOf(analysis, style, BOOK).map((note) => `- methods: ${phraseText(note)}`),
      ...guards,
    ].join('\n'),
  );
}

describe('the phrase table', () => {
  it('reads as it did when somebody last read it: sentences', async () => {
    const text = SCENARIOS.map(
      (scenario) => `## ${scenario.name}\n\n${sentencesOf(scenario)}\n`,
    ).join('\n');
    await expect(`# Effect sentences\n\n${text}`).toMatchFileSnapshot('./sentences.md');
  });

  it('reads as it did when somebody last read it: print', async () => {
    const text = SCENARIOS.map((scenario) => `## ${scenario.name}\n\n${printOf(scenario)}\n`).join(
      '\n',
    );
    await expect(`# Titles, notes, methods, guards\n\n${text}`).toMatchFileSnapshot('./print.md');
  });
});
