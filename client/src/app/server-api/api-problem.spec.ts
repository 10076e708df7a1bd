import { HttpClient, provideHttpClient, withInterceptors } from '@angular/common/http';
import { HttpTestingController, provideHttpClientTesting } from '@angular/common/http/testing';
import { TestBed } from '@angular/core/testing';
import { beforeEach, expect, it, vi } from 'vitest';
import { ApiProblem } from './api-problem';
import { problemInterceptor } from './problem-interceptor';

let http: HttpClient;
let server: HttpTestingController;

beforeEach(() => {
  TestBed.configureTestingModule({
    providers: [
      provideHttpClient(withInterceptors([problemInterceptor])),
      provideHttpClientTesting(),
    ],
  });
  http = TestBed.inject(HttpClient);
  server = TestBed.inject(HttpTestingController);
});

const PROBLEM = {
  type: 'urn:evenhand:problem:invalidRequest',
  title: 'Some of what was sent cannot be used.',
  status: 422,
  code: 'invalidRequest',
  wayOut: 'Correct the fields.',
  fields: [{ path: 'title', message: 'Give the study a title.' }],
};
const REFUSAL = { status: 422, statusText: 'Unprocessable' };

function failureOf(responseType: 'json' | 'blob' = 'json'): Promise<ApiProblem> {
  return new Promise((resolve) => {
    http.get('/api/studies', { responseType: responseType as 'json' }).subscribe({
      error: resolve,
    });
  });
}

it('says what the problem details say', async () => {
  const failure = failureOf();
  server.expectOne('/api/studies').flush(PROBLEM, REFUSAL);
  const problem = await failure;
  expect(problem).toBeInstanceOf(ApiProblem);
  expect([problem.code, problem.status, problem.wayOut]).toEqual([
    'invalidRequest',
    422,
    'Correct the fields.',
  ]);
  expect(problem.fieldMessage('title')).toBe('Give the study a title.');
  expect(problem.fieldMessage('design')).toBeNull();
});

it('reads the problem of a refused download', async () => {
  const failure = failureOf('blob');
  server.expectOne('/api/studies').flush(new Blob([JSON.stringify(PROBLEM)]), REFUSAL);
  expect((await failure).code).toBe('invalidRequest');
});

it('tells an unreachable server from a refusal', async () => {
  const failure = failureOf();
  server.expectOne('/api/studies').error(new ProgressEvent('error'));
  const problem = await failure;
  expect([problem.code, problem.status]).toEqual(['outOfReach', 0]);
});

it('says so when an answer is no problem details', async () => {
  const failure = failureOf();
  server.expectOne('/api/studies').flush('<html>Bad gateway</html>', {
    status: 502,
    statusText: 'Bad gateway',
  });
  const problem = await failure;
  expect([problem.code, problem.status]).toEqual(['unreadableAnswer', 502]);
});

it('lets a good answer through', () => {
  const taken = vi.fn();
  http.get('/api/studies').subscribe(taken);
  server.expectOne('/api/studies').flush([]);
  expect(taken).toHaveBeenCalledWith([]);
});
