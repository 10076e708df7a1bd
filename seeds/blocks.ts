import { addressKey, type ResultScope, type ValueAddress } from '#shared/analysis';
import { markdownToDocument, type InlineNode, type TextDocument } from '#shared/report/text';
import type { DemonstrationBlock } from './demonstration-study';

/** A piece of a demonstration paragraph: words, or an atom. */
export type Piece = string | InlineNode;

/** A heading. */
export function heading(id: string, level: 1 | 2 | 3, text: string): DemonstrationBlock {
  return { id, kind: 'heading', content: { schemaVersion: 1, level, document: paragraph([text]) } };
}

/** A paragraph of words, bound values and cross-references. */
export function prose(id: string, pieces: readonly Piece[]): DemonstrationBlock {
  return { id, kind: 'prose', content: { schemaVersion: 1, document: paragraph(pieces) } };
}

/** Prose typed as Markdown. */
export function markdownProse(id: string, markdown: string): DemonstrationBlock {
  const document = markdownToDocument(markdown);
  return { id, kind: 'prose', content: { schemaVersion: 1, document } };
}

/** A stratified table with every column that design and framing allow. */
export function stratifiedTable(id: string, analysisId: string): DemonstrationBlock {
  const show = {
    risk: true,
    riskDifference: true,
    riskRatio: true,
    oddsRatio: false,
    crude: false,
    pooled: true,
    trend: true,
  };
  const content = { schemaVersion: 1, analysisId, title: null, show, layout: 'auto' };
  return { id, kind: 'stratifiedTable', content };
}

/** A grouped bar chart. */
export function groupedBarChart(id: string, analysisId: string): DemonstrationBlock {
  const content = { schemaVersion: 1, analysisId, caption: null, showValues: true };
  return { id, kind: 'groupedBarChart', content };
}

/** A sentence about one level against the reference. */
export function effectSentence(
  id: string,
  analysisId: string,
  indexLevelId: string,
  scope: ResultScope,
): DemonstrationBlock {
  const words = { framing: null, lead: null, tail: null };
  const content = { schemaVersion: 1, analysisId, indexLevelId, scope, ...words };
  return { id, kind: 'effectSentence', content };
}

/** A value that follows its analysis. */
export function bound(address: ValueAddress): InlineNode {
  return { type: 'boundValue', attrs: { address: addressKey(address), format: 'auto' } };
}

/** "Table 1" or "Figure 1", whatever its number is. */
export function reference(blockId: string): InlineNode {
  return { type: 'crossReference', attrs: { blockId } };
}

function paragraph(pieces: readonly Piece[]): TextDocument {
  const content = pieces.map((piece) =>
    typeof piece === 'string' ? ({ type: 'text', text: piece } as const) : piece,
  );
  return { type: 'doc', content: [{ type: 'paragraph', content }] };
}
