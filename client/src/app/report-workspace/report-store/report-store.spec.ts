import { signal } from '@angular/core';
import { TestBed } from '@angular/core/testing';
import type { Step } from '#shared/report';
import { beforeEach, describe, expect, it, vi } from 'vitest';
import { ApiProblem } from '../../server-api/api-problem';
import { ReportsApi } from '../../server-api/reports-api';
import { SessionStore } from '../../session/session-store';
import { DraftKeeper } from './draft-keeper';
import { ReportState } from './report-state';
import { ReportStore } from './report-store';
import { ReportSync } from './report-sync';
import { tryAgainNow } from './retry-delay';
import { SaveState } from './save-state';
import { StepTransport } from './step-transport';
import { FakeServer } from './testing/fake-server';
import { deleting, made, prose, reportOf, rewriting, typing, wordsOf } from './testing/reports';
import { UnsentSteps } from './unsent-steps';

const PLACE = { studyId: 'study-1', reportId: 'report-1' };
const OUT_OF_REACH = new ApiProblem({ code: 'outOfReach', title: 'Out of reach.' });
const FORBIDDEN = new ApiProblem({ code: 'forbidden', title: 'Not allowed.', status: 403 });
const UNSENT = 'evenhand.unsent.p1.report-1.';

let server: FakeServer;
let store: ReportStore;

function configure(): void {
  TestBed.resetTestingModule();
  TestBed.configureTestingModule({
    providers: [
      ReportState,
      ReportStore,
      ReportSync,
      StepTransport,
      UnsentSteps,
      DraftKeeper,
      SaveState,
      { provide: ReportsApi, useValue: server },
      { provide: SessionStore, useValue: { person: signal({ id: 'p1' }) } },
    ],
  });
  store = TestBed.inject(ReportStore);
}

function open(): void {
  configure();
  store.open(PLACE).subscribe();
  TestBed.tick();
}

beforeEach(() => {
  localStorage.clear();
  server = new FakeServer(reportOf(prose('p', 'risk rose'), prose('q', 'nothing', 'a1')));
  open();
});

function make(...steps: Step[]): void {
  const done = store.dispatch(steps);
  if (!done.ok) throw new Error(done.issue.code);
  TestBed.tick();
}

const here = (blockId = 'p'): string => wordsOf(store.report()!, blockId);
const there = (blockId = 'p'): string => wordsOf(server.report, blockId);
const saved = (): string => TestBed.inject(SaveState).words().kind;
const kept = (): string[] => Object.keys(localStorage).filter((key) => key.startsWith(UNSENT));

describe('a change', () => {
  it('shows here and reaches the server', () => {
    make(typing('p', 1, 0, 'The '));
    expect([here(), there(), saved()]).toEqual(['The risk rose', 'The risk rose', 'saved']);
  });

  it('of several steps is made whole or not at all', () => {
    const done = store.dispatch([typing('p', 1, 0, 'The '), rewriting('q', 9, 'late')]);
    expect(done.ok).toBe(false);
    expect([here(), server.requests]).toEqual(['risk rose', 0]);
  });

  it('is taken back and done again by new steps', () => {
    make(typing('p', 1, 0, 'The '));
    store.undo();
    expect([here(), there()]).toEqual(['risk rose', 'risk rose']);
    store.redo();
    expect([here(), there()]).toEqual(['The risk rose', 'The risk rose']);
    expect(server.accepted).toHaveLength(3);
  });
});

describe('out of reach of the server', () => {
  it('keeps the work, says so, and sends it once in order', () => {
    server.failures.push(OUT_OF_REACH);
    make(typing('p', 1, 0, 'The '));
    make(typing('p', 2, 13, ' again'));
    expect([here(), there(), saved()]).toEqual(['The risk rose again', 'risk rose', 'stuck']);
    expect(kept()).toHaveLength(1);
    tryAgainNow.next();
    TestBed.tick();
    expect([there(), saved(), kept().length]).toEqual(['The risk rose again', 'saved', 0]);
    expect(server.accepted).toHaveLength(2);
  });

  it('gives up a request that is never answered, says so, and asks again', () => {
    vi.useFakeTimers();
    server.failures.push('never answers');
    make(typing('p', 1, 0, 'The '));
    expect(saved()).toBe('saving');
    vi.advanceTimersByTime(15_000);
    expect([saved(), there()]).toEqual(['stuck', 'risk rose']);
    vi.advanceTimersByTime(1_000);
    expect([saved(), there()]).toEqual(['saved', 'The risk rose']);
    vi.useRealTimers();
  });

  it('leaves the work to the next visit, which sends it', () => {
    server.failures.push(OUT_OF_REACH);
    make(typing('p', 1, 0, 'The '));
    open();
    TestBed.tick();
    expect([here(), there(), kept().length]).toEqual(['The risk rose', 'The risk rose', 0]);
  });

  it('does not apply again what arrived although its answer was lost', () => {
    const step = made('lost', typing('p', 1, 0, 'The '));
    TestBed.inject(UnsentSteps).keep('report-1', [step]);
    server.submitSteps('', '', { steps: [step as never] });
    open();
    expect([here(), there()]).toEqual(['The risk rose', 'The risk rose']);
    expect(store.conflicts()).toEqual([]);
  });
});

describe('somebody else', () => {
  it('who wrote elsewhere in the text is mapped in', () => {
    server.other(typing('p', 1, 0, 'The '));
    make(typing('p', 1, 9, ' again'));
    TestBed.inject(ReportSync).look();
    expect([here(), there()]).toEqual(['The risk rose again', 'The risk rose again']);
  });

  it('who contradicts leaves both versions to choose from', () => {
    server.other(deleting('p', 1, 5, 9));
    make(deleting('p', 1, 6, 8));
    expect([here(), saved()]).toEqual(['risk ', 'contested']);
    const [conflict] = store.conflicts();
    expect(conflict).toMatchObject({ blockId: 'p', author: 'Tomas Lind' });
    store.keepMine(conflict!);
    expect([here(), there(), saved()]).toEqual(['risk re', 'risk re', 'saved']);
  });

  it('may be given way to, and mine can still be put back', () => {
    server.other(rewriting('p', 1, 'their words'));
    make(rewriting('p', 1, 'my words'));
    const [conflict] = store.conflicts();
    store.takeTheirs(conflict!);
    expect([here(), store.conflicts().length]).toEqual(['their words', 0]);
    store.keepMine(conflict!);
    expect(there()).toBe('my words');
  });

  it('who took the block out leaves my words to be put back with it', () => {
    server.other({ kind: 'removeBlock', blockId: 'p' });
    make(rewriting('p', 1, 'my words'));
    const [conflict] = store.conflicts();
    store.keepMine(conflict!);
    expect(there()).toBe('my words');
    expect(server.report.blocks[0]?.removedAt).toBeNull();
  });
});

describe('a refusal', () => {
  it('takes out that step only, and shows what was in it', () => {
    server.failures.push(FORBIDDEN, FORBIDDEN);
    make(rewriting('p', 1, 'my words'), typing('q', 1, 0, 'All or '));
    expect([here(), here('q'), there('q')]).toEqual([
      'risk rose',
      'All or nothing',
      'All or nothing',
    ]);
    const [refused] = TestBed.inject(ReportSync).refused();
    expect(refused?.problem.title).toBe('Not allowed.');
    expect(JSON.stringify(refused?.made.step)).toContain('my words');
  });
});
