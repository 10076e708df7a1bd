import { decimalsOf } from '#shared/format';
import type { LayoutElement, Run, TableElement } from '#shared/layout';
import { columnHeads, tableTitle } from '#shared/wording';
import { documentToRuns } from '../../text/text-runs';
import type { BlockContext } from '../block-context';
import { inlineContext } from '../inline-context';
import { phraseRuns } from '../phrase-runs';
import { pinnedAnalysis, problemElement } from '../pinned-result';
import type { StratifiedTableContent } from './content';
import { layTable } from './lay-table';
import { hasLevels, outsideColumns } from './outside-columns';
import { tablePValues } from './p-values';
import { notesOfTable } from './table-notes';
import { planTable } from './table-plan';
import type { TableSetting } from './table-setting';

/**
 * A three-rule table of one analysis: caption, spanner and column heads, a row for each exposure
 * level in each layer, notes. Every number is a run bound to its address, and a number beside it.
 */
export function composeStratifiedTable(
  content: StratifiedTableContent,
  context: BlockContext,
): readonly LayoutElement[] {
  const pinned = pinnedAnalysis(content.analysisId, context);
  if (!pinned.ok) return problemElement(pinned.issue, context);
  const { analysisId, result } = pinned.value;
  const { blockId, houseStyle, phrasebook } = context;
  const decimals = decimalsOf(result, houseStyle);
  const heads = columnHeads(pinned.value, houseStyle, phrasebook);
  const outsideNoted = outsideColumns(content.show, pinned.value);
  const outside = outsideNoted.filter(hasLevels);
  const words = { heads, houseStyle, phrasebook };
  const plan = planTable(content, result, context.framing, outside.length);
  const pValues = tablePValues(content.pValues, plan, result);
  const parts = { outside, outsideNoted, pValues };
  const setting = { blockId, analysisId, result, decimals, ...parts, ...words };
  const laid = layTable(plan, setting);
  const table: TableElement = {
    kind: 'table',
    blockId,
    caption: { label: 'Table', number: 0, runs: titleRuns(content, setting, context) },
    ...laid,
    notes: notesOfTable(content.show, { plan, head: laid.head }, setting),
  };
  return [table];
}

function titleRuns(
  { title }: StratifiedTableContent,
  setting: TableSetting,
  context: BlockContext,
): readonly Run[] {
  if (title !== null) return documentToRuns(title, inlineContext(context));
  const { houseStyle, phrasebook, blockId } = setting;
  return phraseRuns(tableTitle(setting, houseStyle, phrasebook), blockId);
}
