import type { LayoutElement, ListElement, Run, RunMark, RunOrigin } from '#shared/layout';
import type { BoundText } from './bound-text';
import { splitNumerals } from './numerals';
import type {
  BoundValueFormat,
  InlineNode,
  ListNode,
  ParagraphNode,
  TextDocument,
  TextMark,
} from './text-document';

/** What turning text into runs needs to know: whose text it is and what its values say. */
export interface InlineContext {
  readonly blockId: string;
  readonly valueOf: (addressKey: string, format: BoundValueFormat) => BoundText;
}

/**
 * The layout elements of a document: a paragraph element for each paragraph, a list element for
 * each outermost list. Digits that were typed become runs of their own with the state `typed`; a
 * cross-reference is a run with `reference` and no text, which the report-wide pass fills in.
 */
export function documentToElements(
  document: TextDocument,
  context: InlineContext,
): readonly LayoutElement[] {
  return document.content.map((node) =>
    node.type === 'paragraph'
      ? { kind: 'paragraph', blockId: context.blockId, runs: paragraphRuns(node, context) }
      : listElement(node, context),
  );
}

/** The runs of a document as one line of text; paragraphs and list items are joined by a blank. */
export function documentToRuns(document: TextDocument, context: InlineContext): readonly Run[] {
  const lines = document.content.flatMap((node) =>
    node.type === 'paragraph' ? [node] : itemParagraphs(node),
  );
  return lines.flatMap((line, index) => [
    ...(index === 0 ? [] : [textRun(' ', undefined, context)]),
    ...paragraphRuns(line, context),
  ]);
}

function itemParagraphs(list: ListNode): readonly ParagraphNode[] {
  return list.content.flatMap((item) =>
    item.content.flatMap((part) => (part.type === 'paragraph' ? [part] : itemParagraphs(part))),
  );
}

function listElement(list: ListNode, context: InlineContext): ListElement {
  return {
    kind: 'list',
    blockId: context.blockId,
    ordered: list.type === 'orderedList',
    items: listItems(list, 0, context),
  };
}

function listItems(list: ListNode, depth: number, context: InlineContext): ListElement['items'] {
  const ordered = list.type === 'orderedList';
  return list.content.flatMap((item) =>
    item.content.flatMap((part) =>
      part.type === 'paragraph'
        ? [{ depth, ordered, runs: paragraphRuns(part, context) }]
        : listItems(part, depth + 1, context),
    ),
  );
}

function paragraphRuns(paragraph: ParagraphNode, context: InlineContext): readonly Run[] {
  return (paragraph.content ?? []).flatMap((node) => inlineRuns(node, context));
}

function inlineRuns(node: InlineNode, context: InlineContext): readonly Run[] {
  switch (node.type) {
    case 'text':
      return splitNumerals(node.text).map((part) =>
        textRun(part.text, node.marks, context, part.numeral ? 'typed' : 'text'),
      );
    case 'hardBreak':
      return [textRun('\n', node.marks, context)];
    case 'boundValue':
      return boundRuns(node, context);
    case 'crossReference':
      return [{ ...textRun('', node.marks, context), reference: node.attrs.blockId }];
  }
}

function boundRuns(
  node: InlineNode & { type: 'boundValue' },
  context: InlineContext,
): readonly Run[] {
  const { state, parts } = context.valueOf(node.attrs.address, node.attrs.format);
  return parts.map(({ text, addresses, ...part }) => {
    const ofPart = state === 'bound' && addresses.length === 0 ? 'text' : state;
    const run = textRun(text, node.marks, context, ofPart);
    return { ...run, ...part, origin: { ...originOf(context, ofPart), addresses } };
  });
}

function textRun(
  text: string,
  marks: readonly TextMark[] | undefined,
  context: InlineContext,
  state: RunOrigin['state'] = 'text',
): Run {
  const link = marks?.find((mark) => mark.type === 'link');
  const styles = (marks ?? []).flatMap((mark) => RUN_MARKS[mark.type]);
  return {
    text,
    ...(styles.length === 0 ? {} : { marks: styles }),
    origin: originOf(context, state),
    ...(link === undefined ? {} : { link: link.attrs.href }),
  };
}

function originOf(context: InlineContext, state: RunOrigin['state']): RunOrigin {
  return { blockId: context.blockId, state, addresses: [] };
}

const RUN_MARKS: Readonly<Record<TextMark['type'], readonly RunMark[]>> = {
  strong: ['bold'],
  em: ['italic'],
  superscript: ['superscript'],
  subscript: ['subscript'],
  link: [],
};
