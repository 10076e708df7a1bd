import { applyStep, type Block, type Report, type Step } from '#shared/report';
import { refuse, type ServerIssue } from '../../errors/server-issue';
import type { StoredStep } from '../../models/step/step-store';

/**
 * Refuses an edit of a block that others changed or removed meanwhile. `facts.yours` is the content
 * as the edit would have left it, `facts.theirs` the content as it is, so that nothing is lost.
 */
export function refuseStale(
  code: 'staleEdit' | 'blockRemoved',
  block: Block,
  step: Step,
  newer: readonly StoredStep[],
): { readonly ok: false; readonly issue: ServerIssue } {
  const facts = { blockId: block.id, theirs: block.content, version: block.version };
  const yours = contentAfter(block, step, newer);
  return refuse(code, { facts: yours === undefined ? facts : { ...facts, yours } });
}

/** What the edit makes of the content that it was made against. */
function contentAfter(block: Block, step: Step, newer: readonly StoredStep[]): unknown {
  const then = newer.reduceRight<Block | null>(
    (later, { inverse }) => (later === null ? null : blockAfter(later, inverse)),
    { ...block, removedAt: null },
  );
  return then === null ? undefined : blockAfter(then, step)?.content;
}

/** Applies an edit to a block whatever its version; null where it doesn't fit. */
function blockAfter(block: Block, step: Step): Block | null {
  const current = 'baseVersion' in step ? { ...step, baseVersion: block.version } : step;
  const applied = applyStep({ ...ALONE, blocks: [block] }, current, { at: '' });
  return applied.ok ? (applied.value.report.blocks[0] ?? null) : null;
}

/** A report that holds nothing but the block in question. */
const ALONE: Report = {
  id: '',
  studyId: '',
  title: '',
  framing: 'both',
  houseStyleId: '',
  stage: 'drafting',
  seq: 0,
  blocks: [],
  pins: {},
};
