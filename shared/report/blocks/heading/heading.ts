import * as z from 'zod/mini';
import { plainDocument } from '../../text/text-document';
import type { TextDocument } from '../../text/text-document';
import { documentToRuns } from '../../text/text-runs';
import type { BlockKind } from '../block-kind';
import { contentParser, lineSchema } from '../content-schema';
import { analysisIdsIn, inlineContext } from '../inline-context';

/** Content of a heading; level 1 is the largest below the title. */
export interface HeadingContent {
  readonly schemaVersion: 1;
  readonly level: 1 | 2 | 3;
  readonly document: TextDocument;
}

/** A heading. */
export const HEADING: BlockKind<HeadingContent> = {
  id: 'heading',
  label: 'Heading',
  description: 'A heading of one of three levels.',
  rights: 'words',
  needsAnalysis: false,
  fields: [
    {
      kind: 'text',
      path: 'document',
      label: 'Heading',
      paragraphs: 'one',
      optional: false,
      hint: 'What the section is about',
    },
    {
      kind: 'choice',
      path: 'level',
      label: 'Level',
      options: [
        { value: 1, label: '1' },
        { value: 2, label: '2' },
        { value: 3, label: '3' },
      ],
    },
  ],
  editableText: {
    documentOf: (content) => content.document,
    withDocument: (content, document) => ({ ...content, document }),
  },
  parseContent: contentParser<HeadingContent>(
    z.object({
      schemaVersion: z.literal(1),
      level: z.union([z.literal(1), z.literal(2), z.literal(3)]),
      document: lineSchema,
    }),
  ),
  emptyContent: () => ({ schemaVersion: 1, level: 2, document: plainDocument('') }),
  analysisIdsOf: (content) => analysisIdsIn(content.document),
  compose: (content, context) => [
    {
      kind: 'heading',
      blockId: context.blockId,
      level: content.level,
      runs: documentToRuns(content.document, inlineContext(context)),
    },
  ],
};
