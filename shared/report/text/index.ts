export { textOfBound } from './bound-text';
export type { BoundPart, BoundText } from './bound-text';
export { documentToText, isEmptyDocument } from './document-to-text';
export { markdownToDocument } from './markdown';
export { numeralsOf, splitNumerals } from './numerals';
export type { TextPart } from './numerals';
export {
  documentOfNode,
  LONGEST_DOCUMENT,
  nodeOfDocument,
  parseTextDocument,
} from './parse-text-document';
export { DEEPEST_LIST, isAllowedLink, textSchema } from './schema';
export { BOUND_VALUE_FORMATS, plainDocument } from './text-document';
export type {
  BoundValueFormat,
  InlineNode,
  ListItemNode,
  ListNode,
  ParagraphNode,
  TextDocument,
  TextMark,
} from './text-document';
export { documentToElements, documentToRuns } from './text-runs';
export type { InlineContext } from './text-runs';
