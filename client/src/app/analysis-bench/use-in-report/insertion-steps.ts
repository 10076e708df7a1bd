import type { ResultScope } from '#shared/analysis';
import type { AnalysisView, ReportView, StepSubmission } from '#shared/api';
import {
  BLOCK_KINDS,
  type BlockField,
  type BlockKindId,
  type InsertBlock,
  type PinnedAnalysis,
  placeAfter,
  visibleBlocks,
  withFieldValue,
} from '#shared/report';
import { newId } from '../../ui/new-id';

/** The analysis with the contrast that is in view. */
export interface UsedAnalysis {
  readonly analysis: AnalysisView;
  readonly levelId: string | null;
  readonly scope: ResultScope;
}

/** Which blocks to put into the report. */
export interface WantedBlocks {
  readonly table: boolean;
  readonly figure: boolean;
  readonly sentence: boolean;
}

/** The steps that put blocks of an analysis at the end of a report, as one change. */
export function insertionSteps(
  report: ReportView['report'],
  used: UsedAnalysis,
  wanted: WantedBlocks,
): StepSubmission[] {
  const kinds: readonly BlockKindId[] = [
    ...(wanted.table ? ['stratifiedTable' as const] : []),
    ...(wanted.figure ? ['groupedBarChart' as const] : []),
    ...(wanted.sentence ? ['effectSentence' as const] : []),
  ];
  const groupId = newId();
  const steps: StepSubmission[] = [];
  let { blocks } = report;
  for (const kind of kinds) {
    const block = blockAtEnd({ blocks }, kind, contentOf(kind, used));
    blocks = [...blocks, { ...block, version: 1, positionVersion: 1, removedAt: null }];
    const step: InsertBlock = { kind: 'insertBlock', block };
    steps.push({ id: newId(), groupId, undoes: null, step: { ...step } });
  }
  return steps;
}

function blockAtEnd(
  report: Pick<ReportView['report'], 'blocks'>,
  kind: BlockKindId,
  content: unknown,
): InsertBlock['block'] {
  const last = visibleBlocks(report).at(-1)?.id ?? null;
  return { id: newId(), kind, orderKey: placeAfter(report, last).orderKey, content };
}

/** What speaks of one contrast speaks of the one in view; tables and figures show all of them. */
function contentOf(kind: BlockKindId, { analysis, levelId, scope }: UsedAnalysis): unknown {
  const inView: Partial<Record<BlockField['kind'], unknown>> = { indexLevel: levelId, scope };
  const blockKind = BLOCK_KINDS[kind];
  return blockKind.fields
    .filter((field) => field.kind in inView)
    .reduce<unknown>(
      (content, field) => withFieldValue(content, field.path, inView[field.kind]),
      blockKind.emptyContent({ analysis: pinOf(analysis) }),
    );
}

function pinOf(analysis: AnalysisView): PinnedAnalysis {
  const { id, number, name, resultId, result, cutId, cutNumber, cutDataDate } = analysis;
  return {
    analysisId: id,
    number,
    name,
    resultId,
    result,
    outside: analysis.outside ?? [],
    cut: { id: cutId, number: cutNumber, dataDate: cutDataDate },
  };
}
