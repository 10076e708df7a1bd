import type { LayoutElement } from '#shared/layout';
import type { PrintSetting } from '../blocks/block-context';
import { readBlock } from '../blocks/block-kinds';
import type { Block } from '../report';
import { reportIssueText } from '../report-issue-text';

/** The layout elements of one block; what can't be printed is a problem element in its place. */
export function composeBlock(block: Block, setting: PrintSetting): readonly LayoutElement[] {
  const read = readBlock(block);
  if (!read.ok) {
    return [{ kind: 'problem', blockId: block.id, message: reportIssueText(read.issue) }];
  }
  const { kind, content } = read.value;
  return kind.compose(content, { ...setting, blockId: block.id });
}
