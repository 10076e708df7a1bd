import type { FigureElement, LayoutElement, Run } from '#shared/layout';
import { altTextOf, figureNotes, figureTitle } from '#shared/wording';
import type { PinnedAnalysis } from '../../report';
import { documentToRuns } from '../../text/text-runs';
import { abbreviationNote } from '../abbreviation-note';
import type { BlockContext } from '../block-context';
import { inlineContext } from '../inline-context';
import { phraseRuns } from '../phrase-runs';
import { pinnedAnalysis, problemElement } from '../pinned-result';
import { figureOf } from './chart-figure';
import type { GroupedBarChartContent } from './content';

/**
 * A grouped bar chart of one analysis: levels on the axis, strata as groups. Cases and controls
 * are the groups in a case–control study, over all strata together: shares of its sample within a
 * stratum say nothing about risk, and levels × strata × two would leave no room for bars.
 */
export function composeGroupedBarChart(
  content: GroupedBarChartContent,
  context: BlockContext,
): readonly LayoutElement[] {
  const pinned = pinnedAnalysis(content.analysisId, context);
  if (!pinned.ok) return problemElement(pinned.issue, context);
  const { blockId, houseStyle, phrasebook } = context;
  const figure: FigureElement = {
    kind: 'figure',
    blockId,
    caption: { label: 'Figure', number: 0, runs: captionRuns(content, pinned.value, context) },
    figure: figureOf(pinned.value, content.showValues, context),
    altText: altTextOf(pinned.value, houseStyle, phrasebook),
    notes: notesOf(pinned.value, context),
  };
  return [figure];
}

function notesOf(analysis: PinnedAnalysis, context: BlockContext): readonly (readonly Run[])[] {
  const { blockId, houseStyle, phrasebook } = context;
  const notes = figureNotes(analysis, houseStyle, phrasebook).map((phrase) =>
    phraseRuns(phrase, blockId),
  );
  const texts = notes.flat().map(({ text }) => text);
  return [...notes, ...abbreviationNote(texts, context)];
}

function captionRuns(
  { caption }: GroupedBarChartContent,
  analysis: PinnedAnalysis,
  context: BlockContext,
): readonly Run[] {
  if (caption !== null) return documentToRuns(caption, inlineContext(context));
  const title = figureTitle(analysis, context.houseStyle, context.phrasebook);
  return phraseRuns(title, context.blockId);
}
