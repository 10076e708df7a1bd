import { lexer } from 'marked';
import type { Token, Tokens } from 'marked';
import { DEEPEST_LIST, isAllowedLink } from './schema';
import { paragraphOf } from './text-document';
import type {
  InlineNode,
  ListItemNode,
  ListNode,
  ParagraphNode,
  TextDocument,
  TextMark,
} from './text-document';

type BlockNode = ParagraphNode | ListNode;

/**
 * Reads Markdown as a text document. What the schema has no place for stays as words: a heading
 * becomes a bold paragraph, raw HTML, tables and images their literal text.
 */
export function markdownToDocument(markdown: string): TextDocument {
  const content = lexer(markdown, { gfm: true }).flatMap((token) => blockNodes(token, 0));
  return { type: 'doc', content: content.length === 0 ? [paragraphOf([])] : content };
}

function blockNodes(token: Token, depth: number): readonly BlockNode[] {
  switch (token.type) {
    case 'space':
    case 'def':
    case 'hr':
      return [];
    case 'heading':
      return [paragraphOf(inlineNodes((token as Tokens.Heading).tokens, [{ type: 'strong' }]))];
    case 'blockquote':
      return (token as Tokens.Blockquote).tokens.flatMap((part) => blockNodes(part, depth));
    case 'list':
      return listNodes(token as Tokens.List, depth);
    case 'code':
      return [paragraphOf(literalLines((token as Tokens.Code).text))];
    case 'paragraph':
    case 'text':
      return [paragraphOf(inlineNodes((token as Tokens.Text).tokens ?? [token], []))];
    default:
      return [paragraphOf(literalLines(token.raw.trimEnd()))];
  }
}

/** Lists nested deeper than the schema allows go on at its deepest level. */
function listNodes(list: Tokens.List, depth: number): readonly BlockNode[] {
  const items = list.items.flatMap((item) => listItems(item, depth));
  if (items.length === 0) return [];
  return [{ type: list.ordered ? 'orderedList' : 'bulletList', content: items }];
}

function listItems(item: Tokens.ListItem, depth: number): readonly ListItemNode[] {
  const parts = item.tokens.flatMap((token) => blockNodes(token, depth + 1));
  const lines = parts.flatMap((part) => (part.type === 'paragraph' ? [part] : []));
  const lists = parts.flatMap((part) => (part.type === 'paragraph' ? [] : [part]));
  const own: ListItemNode = { type: 'listItem', content: [joinLines(lines)] };
  if (depth + 1 < DEEPEST_LIST) return [{ ...own, content: [...own.content, ...lists] }];
  return [own, ...lists.flatMap((list) => list.content)];
}

function joinLines(lines: readonly ParagraphNode[]): ParagraphNode {
  return paragraphOf(
    lines.flatMap((line, index) => [
      ...(index === 0 ? [] : [{ type: 'hardBreak' } as const]),
      ...(line.content ?? []),
    ]),
  );
}

function literalLines(text: string): readonly InlineNode[] {
  return text
    .split('\n')
    .flatMap((line, index) => [
      ...(index === 0 ? [] : [{ type: 'hardBreak' } as const]),
      ...textNodes(line, []),
    ]);
}

function inlineNodes(tokens: readonly Token[], marks: readonly TextMark[]): readonly InlineNode[] {
  return tokens.flatMap((token) => inlineOf(token, marks));
}

function inlineOf(token: Token, marks: readonly TextMark[]): readonly InlineNode[] {
  switch (token.type) {
    case 'strong':
    case 'em':
      return inlineNodes((token as Tokens.Strong).tokens, [...marks, { type: token.type }]);
    case 'del':
      return inlineNodes((token as Tokens.Del).tokens, marks);
    case 'link':
      return linkNodes(token as Tokens.Link, marks);
    case 'br':
      return [{ type: 'hardBreak' }];
    case 'codespan':
      return textNodes((token as Tokens.Codespan).text, marks);
    case 'text':
    case 'escape':
      return plainNodes(token as Tokens.Text, marks);
    default:
      return textNodes(token.raw, marks);
  }
}

function plainNodes(token: Tokens.Text, marks: readonly TextMark[]): readonly InlineNode[] {
  if (token.tokens !== undefined) return inlineNodes(token.tokens, marks);
  return textNodes(decodeEntities(token.text).replace(/\s*\n\s*/gu, ' '), marks);
}

function linkNodes(link: Tokens.Link, marks: readonly TextMark[]): readonly InlineNode[] {
  const href = decodeEntities(link.href);
  if (!isAllowedLink(href)) return textNodes(link.raw, marks);
  return inlineNodes(link.tokens, [{ type: 'link', attrs: { href } }, ...marks]);
}

function textNodes(text: string, marks: readonly TextMark[]): readonly InlineNode[] {
  if (text === '') return [];
  return [marks.length === 0 ? { type: 'text', text } : { type: 'text', text, marks }];
}

const ENTITIES: Readonly<Record<string, string>> = {
  amp: '&',
  lt: '<',
  gt: '>',
  quot: '"',
  apos: "'",
  nbsp: '\u00a0',
};

/** The lexer leaves character references as they were typed. */
function decodeEntities(text: string): string {
  return text.replace(/&(?:#(\d{1,6})|([a-z]+));/giu, (reference: string, ...groups) => {
    const [code, name] = groups as [string | undefined, string | undefined];
    if (code !== undefined) return String.fromCodePoint(Math.min(Number(code), 0x10ffff));
    return ENTITIES[name?.toLowerCase() ?? ''] ?? reference;
  });
}
