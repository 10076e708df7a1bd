import { signal } from '@angular/core';
import { TestBed } from '@angular/core/testing';
import type { StudyView } from '#shared/api';
import type { Tally, TallyRequest } from '#shared/tally';
import { type Observable, of, throwError } from 'rxjs';
import { beforeEach, expect, it } from 'vitest';
import { ApiProblem } from '../../server-api/api-problem';
import { DataApi } from '../../server-api/data-api';
import { CurrentStudy } from '../../session/current-study';
import { ComputedAnswers } from '../computing/computed-answers';
import { Computing, COMPUTING_WORKER } from '../computing/computing';
import { withMethod, withReference, withStratumToggled } from '../draft/analysis-draft';
import { OwnWorker } from '../testing/own-worker';
import { CODE_BOOK, OUTCOME, SPECIFICATION, TALLY } from '../testing/wet-work';
import { BenchStore } from './bench-store';
import { CountsStore } from './counts-store';

let asked: TallyRequest[];
let answer: () => Observable<Tally>;
let store: BenchStore;
let worker: OwnWorker;

const study = {
  id: 's',
  design: 'cohort',
  peopleNoun: 'workers',
  population: '',
  outcomes: [OUTCOME],
} as unknown as StudyView;

beforeEach(() => {
  asked = [];
  worker = new OwnWorker();
  answer = () => of(TALLY);
  const api: Pick<DataApi, 'count'> = {
    count: (_studyId, _cutId, request) => {
      asked.push(request);
      return answer();
    },
  };
  TestBed.configureTestingModule({
    providers: [
      BenchStore,
      Computing,
      CountsStore,
      ComputedAnswers,
      { provide: COMPUTING_WORKER, useValue: () => worker },
      { provide: DataApi, useValue: api },
      { provide: CurrentStudy, useValue: { study: signal(study), may: () => true } },
    ],
  });
  store = TestBed.inject(BenchStore);
  store.codeBookView.set({ dataSetId: 'd', number: 1, content: CODE_BOOK });
  store.cutId.set('c1');
});

function settle(): void {
  TestBed.tick();
}

it('computes nothing before the contrast is picked', () => {
  settle();
  expect(store.state().kind).toBe('unpicked');
  expect(asked).toEqual([]);
});

it('counts once, and follows reference and method without asking again', () => {
  store.draft.set(SPECIFICATION);
  settle();
  expect(store.state().kind).toBe('computed');
  expect(asked).toEqual([{ columnIds: ['eczema', 'work', 'place'], restrictions: [] }]);

  store.change((draft) => withReference(draft, 'much'));
  settle();
  expect(store.result()?.frame.exposure.referenceLevelId).toBe('much');
  store.change((draft) => withMethod(draft, 'riskDifference', 'wald'));
  settle();
  const measures = store.result()?.crude.contrasts[0]?.measures;
  expect(measures?.riskDifference).toMatchObject({ value: { interval: { method: 'wald' } } });
  expect(asked).toHaveLength(1);
});

it('asks again for other columns, and keeps known counts', () => {
  store.draft.set({ ...SPECIFICATION, stratumColumnIds: [], adjustment: 'crude' });
  settle();
  store.change((draft) => withStratumToggled(draft, CODE_BOOK, 'place'));
  settle();
  store.change((draft) => withStratumToggled(draft, CODE_BOOK, 'place'));
  settle();
  expect(asked.map(({ columnIds }) => columnIds.length)).toEqual([2, 3]);
});

it('shows the pooled layer as soon as there are strata, then what is chosen', () => {
  store.draft.set(SPECIFICATION);
  settle();
  expect(store.scope()).toEqual({ kind: 'pooled' });
  store.scope.set({ kind: 'stratum', stratumId: 'kitchen' });
  store.change((draft) => withReference(draft, 'some'));
  settle();
  expect(store.scope()).toEqual({ kind: 'stratum', stratumId: 'kitchen' });
});

it('says why counting was refused, and counts again when asked to', () => {
  answer = () => throwError(() => new ApiProblem({ code: 'busy', title: 'The server is busy.' }));
  store.draft.set(SPECIFICATION);
  settle();
  expect(store.state()).toMatchObject({
    kind: 'refused',
    problem: { title: 'The server is busy.' },
  });
  answer = () => of(TALLY);
  store.countAgain();
  expect(store.state().kind).toBe('computed');
});

it('leaves methods that take their time to the worker, and keeps the last result in view', () => {
  store.draft.set(SPECIFICATION);
  settle();
  expect(store.result()).not.toBeNull();
  store.change((draft) => withMethod(draft, 'riskDifference', 'chanZhang'));
  settle();
  expect(store.state().kind).toBe('counting');
  const before = store.result()?.crude.contrasts[0]?.measures.riskDifference;
  expect(before).toMatchObject({ value: { interval: { method: 'newcombe' } } });
  worker.answer();
  expect(store.state().kind).toBe('computed');
  const after = store.result()?.crude.contrasts[0]?.measures.riskDifference;
  expect(after).toMatchObject({ value: { interval: { method: 'chanZhang' } } });
});

it('says that a computation broke off, and computes again when asked to', () => {
  store.draft.set(withMethod(SPECIFICATION, 'riskDifference', 'chanZhang'));
  settle();
  worker.break();
  expect(store.state().kind).toBe('broken');
  store.computeAgain();
  worker.answer();
  expect(store.state().kind).toBe('computed');
});

it('says what makes an analysis impossible', () => {
  const restrictions = [{ columnId: 'work', levelIds: ['none'] }];
  store.draft.set({ ...SPECIFICATION, restrictions });
  settle();
  expect(store.state()).toMatchObject({
    kind: 'impossible',
    issue: { code: 'fewerThanTwoExposureLevels' },
  });
});
