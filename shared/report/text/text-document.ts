/** Ways in which a bound value may print; `auto` follows its quantity and the house style. */
export const BOUND_VALUE_FORMATS = [
  'auto',
  'percent',
  'count',
  'per100',
  'per1000',
  'withLimits',
] as const;

/** One of the formats of a bound value. */
export type BoundValueFormat = (typeof BOUND_VALUE_FORMATS)[number];

/** A character style of text. Links go to http, https and mailto addresses only. */
export type TextMark =
  | { readonly type: 'strong' | 'em' | 'superscript' | 'subscript' }
  | { readonly type: 'link'; readonly attrs: { readonly href: string } };

/**
 * What a paragraph holds: text, a line break, and two atoms. `boundValue.address` is the key of a
 * value address; `crossReference.blockId` names the block whose table or figure is meant.
 */
export type InlineNode =
  | { readonly type: 'text'; readonly text: string; readonly marks?: readonly TextMark[] }
  | { readonly type: 'hardBreak'; readonly marks?: readonly TextMark[] }
  | {
      readonly type: 'boundValue';
      readonly attrs: { readonly address: string; readonly format: BoundValueFormat };
      readonly marks?: readonly TextMark[];
    }
  | {
      readonly type: 'crossReference';
      readonly attrs: { readonly blockId: string };
      readonly marks?: readonly TextMark[];
    };

/** A paragraph of inline nodes. */
export interface ParagraphNode {
  readonly type: 'paragraph';
  readonly content?: readonly InlineNode[];
}

/** One item of a list: a paragraph, and lists nested below it. */
export interface ListItemNode {
  readonly type: 'listItem';
  readonly content: readonly (ParagraphNode | ListNode)[];
}

/** A list. */
export interface ListNode {
  readonly type: 'bulletList' | 'orderedList';
  readonly content: readonly ListItemNode[];
}

/**
 * Text as it is stored: the JSON of a ProseMirror document of `textSchema`. Values of this type
 * come from `parseTextDocument`, `markdownToDocument` or `plainDocument` only.
 */
export interface TextDocument {
  readonly type: 'doc';
  readonly content: readonly (ParagraphNode | ListNode)[];
}

/** A document of one paragraph that holds this text and nothing else. */
export function plainDocument(text: string): TextDocument {
  const content: readonly InlineNode[] = text === '' ? [] : [{ type: 'text', text }];
  return { type: 'doc', content: [paragraphOf(content)] };
}

/** A paragraph; without content it is empty. */
export function paragraphOf(content: readonly InlineNode[]): ParagraphNode {
  return content.length === 0 ? { type: 'paragraph' } : { type: 'paragraph', content };
}
