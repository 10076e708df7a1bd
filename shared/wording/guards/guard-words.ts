import { GUARDS, type GuardFinding, type GuardId } from '#shared/analysis';
import type { HouseStyle } from '#shared/house-style';
import { capitalised, fillWords } from '../phrasebook/fill-pattern';
import type { Phrasebook } from '../phrasebook/phrasebook';
import { printContext, type PrintedAnalysis } from '../print/print-context';
import { guardFacts, type GuardFactsReader } from './guard-facts';
import { GUARD_SENTENCES } from './guard-sentences';

/** What a guard says: a title of a few words, one or two sentences, and where the rule is from. */
export interface GuardWords {
  readonly title: string;
  readonly sentence: string;
  readonly source: string;
}

/** The words of a finding, with its numbers under the house style. */
export function guardWords(
  finding: GuardFinding,
  analysis: PrintedAnalysis,
  style: HouseStyle,
  book: Phrasebook,
): GuardWords {
  const { guardId } = finding;
  const reader: GuardFactsReader = guardFacts(printContext(analysis, style, book), finding);
  return {
    title: fillWords(book, `guard.${guardId}.title`, {}),
    sentence: capitalised(GUARD_SENTENCES[guardId](reader)),
    source: sourceOf(guardId),
  };
}

function sourceOf(id: GuardId): string {
  return GUARDS[id].source;
}
