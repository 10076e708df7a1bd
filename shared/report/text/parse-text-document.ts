import { Node } from 'prosemirror-model';
import { failure, success } from '#shared/core';
import type { Result } from '#shared/core';
import type { ContentIssue } from '../content-issue';
import { DEEPEST_LIST, textSchema } from './schema';
import type { TextDocument } from './text-document';

/** Longest JSON of one document, in characters. */
export const LONGEST_DOCUMENT = 200_000;

/** A list item and its list each add three levels to the JSON: object, array, object. */
const DEEPEST_JSON = 8 + DEEPEST_LIST * 6;

/**
 * Reads unknown JSON as a text document, dropping whatever the schema doesn't know at the edges.
 *
 * Gives the issues `textTooLong`, `listTooDeep` and `textNotReadable` (a node, mark, attribute or
 * nesting that the schema refuses).
 */
export function parseTextDocument(value: unknown): Result<TextDocument, ContentIssue> {
  const issue = sizeIssue(value) ?? depthIssue(value);
  if (issue !== null) return failure(issue);
  const node = readNode(value);
  if (node === null) return failure({ code: 'textNotReadable' });
  return success(node.toJSON() as TextDocument);
}

/** The ProseMirror node of a parsed document. */
export function nodeOfDocument(document: TextDocument): Node {
  return Node.fromJSON(textSchema, document);
}

/** The document of a checked ProseMirror node; the reverse of `nodeOfDocument`. */
export function documentOfNode(node: Node): TextDocument {
  return node.toJSON() as TextDocument;
}

function sizeIssue(value: unknown): ContentIssue | null {
  const characters = approximateSize(value, 0);
  if (characters <= LONGEST_DOCUMENT) return null;
  return { code: 'textTooLong', facts: { characters, most: LONGEST_DOCUMENT } };
}

/** Stops counting once over the limit or too deep, so that hostile input costs little. */
function approximateSize(value: unknown, depth: number): number {
  if (typeof value === 'string') return value.length + 2;
  if (typeof value !== 'object' || value === null || depth > DEEPEST_JSON) return 4;
  let size = 2;
  for (const [key, part] of Object.entries(value)) {
    size += (Array.isArray(value) ? 1 : key.length + 4) + approximateSize(part, depth + 1);
    if (size > LONGEST_DOCUMENT) return size;
  }
  return size;
}

function depthIssue(value: unknown): ContentIssue | null {
  const tooDeep = isDeeperThan(value, DEEPEST_JSON);
  return tooDeep ? { code: 'listTooDeep', facts: { most: DEEPEST_LIST } } : null;
}

function isDeeperThan(value: unknown, most: number): boolean {
  if (typeof value !== 'object' || value === null) return false;
  if (most === 0) return true;
  return Object.values(value).some((part) => isDeeperThan(part, most - 1));
}

function readNode(value: unknown): Node | null {
  try {
    const node = Node.fromJSON(textSchema, value);
    node.check();
    return node.type === textSchema.topNodeType ? node : null;
  } catch (error) {
    // ProseMirror reports an unreadable document by throwing RangeError, or TypeError where the
    // JSON isn't even an object in the right place; anything else is a bug of ours.
    if (error instanceof RangeError || error instanceof TypeError) return null;
    throw error;
  }
}
