import { parseAddress } from '#shared/analysis';
import type { InlineContext } from '../text/text-runs';
import type { InlineNode, ListNode, ParagraphNode, TextDocument } from '../text/text-document';
import type { BlockContext } from './block-context';
import { boundText } from './bound-value';

/** How the text of a block reads its bound values. */
export function inlineContext(context: BlockContext): InlineContext {
  return {
    blockId: context.blockId,
    valueOf: (key, format) => boundText(key, format, context),
  };
}

/** Ids of the analyses that a text binds to, after the block's own, each once. */
export function analysisIdsIn(
  document: TextDocument | null,
  own: string | null = null,
): readonly string[] {
  const bound = document === null ? [] : document.content.flatMap(inlineNodesOf);
  const ids = bound.flatMap((node) => {
    const address = node.type === 'boundValue' ? parseAddress(node.attrs.address) : null;
    return address?.ok === true ? [address.value.analysisId] : [];
  });
  return [...new Set([...(own === null ? [] : [own]), ...ids])];
}

function inlineNodesOf(node: ParagraphNode | ListNode): readonly InlineNode[] {
  if (node.type === 'paragraph') return node.content ?? [];
  return node.content.flatMap((item) => item.content.flatMap(inlineNodesOf));
}
