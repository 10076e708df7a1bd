import {
  type Block,
  type BlockField,
  type BlockKind,
  blockKindOf,
  fieldValue,
  type PinnedAnalysis,
  withFieldValue,
} from '#shared/report';
import type { TextDocument } from '#shared/report/text';
import type { Framing } from '#shared/wording';
import type { TextShape } from '../text-editor/text-shape';

/** The text of a block that is edited in place. */
export interface BlockText {
  readonly document: TextDocument;
  readonly shape: TextShape;
  readonly label: string;
  readonly hint: string;
  readonly path: string;
}

/** The kind of a block; null for a kind that this page does not know. */
export function kindOf(block: Block): BlockKind | null {
  const kind = blockKindOf(block.kind);
  return kind.ok ? kind.value : null;
}

/** The text of a block that is edited in place; null when it is made, or cannot be read. */
export function textOf(block: Block): BlockText | null {
  const kind = kindOf(block);
  const editable = kind?.editableText ?? null;
  const field = kind?.fields.find((each) => each.kind === 'text' && !each.optional);
  const readable = kind?.parseContent(block.content).ok === true;
  if (editable === null || field?.kind !== 'text' || !readable) return null;
  const { label, hint, path, paragraphs: shape } = field;
  return { document: editable.documentOf(block.content), shape, label, hint, path };
}

/** Whether a block says an effect, and so may differ from the report's framing. */
export function hasFraming(block: Block): boolean {
  return kindOf(block)?.fields.some((field) => field.path === FRAMING_PATH) ?? false;
}

/** What a block says that does not follow the report's framing; null when it follows. */
export function ownFraming(block: Block): Framing | null {
  if (!hasFraming(block)) return null;
  return (fieldValue(block.content, FRAMING_PATH) as Framing | null | undefined) ?? null;
}

/** Where a kind that may differ from the report's framing keeps its own. */
export const FRAMING_PATH = 'framing';

/**
 * A content that shows another analysis: what depends on it (a level, a stratum) starts anew, as
 * the old choice may not exist there.
 */
export function withAnalysis(block: Block, field: BlockField, analysis: PinnedAnalysis): unknown {
  const kind = kindOf(block);
  if (kind === null) return block.content;
  const fresh = kind.emptyContent({ analysis });
  return kind.fields
    .filter((each) => 'analysisPath' in each && each.analysisPath === field.path)
    .reduce(
      (content, each) => withFieldValue(content, each.path, fieldValue(fresh, each.path)),
      withFieldValue(block.content, field.path, analysis.analysisId),
    );
}
