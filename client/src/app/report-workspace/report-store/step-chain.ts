import { applyStep, type Block, contentChangedBy, type Report, type Step } from '#shared/report';
import type { StepIssue } from '#shared/report';
import { type Result, success } from '#shared/core';
import type { MadeStep } from './made-step';

/** A step that was applied, with what takes it back and what it made of its block. */
export interface ChainLink extends MadeStep {
  readonly inverse: Step;
  /** Content of the block that the step changed, right after it; undefined for other steps. */
  readonly contentAfter: unknown;
  /** Whether an analysis that was shown already shows another result since. */
  readonly movedNumbers: boolean;
}

/** A report, and the steps that led to it from where the chain began. */
export interface Chain {
  readonly report: Report;
  readonly links: readonly ChainLink[];
}

/** Applies one more step to a chain. Moves are made against the place a block has now. */
export function linkStep(chain: Chain, made: MadeStep, at: string): Result<Chain, StepIssue> {
  const step = atPresentPlace(chain.report, made.step);
  const applied = applyStep(chain.report, step, { at });
  if (!applied.ok) return applied;
  const { report, inverse } = applied.value;
  const link: ChainLink = {
    ...made,
    step,
    inverse,
    contentAfter: contentAfter(report, step),
    movedNumbers: movesNumbers(chain.report, step),
  };
  return success({ report, links: [...chain.links, link] });
}

/** Whoever moves a block last has the last word: order is never worth a question. */
function atPresentPlace(report: Report, step: Step): Step {
  if (step.kind !== 'moveBlock') return step;
  const present = blockWithId(report, step.blockId)?.positionVersion;
  return present === undefined ? step : { ...step, basePositionVersion: present };
}

/** The block with this id, removed or not. */
export function blockWithId(report: Report, blockId: string): Block | undefined {
  return report.blocks.find((block) => block.id === blockId);
}

function contentAfter(report: Report, step: Step): unknown {
  const changed = contentChangedBy(step);
  return changed === null ? undefined : blockWithId(report, changed)?.content;
}

/** The first pin of an analysis moves nothing: no number was shown before. */
function movesNumbers(before: Report, step: Step): boolean {
  return step.kind === 'movePin' && before.pins[step.analysisId] !== undefined;
}
