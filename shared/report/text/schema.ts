import { Schema } from 'prosemirror-model';
import type { Attrs, MarkSpec, NodeSpec } from 'prosemirror-model';
import { BOUND_VALUE_FORMATS } from './text-document';

/** Lists may be nested so deep and no deeper. */
export const DEEPEST_LIST = 6;

const LINK_PROTOCOL = /^(?:https?:\/\/|mailto:)[^\s]+$/iu;

/** Whether a link may be printed: http, https or mailto, without blanks. */
export function isAllowedLink(href: string): boolean {
  return href.length <= 2000 && LINK_PROTOCOL.test(href);
}

/** The part of a DOM element that reading pasted HTML needs; this folder knows no DOM. */
interface AttributeSource {
  getAttribute: (name: string) => string | null;
}

function boundValueAttributes(source: AttributeSource): Attrs | false {
  const address = source.getAttribute('data-address');
  const format = source.getAttribute('data-format');
  return address === null || format === null ? false : { address, format };
}

function crossReferenceAttributes(source: AttributeSource): Attrs | false {
  const blockId = source.getAttribute('data-block-id');
  return blockId === null ? false : { blockId };
}

function requireText(value: unknown): void {
  if (typeof value !== 'string' || value === '' || value.length > 400) {
    throw new RangeError('An address or a block id must be a short text.');
  }
}

function requireFormat(value: unknown): void {
  if (!BOUND_VALUE_FORMATS.some((format) => format === value)) {
    throw new RangeError('Unknown format of a bound value.');
  }
}

function requireLink(value: unknown): void {
  if (typeof value !== 'string' || !isAllowedLink(value)) {
    throw new RangeError('A link must be an http, https or mailto address.');
  }
}

const BOUND_VALUE: NodeSpec = {
  group: 'inline',
  inline: true,
  atom: true,
  selectable: true,
  attrs: {
    address: { validate: requireText },
    format: { default: 'auto', validate: requireFormat },
  },
  toDOM: ({ attrs }) => [
    'eh-bound-value',
    { 'data-address': attrs.address as string, 'data-format': attrs.format as string },
  ],
  parseDOM: [{ tag: 'eh-bound-value', getAttrs: boundValueAttributes }],
};

const CROSS_REFERENCE: NodeSpec = {
  group: 'inline',
  inline: true,
  atom: true,
  selectable: true,
  attrs: { blockId: { validate: requireText } },
  toDOM: ({ attrs }) => ['eh-cross-reference', { 'data-block-id': attrs.blockId as string }],
  parseDOM: [{ tag: 'eh-cross-reference', getAttrs: crossReferenceAttributes }],
};

const NODES = {
  doc: { content: 'block+' },
  paragraph: {
    content: 'inline*',
    group: 'block',
    toDOM: () => ['p', 0],
    parseDOM: [{ tag: 'p' }],
  },
  bulletList: {
    content: 'listItem+',
    group: 'block list',
    toDOM: () => ['ul', 0],
    parseDOM: [{ tag: 'ul' }],
  },
  orderedList: {
    content: 'listItem+',
    group: 'block list',
    toDOM: () => ['ol', 0],
    parseDOM: [{ tag: 'ol' }],
  },
  listItem: {
    content: 'paragraph list*',
    defining: true,
    toDOM: () => ['li', 0],
    parseDOM: [{ tag: 'li' }],
  },
  text: { group: 'inline' },
  hardBreak: {
    group: 'inline',
    inline: true,
    selectable: false,
    toDOM: () => ['br'],
    parseDOM: [{ tag: 'br' }],
  },
  boundValue: BOUND_VALUE,
  crossReference: CROSS_REFERENCE,
} satisfies Record<string, NodeSpec>;

const LINK: MarkSpec = {
  attrs: { href: { validate: requireLink } },
  inclusive: false,
  toDOM: ({ attrs }) => ['a', { href: attrs.href as string, rel: 'noopener noreferrer' }, 0],
  parseDOM: [
    {
      tag: 'a[href]',
      getAttrs: (element) => {
        const href = (element as AttributeSource).getAttribute('href') ?? '';
        return isAllowedLink(href) ? { href } : false;
      },
    },
  ],
};

const MARKS = {
  link: LINK,
  strong: { toDOM: () => ['strong', 0], parseDOM: [{ tag: 'strong' }, { tag: 'b' }] },
  em: { toDOM: () => ['em', 0], parseDOM: [{ tag: 'em' }, { tag: 'i' }] },
  superscript: {
    excludes: 'superscript subscript',
    toDOM: () => ['sup', 0],
    parseDOM: [{ tag: 'sup' }],
  },
  subscript: {
    excludes: 'superscript subscript',
    toDOM: () => ['sub', 0],
    parseDOM: [{ tag: 'sub' }],
  },
} satisfies Record<string, MarkSpec>;

/**
 * The schema of all text in a report: paragraphs, two kinds of list, marks, and two atoms. It is
 * free of the DOM: both sides parse and change documents with it, the editor also draws them.
 */
export const textSchema = new Schema<keyof typeof NODES, keyof typeof MARKS>({
  nodes: NODES,
  marks: MARKS,
});
