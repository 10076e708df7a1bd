import type { Result } from '#shared/core';
import type { LayoutElement } from '#shared/layout';
import type { ContentIssue } from '../content-issue';
import type { PinnedAnalysis } from '../report';
import type { TextDocument } from '../text/text-document';
import type { BlockContext } from './block-context';
import type { BlockField } from './block-field';

/** Who may edit a block: `words` and `numbers` map to actions of the permission table. */
export type BlockRights = 'words' | 'numbers';

/** What a new block may start from: the analysis that was chosen for it, if any. */
export interface EmptyContentContext {
  readonly analysis: PinnedAnalysis | null;
}

/** Text of a block that is edited in place, step by step. */
export interface EditableText<Content> {
  documentOf(content: Content): TextDocument;
  withDocument(content: Content, document: TextDocument): Content;
}

/**
 * Everything that one kind of block knows about itself. Shared code asks a kind, it never asks
 * which kind a block is. Content that reaches the other members went through `parseContent`.
 */
export interface BlockKind<Content = unknown> {
  readonly id: string;
  /** As a menu shows it: "Stratified table". */
  readonly label: string;
  /** One sentence for the menu. */
  readonly description: string;
  readonly rights: BlockRights;
  /** Whether a new block asks for an analysis first. */
  readonly needsAnalysis: boolean;
  readonly fields: readonly BlockField[];
  /** Text changed by `editText` steps; null where all changes replace the content. */
  readonly editableText: EditableText<Content> | null;
  parseContent(content: unknown): Result<Content, ContentIssue>;
  emptyContent(context: EmptyContentContext): Content;
  /** Ids of the analyses that the content shows, each once. */
  analysisIdsOf(content: Content): readonly string[];
  compose(content: Content, context: BlockContext): readonly LayoutElement[];
}
