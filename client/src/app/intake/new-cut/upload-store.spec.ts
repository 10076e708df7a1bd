import { signal } from '@angular/core';
import { TestBed } from '@angular/core/testing';
import type { UploadView } from '#shared/api';
import { type Observable, of, throwError } from 'rxjs';
import { afterEach, beforeEach, expect, it, vi } from 'vitest';
import { ApiProblem } from '../../server-api/api-problem';
import { DataApi } from '../../server-api/data-api';
import { CurrentStudy } from '../../session/current-study';
import { UploadStore } from './upload-store';

const reading: UploadView = {
  id: 'u1',
  fileName: 'a.csv',
  state: 'reading',
  progress: 0.5,
  rowsRead: 10,
  profile: null,
  proposedCodeBook: null,
  problem: null,
  cutId: null,
  dataSetId: null,
};

let answers: Observable<UploadView>[];
let discarded: string[];
let store: UploadStore;

beforeEach(() => {
  vi.useFakeTimers();
  answers = [];
  discarded = [];
  const api = {
    upload: () => of({ kind: 'sending', share: 0.5 }, { kind: 'answered', answer: reading }),
    readUpload: () => answers.shift() ?? of(reading),
    discardUpload: (_studyId: string, uploadId: string) => {
      discarded.push(uploadId);
      return of(undefined);
    },
  };
  TestBed.configureTestingModule({
    providers: [
      UploadStore,
      { provide: DataApi, useValue: api },
      { provide: CurrentStudy, useValue: { study: signal({ id: 's' }) } },
    ],
  });
  store = TestBed.inject(UploadStore);
});

afterEach(() => {
  vi.useRealTimers();
});

const send = () => {
  store.send(new File(['a,b'], 'a.csv'), null);
};

it('asks how the reading goes until it has an end', () => {
  answers = [of(reading), of({ ...reading, state: 'profiled', progress: 1 })];
  send();
  vi.advanceTimersByTime(10);
  expect(store.isReading()).toBe(true);
  vi.advanceTimersByTime(2000);
  expect(store.isProfiled()).toBe(true);
  expect(answers).toEqual([]);
});

it('says why a file was refused, and what to do', () => {
  const problem = { code: 'fileEmpty', message: 'The file is empty.', wayOut: 'Choose another.' };
  answers = [of({ ...reading, state: 'failed', problem })];
  send();
  vi.advanceTimersByTime(1000);
  expect(store.problem()).toMatchObject({ title: 'The file is empty.', wayOut: 'Choose another.' });
});

it('lets go of a file that the server holds no more', () => {
  answers = [throwError(() => new ApiProblem({ code: 'gone', title: 'It is gone.', status: 404 }))];
  store.resume('u1');
  vi.advanceTimersByTime(1000);
  expect(store.upload()).toBeNull();
  expect(store.problem()?.title).toBe('It is gone.');
});

it('stops asking and discards the file when it is broken off', () => {
  send();
  vi.advanceTimersByTime(10);
  store.discard();
  answers = [of({ ...reading, state: 'profiled' })];
  vi.advanceTimersByTime(5000);
  expect(discarded).toEqual(['u1']);
  expect(store.upload()).toBeNull();
});
