import { type Block, blockKindOf } from '#shared/report';
import type { ProofReference } from '../proof/proof-words';

/** What a block is called: "Table 2", or its kind where it has no number. */
export function blockName(block: Block | undefined, references: readonly ProofReference[]): string {
  if (block === undefined) return 'Block';
  const numbered = references.find((reference) => reference.blockId === block.id);
  const kind = blockKindOf(block.kind);
  return numbered?.name ?? (kind.ok ? kind.value.label : 'Block');
}
