import { describe, expect, it } from 'vitest';
import type { Report } from '#shared/report';
import type { MadeStep } from './made-step';
import { type Chain, linkStep } from './step-chain';
import { made, prose, reportOf, rewriting, typing, wordsOf } from './testing/reports';
import { EMPTY_HISTORY, undoSteps, type UndoStep, withAction } from './undo-history';

const AT = '2025-12-01T09:00:00.000Z';

function chainOf(...steps: MadeStep[]): Chain {
  return steps.reduce<Chain>(
    (chain, step) => {
      const next = linkStep(chain, step, AT);
      if (!next.ok) throw new Error(next.issue.code);
      return next.value;
    },
    { report: reportOf(prose('p', 'risk rose'), prose('q', 'nothing', 'a1')), links: [] },
  );
}

let undoCount = 0;

function apply(chain: Chain, { undoes, step }: UndoStep): Chain | null {
  undoCount += 1;
  const next = linkStep(chain, { id: `u${undoCount}`, groupId: 'undo', undoes, step }, AT);
  return next.ok ? next.value : null;
}

function undone(chain: Chain, groupId: string): Report {
  const steps = undoSteps(chain, groupId, apply);
  if (!steps.ok) throw new Error(steps.issue);
  return steps.value.reduce((each, undo) => apply(each, undo)!, chain).report;
}

describe('the history', () => {
  it('counts steps of one action once, and forgets what was undone', () => {
    const history = withAction(withAction({ ...EMPTY_HISTORY, undone: ['x'] }, 'a'), 'a');
    expect(history).toEqual({ done: ['a'], undone: [] });
  });
});

describe('undo', () => {
  it('takes back all steps of an action, last first', () => {
    const chain = chainOf(
      made('1', typing('p', 1, 0, 'The '), 'g'),
      made('2', typing('p', 2, 4, 'true '), 'g'),
    );
    expect(wordsOf(undone(chain, 'g'), 'p')).toBe('risk rose');
  });

  it('keeps what was written elsewhere in the text since', () => {
    const chain = chainOf(
      made('1', typing('p', 1, 0, 'The '), 'g'),
      made('x', typing('p', 2, 13, ' sharply')),
    );
    expect(wordsOf(undone(chain, 'g'), 'p')).toBe('risk rose sharply');
  });

  it('takes back a replaced content when later edits of it were taken back too', () => {
    const chain = chainOf(
      made('1', rewriting('p', 1, 'risk fell'), 'g'),
      made('2', typing('p', 2, 9, ' a lot'), 'h'),
    );
    const steps = undoSteps(chain, 'h', apply);
    const back = steps.ok ? apply(chain, steps.value[0]!)! : chain;
    expect(wordsOf(back.report, 'p')).toBe('risk fell');
    expect(wordsOf(undone(back, 'g'), 'p')).toBe('risk rose');
  });

  it('refuses when the block has been written anew since', () => {
    const chain = chainOf(
      made('1', typing('p', 1, 0, 'The '), 'g'),
      made('x', rewriting('p', 2, 'other words')),
    );
    expect(undoSteps(chain, 'g', apply)).toEqual({ ok: false, issue: 'changedSince' });
  });

  it('stops at numbers that moved, not at an analysis shown for the first time', () => {
    const pin = (resultId: string) => ({ kind: 'movePin', analysisId: 'a', resultId }) as const;
    const first = chainOf(made('1', typing('p', 1, 0, 'The '), 'g'), made('2', pin('r1')));
    expect(wordsOf(undone(first, 'g'), 'p')).toBe('risk rose');
    const moved = linkStep(first, made('3', pin('r2')), AT);
    expect(moved.ok && undoSteps(moved.value, 'g', apply)).toEqual({
      ok: false,
      issue: 'numbersMovedSince',
    });
  });

  it('leaves the pin that came with the action', () => {
    const pin = { kind: 'movePin', analysisId: 'a', resultId: 'r1' } as const;
    const chain = chainOf(
      made('pin', pin, 'g'),
      made('1', { kind: 'removeBlock', blockId: 'p' }, 'g'),
    );
    const steps = undoSteps(chain, 'g', apply);
    expect(steps.ok && steps.value.map(({ undoes }) => undoes)).toEqual(['1']);
  });

  it('puts back a block that was taken out', () => {
    const chain = chainOf(made('1', { kind: 'removeBlock', blockId: 'p' }, 'g'));
    expect(undone(chain, 'g').blocks.find(({ id }) => id === 'p')?.removedAt).toBeNull();
  });

  it('has nothing to do for an action that it does not know', () => {
    expect(undoSteps(chainOf(), 'g', apply)).toEqual({ ok: false, issue: 'nothingToUndo' });
  });
});
