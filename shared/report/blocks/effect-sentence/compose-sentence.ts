import type { LayoutElement, Run } from '#shared/layout';
import { claimOf, issueWords, outsideSentence, phraseOfClaim } from '#shared/wording';
import type { Phrase } from '#shared/wording';
import { markAbbreviations } from '../../compose/abbreviations';
import { documentToRuns } from '../../text/text-runs';
import type { TextDocument } from '../../text/text-document';
import type { BlockContext } from '../block-context';
import type { PinnedAnalysis } from '../../report';
import { fittingEstimates } from '../fitting-estimates';
import { inlineContext } from '../inline-context';
import { phraseRuns } from '../phrase-runs';
import { pinnedAnalysis, problemElement } from '../pinned-result';
import { wordsRun } from '../table-cells';
import type { EffectSentenceContent } from './content';

/**
 * One paragraph: the writer's lead, the sentence of the claim, the writer's tail. Every number of
 * the sentence is a run of its own, bound to its addresses.
 */
export function composeEffectSentence(
  content: EffectSentenceContent,
  context: BlockContext,
): readonly LayoutElement[] {
  const pinned = pinnedAnalysis(content.analysisId, context);
  if (!pinned.ok) return problemElement(pinned.issue, context);
  if (content.indexLevelId === null) {
    return problemElement('No level is chosen yet. Choose the level to speak of.', context);
  }
  const { analysisId, result, number } = pinned.value;
  const { indexLevelId, scope } = content;
  const claim = claimOf(result, { analysisId, indexLevelId, scope });
  if (!claim.ok) {
    const why = issueWords(claim.issue, context.phrasebook);
    return problemElement(`${number} can’t be said here: ${why}.`, context);
  }
  const framing = content.framing ?? context.framing;
  const phrase = phraseOfClaim(claim.value, framing, context.houseStyle, context.phrasebook);
  const phrases = [phrase, ...outsidePhrases(content, pinned.value, context)];
  return [{ kind: 'paragraph', blockId: context.blockId, runs: runs(content, phrases, context) }];
}

/** The adjusted estimates of the level; they are about all records, so not within a stratum. */
function outsidePhrases(
  { outside: isSaid, indexLevelId, scope }: EffectSentenceContent,
  pinned: PinnedAnalysis,
  { houseStyle, phrasebook }: BlockContext,
): readonly Phrase[] {
  if (isSaid !== true || scope.kind === 'stratum') return [];
  return fittingEstimates(pinned.outside ?? [], pinned.result.frame)
    .filter(({ levelId }) => levelId === indexLevelId)
    .map((estimate) => outsideSentence(estimate, pinned, houseStyle, phrasebook));
}

function runs(
  { lead, tail }: EffectSentenceContent,
  phrases: readonly Phrase[],
  context: BlockContext,
): readonly Run[] {
  const before = ownWords(lead, context);
  const after = ownWords(tail, context);
  const blank = wordsRun(' ', context.blockId);
  const said = phrases.flatMap((phrase, place) => [
    ...(place === 0 ? [] : [blank]),
    ...phraseRuns(phrase, context.blockId).flatMap((run) =>
      markAbbreviations(run, context.phrasebook),
    ),
  ]);
  return [
    ...before,
    ...(before.length === 0 ? [] : [blank]),
    ...said,
    ...(after.length === 0 ? [] : [blank]),
    ...after,
  ];
}

function ownWords(document: TextDocument | null, context: BlockContext): readonly Run[] {
  return document === null ? [] : documentToRuns(document, inlineContext(context));
}
