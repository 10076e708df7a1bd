import { contentChangedBy, rebaseStep, type Block, type Step } from '#shared/report';
import type { Dependencies } from '../../dependencies';
import type { Outcome } from '../../errors/server-issue';
import type { StoredStep } from '../../models/step/step-store';
import type { Unit } from '../../models/unit-of-work';
import type { Journal } from './journal';
import { refuseStale } from './refuse-stale';

/** How many steps are read at a time when looking for those of one block. */
const PAGE = 200;

/**
 * The step as it has to be against the block as it is now. What can't be brought up to date is
 * refused with both versions of the content.
 */
export async function bringUpToDate(
  dependencies: Dependencies,
  journal: Journal,
  step: Step,
  unit: Unit,
): Promise<Outcome<Step>> {
  const block = staleBlock(journal, step);
  if (block === null) return { ok: true, value: step };
  const base = 'baseVersion' in step ? step.baseVersion : block.version;
  const newer = await newerSteps(dependencies, journal, block, block.version - base, unit);
  if (block.removedAt !== null) return refuseStale('blockRemoved', block, step, newer);
  const rebased = rebaseStep(
    step,
    newer.map(({ forward }) => forward),
  );
  if (!rebased.ok) return refuseStale('staleEdit', block, step, newer);
  return rebased;
}

/** The block that a content step was not made against as it is now; null when it was. */
function staleBlock({ report }: Journal, step: Step): Block | null {
  const blockId = contentChangedBy(step);
  const block = report.blocks.find(({ id }) => id === blockId);
  if (block === undefined || !('baseVersion' in step)) return null;
  return block.version > step.baseVersion || block.removedAt !== null ? block : null;
}

/** The last `count` steps that changed the content of a block, oldest first. */
async function newerSteps(
  { database }: Dependencies,
  { opened, made }: Journal,
  block: Block,
  count: number,
  unit: Unit,
): Promise<readonly StoredStep[]> {
  const changes = ({ forward }: StoredStep): boolean => contentChangedBy(forward) === block.id;
  const found = made.filter(changes).toReversed();
  let before = opened.report.seq + 1;
  while (found.length < count && before > 1) {
    const page = await database.stores.steps.before(opened.report.id, before, PAGE, unit);
    found.push(...page.filter(changes));
    before = page.at(-1)?.seq ?? 0;
  }
  return found.slice(0, count).toReversed();
}
