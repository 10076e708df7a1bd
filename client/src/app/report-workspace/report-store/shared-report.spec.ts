import { describe, expect, it } from 'vitest';
import {
  contest,
  dropSteps,
  makeStep,
  missesSteps,
  openSharedReport,
  sendableSteps,
  settleConflict,
  type SharedReport,
  takeSteps,
} from './shared-report';
import type { MadeStep, TakenStep } from './made-step';
import {
  deleting,
  made,
  prose,
  reportOf,
  rewriting,
  taken,
  typing,
  wordsOf,
} from './testing/reports';

const AT = '2025-12-01T09:00:00.000Z';

function opened(): SharedReport {
  return openSharedReport(reportOf(prose('p', 'risk rose'), prose('q', 'nothing', 'a1')));
}

function after(shared: SharedReport, ...steps: MadeStep[]): SharedReport {
  return steps.reduce((report, step) => {
    const next = makeStep(report, step, AT);
    if (!next.ok) throw new Error(next.issue.code);
    return next.value;
  }, shared);
}

function having(shared: SharedReport, ...steps: TakenStep[]): SharedReport {
  const next = takeSteps(shared, steps, AT);
  if (!next.ok) throw new Error(next.issue.code);
  return next.value;
}

const words = ({ local }: SharedReport, blockId = 'p'): string => wordsOf(local.report, blockId);
const ids = ({ pending }: SharedReport): string[] => pending.map(({ id }) => id);

describe('steps made here', () => {
  it('show at once, before the server knows them', () => {
    const shared = after(opened(), made('1', typing('p', 1, 0, 'The ')));
    expect(words(shared)).toBe('The risk rose');
    expect(wordsOf(shared.taken.report, 'p')).toBe('risk rose');
    expect(ids(shared)).toEqual(['1']);
  });

  it('are refused against another version than the one in view', () => {
    const stale = makeStep(opened(), made('1', typing('p', 7, 0, 'The ')), AT);
    expect(stale).toMatchObject({ ok: false, issue: { code: 'staleEdit' } });
  });

  it('stop waiting once the server has taken them', () => {
    const step = made('1', typing('p', 1, 0, 'The '));
    const shared = having(after(opened(), step), taken(11, '1', step.step));
    expect(ids(shared)).toEqual([]);
    expect(words(shared)).toBe('The risk rose');
    expect(shared.taken.report.seq).toBe(11);
  });

  it('are applied once although the server answers twice', () => {
    const step = made('1', typing('p', 1, 0, 'The '));
    const answer = taken(11, '1', step.step);
    expect(words(having(after(opened(), step), answer, answer))).toBe('The risk rose');
  });

  it('go without the ones that the server will not take', () => {
    const shared = after(
      opened(),
      made('1', typing('p', 1, 0, 'The ')),
      made('2', typing('q', 1, 0, 'All or ')),
    );
    const dropped = dropSteps(shared, ['1'], AT);
    expect(words(dropped)).toBe('risk rose');
    expect(words(dropped, 'q')).toBe('All or nothing');
    expect(dropped.conflicts).toEqual([]);
  });
});

describe('steps of others', () => {
  it('are mapped under words that wait here, however many edits they are', () => {
    const mine = after(
      opened(),
      made('1', typing('p', 1, 9, ' with')),
      made('2', typing('p', 2, 14, ' dose')),
    );
    const shared = having(mine, taken(11, 'x', typing('p', 1, 0, 'The ')));
    expect(words(shared)).toBe('The risk rose with dose');
    expect(ids(shared)).toEqual(['1', '2']);
    expect(shared.conflicts).toEqual([]);
  });

  it('leave what is sent made against the newest version', () => {
    const mine = after(
      opened(),
      made('1', typing('p', 1, 9, ' with')),
      made('2', typing('p', 2, 14, ' dose')),
    );
    const shared = having(mine, taken(11, 'x', typing('p', 1, 0, 'The ')));
    const versions = sendableSteps(shared, ['1', '2']).map(
      ({ step }) => 'baseVersion' in step && step.baseVersion,
    );
    expect(versions).toEqual([2, 3]);
  });

  it('lead to the same words as on the server', () => {
    const mine = after(
      opened(),
      made('1', typing('p', 1, 9, ' with')),
      made('2', typing('p', 2, 14, ' dose')),
    );
    const others = having(mine, taken(11, 'x', typing('p', 1, 0, 'The ')));
    const [first, second] = sendableSteps(others, ['1', '2']);
    const shared = having(others, taken(12, '1', first!.step), taken(13, '2', second!.step));
    expect(wordsOf(shared.taken.report, 'p')).toBe('The risk rose with dose');
    expect(shared.pending).toEqual([]);
  });

  it('leave other blocks alone', () => {
    const mine = after(opened(), made('1', rewriting('p', 1, 'my words')));
    const shared = having(mine, taken(11, 'x', rewriting('q', 1, 'their words')));
    expect(words(shared)).toBe('my words');
    expect(words(shared, 'q')).toBe('their words');
  });

  it('lose to a later move made here', () => {
    const move = {
      kind: 'moveBlock',
      blockId: 'p',
      basePositionVersion: 1,
      orderKey: 'a2',
    } as const;
    const mine = after(opened(), made('1', move));
    const shared = having(mine, taken(11, 'x', { ...move, orderKey: 'a5' }));
    expect(shared.local.report.blocks.find(({ id }) => id === 'p')?.orderKey).toBe('a2');
    expect(sendableSteps(shared, ['1'])[0]?.step).toMatchObject({ basePositionVersion: 2 });
  });

  it('leave a gap when their numbers do not follow', () => {
    const shared = opened();
    expect(missesSteps(shared, [taken(11, 'x', typing('p', 1, 0, 'a'))])).toBe(false);
    expect(missesSteps(shared, [taken(12, 'x', typing('p', 1, 0, 'a'))])).toBe(true);
  });
});

describe('edits that contradict each other', () => {
  const contradicted = (): SharedReport =>
    having(
      after(opened(), made('1', deleting('p', 1, 5, 9)), made('2', typing('p', 2, 5, 'fell'))),
      taken(11, 'x', deleting('p', 1, 6, 8), 'Tomas Lind'),
    );

  it('keep both versions and name who made the other', () => {
    const { conflicts } = contradicted();
    expect(conflicts).toHaveLength(1);
    expect(conflicts[0]).toMatchObject({ blockId: 'p', author: 'Tomas Lind' });
    expect(JSON.stringify(conflicts[0]!.mine)).toContain('risk fell');
    expect(words(contradicted())).toBe('risk re');
  });

  it('take no later edit of the same block for one against the newer version', () => {
    const shared = contradicted();
    expect(shared.pending).toEqual([]);
    expect(shared.local.report.blocks.find(({ id }) => id === 'p')?.version).toBe(2);
  });

  it('are no conflict when both made the same of it', () => {
    const mine = after(opened(), made('1', rewriting('p', 1, 'risk fell')));
    const shared = having(mine, taken(11, 'x', rewriting('p', 1, 'risk fell')));
    expect(shared.conflicts).toEqual([]);
    expect(shared.pending).toEqual([]);
  });

  it('keep my words of a block that somebody took out', () => {
    const mine = after(opened(), made('1', typing('p', 1, 0, 'The ')));
    const shared = having(mine, taken(11, 'x', { kind: 'removeBlock', blockId: 'p' }));
    expect(JSON.stringify(shared.conflicts[0]?.mine)).toContain('The risk rose');
  });

  it('can be opened by what the server says', () => {
    const mine = after(opened(), made('1', rewriting('p', 1, 'risk fell')));
    const conflict = { blockId: 'p', mine: { its: 'words' }, author: null, at: AT };
    const shared = contest(mine, conflict, AT);
    expect(shared.conflicts).toEqual([conflict]);
    expect(shared.pending).toEqual([]);
    expect(words(shared)).toBe('risk rose');
  });

  it('end when they are settled', () => {
    expect(settleConflict(contradicted(), 'p').conflicts).toEqual([]);
  });
});
