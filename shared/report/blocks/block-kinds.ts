import { failure, success } from '#shared/core';
import type { Result } from '#shared/core';
import type { ContentIssue } from '../content-issue';
import type { Block } from '../report';
import type { BlockKind } from './block-kind';
import { EFFECT_SENTENCE } from './effect-sentence/effect-sentence';
import { GROUPED_BAR_CHART } from './grouped-bar-chart/grouped-bar-chart';
import { HEADING } from './heading/heading';
import { PROSE } from './prose/prose';
import { STRATIFIED_TABLE } from './stratified-table/stratified-table';

/** Every kind of block, in the order in which a menu offers them. */
export const BLOCK_KINDS = {
  heading: HEADING,
  prose: PROSE,
  stratifiedTable: STRATIFIED_TABLE,
  groupedBarChart: GROUPED_BAR_CHART,
  effectSentence: EFFECT_SENTENCE,
} as const;

/** Id of a kind of block. */
export type BlockKindId = keyof typeof BLOCK_KINDS;

/** The kinds as a list, in the order of the menu. */
export const BLOCK_KIND_LIST: readonly BlockKind[] = Object.values<BlockKind>(BLOCK_KINDS);

/** The kind with this id, or the issue `unknownBlockKind`. */
export function blockKindOf(id: string): Result<BlockKind, ContentIssue> {
  if (Object.hasOwn(BLOCK_KINDS, id)) return success(BLOCK_KINDS[id as BlockKindId]);
  return failure({ code: 'unknownBlockKind', facts: { kind: id.slice(0, 60) } });
}

/** Reads unknown JSON as content of the kind with this id. */
export function parseContent(kindId: string, content: unknown): Result<unknown, ContentIssue> {
  const kind = blockKindOf(kindId);
  return kind.ok ? kind.value.parseContent(content) : kind;
}

/** A block's kind, and its content as that kind reads it. */
export interface ReadBlock {
  readonly kind: BlockKind;
  readonly content: unknown;
}

/** Reads a block; contents never change, so that each is read once. */
export function readBlock({
  kind: kindId,
  content,
}: Pick<Block, 'kind' | 'content'>): Result<ReadBlock, ContentIssue> {
  const known = typeof content === 'object' && content !== null ? KNOWN.get(content) : undefined;
  if (known?.kindId === kindId) return known.read;
  const kind = blockKindOf(kindId);
  const read = kind.ok ? readAs(kind.value, content) : kind;
  if (typeof content === 'object' && content !== null) KNOWN.set(content, { kindId, read });
  return read;
}

function readAs(kind: BlockKind, content: unknown): Result<ReadBlock, ContentIssue> {
  const parsed = kind.parseContent(content);
  return parsed.ok ? success({ kind, content: parsed.value }) : parsed;
}

/** Ids of the analyses that a block shows; none where its content can't be read. */
export function analysisIdsOf(block: Pick<Block, 'kind' | 'content'>): readonly string[] {
  const read = readBlock(block);
  return read.ok ? read.value.kind.analysisIdsOf(read.value.content) : [];
}

interface KnownContent {
  readonly kindId: string;
  readonly read: Result<ReadBlock, ContentIssue>;
}

const KNOWN = new WeakMap<object, KnownContent>();
