import { computed, DestroyRef, effect, inject, Injectable, signal } from '@angular/core';
import { takeUntilDestroyed } from '@angular/core/rxjs-interop';
import type { StepsView } from '#shared/api';
import {
  catchError,
  concatMap,
  defer,
  EMPTY,
  exhaustMap,
  filter,
  finalize,
  from,
  fromEvent,
  interval,
  map,
  merge,
  mergeMap,
  type Observable,
  of,
  Subject,
  tap,
} from 'rxjs';
import { ApiProblem } from '../../server-api/api-problem';
import { NOW } from '../../ui/clock';
import { type MadeStep, takenStepOf } from './made-step';
import type { RefusedStep } from './refused-step';
import { ReportState } from './report-state';
import {
  contest,
  dropSteps,
  missesSteps,
  openSharedReport,
  sendableSteps,
  type SharedReport,
  takeSteps,
} from './shared-report';
import { StepTransport } from './step-transport';
import { UnsentSteps } from './unsent-steps';

const LARGEST_BATCH = 50;
const LOOK_EVERY_MILLISECONDS = 30_000;

/**
 * Carries steps to the server, in order, for as long as it takes, and brings back what others did.
 *
 * A lost answer does no harm: steps keep their ids. A newer edit of the same block is fetched and
 * becomes a conflict for the person to settle; a refusal takes the step out and says why.
 */
@Injectable()
export class ReportSync {
  private readonly state = inject(ReportState);
  private readonly transport = inject(StepTransport);
  private readonly unsent = inject(UnsentSteps);
  private readonly now = inject(NOW);
  private readonly destroyed = inject(DestroyRef);
  private readonly sending = new Subject<void>();
  private readonly looking = new Subject<void>();
  private readonly sources = new Subject<void>();
  private largestBatch = LARGEST_BATCH;
  private contestedId: string | null = null;

  /** Steps that the server will not take, for the person to see. */
  readonly refused = signal<readonly RefusedStep[]>([]);
  /** Steps of an earlier visit that have not reached the server yet. */
  readonly recovering = signal<readonly MadeStep[]>([]);
  /** Whether the server has everything that was made here. */
  readonly allSent = computed(
    () => this.state.pending().length === 0 && this.recovering().length === 0,
  );
  /** Called before steps of others come in, so that an open editor hands over what it holds. */
  beforeOthers: () => void = () => undefined;

  constructor() {
    effect(() => {
      this.keepUnsent();
    });
    effect(() => {
      if (this.state.lacksSources()) this.sources.next();
    });
  }

  /** Begins to work once the report is open; first sends what earlier visits could not. */
  start(): void {
    this.run(this.sending, () => this.sendAll());
    this.run(merge(this.looking, occasions()), () =>
      this.catchUp().pipe(
        finalize(() => {
          this.send();
        }),
      ),
    );
    this.run(this.sources, () => this.readSources());
    this.recover(this.unsent.takeOver(this.state.place()?.reportId ?? ''));
  }

  /** Sends what is waiting. */
  send(): void {
    this.sending.next();
  }

  /** Keeps in this browser what is waiting, at once: the page may go away. */
  keepUnsent(): void {
    const place = this.state.place();
    const steps = [...this.recovering(), ...this.state.pending()];
    if (place !== null) this.unsent.keep(place.reportId, steps);
  }

  /** Looks for steps of others. */
  look(): void {
    this.looking.next();
  }

  dismiss(refusal: RefusedStep): void {
    this.refused.update((list) => list.filter((each) => each !== refusal));
  }

  private run(occasion: Observable<unknown>, work: () => Observable<unknown>): void {
    const quiet = (): Observable<unknown> => work().pipe(catchError(() => EMPTY));
    occasion.pipe(exhaustMap(quiet), takeUntilDestroyed(this.destroyed)).subscribe();
  }

  private sendAll(): Observable<unknown> {
    return defer(() => {
      const ids = this.state
        .pending()
        .slice(0, this.largestBatch)
        .map((made) => made.id);
      if (ids.length === 0) return EMPTY;
      return this.transport
        .submit(() => sendableSteps(this.shared(), ids))
        .pipe(
          mergeMap((view) => this.takeIn(view)),
          catchError((failure: unknown) => this.settle(ids, ApiProblem.from(failure))),
          mergeMap(() => this.sendAll()),
        );
    });
  }

  /** After a refusal a batch goes step by step; a stale edit is rebased or contested. */
  private settle(ids: readonly string[], problem: ApiProblem): Observable<unknown> {
    const [first = ''] = ids;
    if (ids.length > 1) {
      this.largestBatch = 1;
      return of(null);
    }
    this.largestBatch = LARGEST_BATCH;
    if (problem.status !== 409 || this.contestedId === first) return this.giveUp(first, problem);
    this.contestedId = first;
    return this.catchUp();
  }

  private giveUp(id: string, problem: ApiProblem): Observable<unknown> {
    const made = this.state.pending().find((each) => each.id === id);
    if (made !== undefined) this.refuse(made, problem);
    this.update((shared) => dropSteps(shared, [id], this.at()));
    return this.catchUp();
  }

  private refuse(made: MadeStep, problem: ApiProblem): void {
    const { blockId, yours } = problem.facts;
    if (problem.status === 409 && typeof blockId === 'string' && yours !== undefined) {
      const conflict = { blockId, mine: yours, author: null, at: this.at() };
      this.update((shared) => contest(shared, conflict, this.at()));
    } else {
      this.refused.update((list) => [...list, { made, problem }]);
    }
  }

  private takeIn(view: StepsView): Observable<unknown> {
    const taken = view.steps.flatMap((step) => takenStepOf(step) ?? []);
    this.beforeOthers();
    if (taken.length < view.steps.length) return this.readAgain();
    if (missesSteps(this.shared(), taken)) return this.catchUp();
    const after = takeSteps(this.shared(), taken, this.at());
    if (!after.ok) return this.readAgain();
    this.state.shared.set(after.value);
    this.state.lastSavedAt.set(this.at());
    return view.seq > after.value.taken.report.seq ? this.catchUp() : of(null);
  }

  private catchUp(): Observable<unknown> {
    return this.transport.stepsAfter(this.shared().taken.report.seq).pipe(
      mergeMap((view) => {
        const taken = view.steps.flatMap((step) => takenStepOf(step) ?? []);
        const whole = taken.length === view.steps.length;
        return whole && !missesSteps(this.shared(), taken) ? this.takeIn(view) : this.readAgain();
      }),
    );
  }

  /** When the steps between do not lead to what the server has, its report is read anew. */
  private readAgain(): Observable<unknown> {
    return this.transport.read().pipe(
      tap((view) => {
        const { pending, conflicts } = this.shared();
        this.state.takeSources(view);
        this.state.shared.set({ ...openSharedReport(view.report), conflicts });
        this.recover(pending);
      }),
    );
  }

  private readSources(): Observable<unknown> {
    return this.transport.read().pipe(
      tap((view) => {
        this.state.takeSources(view);
      }),
    );
  }

  /** Steps whose fate is unknown are sent one by one, without showing them twice meanwhile. */
  private recover(steps: readonly MadeStep[]): void {
    this.recovering.update((list) => [...list, ...steps]);
    from(steps)
      .pipe(
        concatMap((made) => this.recoverOne(made).pipe(map(() => made))),
        takeUntilDestroyed(this.destroyed),
      )
      .subscribe((made) => {
        this.recovering.update((list) => list.filter((each) => each !== made));
      });
  }

  private recoverOne(made: MadeStep): Observable<unknown> {
    return this.transport
      .submit(() => [made])
      .pipe(
        mergeMap((view) => this.takeIn(view)),
        catchError((failure: unknown) => {
          this.refuse(made, ApiProblem.from(failure));
          return of(null);
        }),
      );
  }

  private at(): string {
    return this.now().toISOString();
  }

  private shared(): SharedReport {
    const shared = this.state.shared();
    if (shared === null) throw new Error('No report is open.');
    return shared;
  }

  private update(change: (shared: SharedReport) => SharedReport): void {
    this.state.shared.set(change(this.shared()));
  }
}

/** When it is worth looking what others did: the page is looked at again, or every so often. */
function occasions(): Observable<unknown> {
  const looked = merge(fromEvent(window, 'focus'), fromEvent(window, 'online'));
  return merge(looked, interval(LOOK_EVERY_MILLISECONDS)).pipe(
    filter(() => document.visibilityState === 'visible'),
  );
}
