import * as z from 'zod/mini';
import { plainDocument } from '../../text/text-document';
import type { TextDocument } from '../../text/text-document';
import { documentToElements } from '../../text/text-runs';
import type { BlockKind } from '../block-kind';
import { contentParser, documentSchema } from '../content-schema';
import { analysisIdsIn, inlineContext } from '../inline-context';

/** Content of prose: paragraphs and lists with bound values and cross-references. */
export interface ProseContent {
  readonly schemaVersion: 1;
  readonly document: TextDocument;
}

/** Prose. */
export const PROSE: BlockKind<ProseContent> = {
  id: 'prose',
  label: 'Prose',
  description: 'Paragraphs and lists of your own words, with values bound to their analyses.',
  rights: 'words',
  needsAnalysis: false,
  fields: [
    {
      kind: 'text',
      path: 'document',
      label: 'Text',
      paragraphs: 'many',
      optional: false,
      hint: 'Write, or paste Markdown',
    },
  ],
  editableText: {
    documentOf: (content) => content.document,
    withDocument: (content, document) => ({ ...content, document }),
  },
  parseContent: contentParser<ProseContent>(
    z.object({ schemaVersion: z.literal(1), document: documentSchema }),
  ),
  emptyContent: () => ({ schemaVersion: 1, document: plainDocument('') }),
  analysisIdsOf: (content) => analysisIdsIn(content.document),
  compose: (content, context) => documentToElements(content.document, inlineContext(context)),
};
