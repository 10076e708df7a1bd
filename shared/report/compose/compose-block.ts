import type { LayoutElement } from '#shared/layout';
import { blockKindOf } from '../blocks/block-kinds';
import type { PrintSetting } from '../blocks/block-context';
import { reportIssueText } from '../report-issue-text';
import type { Block } from '../report';

/** The layout elements of one block; what can't be printed is a problem element in its place. */
export function composeBlock(block: Block, setting: PrintSetting): readonly LayoutElement[] {
  const kind = blockKindOf(block.kind);
  if (!kind.ok) return problem(block, reportIssueText(kind.issue));
  const content = kind.value.parseContent(block.content);
  if (!content.ok) return problem(block, reportIssueText(content.issue));
  return kind.value.compose(content.value, { ...setting, blockId: block.id });
}

function problem(block: Block, message: string): readonly LayoutElement[] {
  return [{ kind: 'problem', blockId: block.id, message }];
}
