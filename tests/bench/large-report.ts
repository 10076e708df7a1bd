import type { Block, PinnedAnalysis, Report } from '#shared/report';
import { blockOf, pinned, reportOf } from '../builders/reports';
import { wardResult, wetWorkResult } from '../builders/results';

/** Analyses that are read anew, so that nothing remembered about a result helps. */
export function analyses(): readonly PinnedAnalysis[] {
  const results = [wetWorkResult(), wardResult()];
  return Array.from({ length: 20 }, (_, index) =>
    structuredClone(pinned(results[index % 2]!, `a${String(index)}`)),
  );
}

/** A report of this many blocks, three in ten of them tables. */
export function largeReport(blocks: number, pins: readonly PinnedAnalysis[]): Report {
  const made = Array.from({ length: blocks }, (_, index) =>
    blockAt(index, pins[index % pins.length]!),
  );
  return reportOf(made, pins);
}

const KINDS = [
  'stratifiedTable',
  'prose',
  'effectSentence',
  'stratifiedTable',
  'prose',
  'groupedBarChart',
  'effectSentence',
  'heading',
  'stratifiedTable',
  'prose',
] as const;

function blockAt(index: number, analysis: PinnedAnalysis): Block {
  const id = `b${String(index)}`;
  const kind = KINDS[index % KINDS.length]!;
  if (kind !== 'prose') return blockOf(id, kind, analysis);
  const address = `${analysis.analysisId}/risk/over6/crude/value`;
  const content = [
    { type: 'text', text: 'Over 12 months the risk was ' },
    { type: 'boundValue', attrs: { address, format: 'withLimits' } },
    { type: 'text', text: ', as the table shows: ' },
    { type: 'crossReference', attrs: { blockId: `b${String(index - 1)}` } },
  ];
  const document = { type: 'doc', content: [{ type: 'paragraph', content }] };
  return blockOf(id, kind, null, { document });
}
