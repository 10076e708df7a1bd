import type { AnalysisResult } from '#shared/analysis';
import type { HouseStyle } from '#shared/house-style';
import type { ComposedReport, LayoutElement, Run } from '#shared/layout';
import { BLOCK_KINDS, composeReport } from '#shared/report';
import type { Block, BlockKind, BlockKindId, PinnedAnalysis, Report } from '#shared/report';
import type { Framing } from '#shared/wording';
import { houseStyle, phrasebook } from './house-styles';

/** An analysis as a report pins it. */
export function pinned(result: AnalysisResult, id = 'a1'): PinnedAnalysis {
  return {
    analysisId: id,
    number: id.toUpperCase(),
    name: 'Hand eczema by wet work',
    resultId: `result of ${id}`,
    cut: { id: 'c1', number: 1, dataDate: '2026-01-31' },
    result,
  };
}

/** A block of a kind; by default as the kind starts it with this analysis. */
export function blockOf(
  id: string,
  kindId: BlockKindId,
  analysis: PinnedAnalysis | null,
  changes: Readonly<Record<string, unknown>> = {},
): Block {
  const kind: BlockKind = BLOCK_KINDS[kindId];
  const content = { ...(kind.emptyContent({ analysis }) as object), ...changes };
  return {
    id,
    kind: kindId,
    orderKey: 'a0',
    content,
    version: 1,
    positionVersion: 1,
    removedAt: null,
  };
}

/** A report of these blocks in this order, pinned to these analyses. */
export function reportOf(
  blocks: readonly Block[],
  pins: readonly PinnedAnalysis[],
  framing: Framing = 'both',
): Report {
  return {
    id: 'r1',
    studyId: 's1',
    title: 'Twelve-month results',
    framing,
    houseStyleId: 'open-clinical',
    stage: 'drafting',
    seq: 0,
    blocks: blocks.map((block, index) => ({ ...block, orderKey: orderKeyAt(index) })),
    pins: Object.fromEntries(pins.map(({ analysisId, resultId }) => [analysisId, resultId])),
  };
}

/** The report as it prints. */
export function composed(
  report: Report,
  pins: readonly PinnedAnalysis[],
  style: HouseStyle = houseStyle(),
): ComposedReport {
  return composeReport({ report, pins, houseStyle: style, phrasebook: phrasebook() });
}

/** The words of runs. */
export function textOf(runs: readonly Run[]): string {
  return runs.map(({ text }) => text).join('');
}

/** The first element of a kind; a report without one is a mistake of the test. */
export function elementOf<Kind extends LayoutElement['kind']>(
  report: ComposedReport,
  kind: Kind,
): Extract<LayoutElement, { kind: Kind }> {
  const found = report.elements.find((element) => element.kind === kind);
  if (found === undefined) throw new Error(`The report has no ${kind}.`);
  return found as Extract<LayoutElement, { kind: Kind }>;
}

/** Order keys a0 … az, then b00 and so on. */
function orderKeyAt(index: number): string {
  const digits = '0123456789ABCDEFGHIJKLMNOPQRSTUVWXYZabcdefghijklmnopqrstuvwxyz';
  if (index < digits.length) return `a${digits.charAt(index)}`;
  const rest = index - digits.length;
  return `b${digits.charAt(Math.floor(rest / 62))}${digits.charAt(rest % 62)}`;
}
