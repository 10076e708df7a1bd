import {
  HttpClient,
  HttpXsrfTokenExtractor,
  provideHttpClient,
  withInterceptors,
} from '@angular/common/http';
import { HttpTestingController, provideHttpClientTesting } from '@angular/common/http/testing';
import { TestBed } from '@angular/core/testing';
import { of, throwError } from 'rxjs';
import { beforeEach, expect, it, vi } from 'vitest';
import { problemInterceptor } from '../server-api/problem-interceptor';
import { sessionInterceptor } from './session-interceptor';
import { SessionStore } from './session-store';
import { SignInAgain } from './sign-in-again';

let http: HttpClient;
let server: HttpTestingController;
let token: string;
const ask = vi.fn();

beforeEach(() => {
  token = 'old';
  ask.mockReset();
  TestBed.configureTestingModule({
    providers: [
      provideHttpClient(withInterceptors([sessionInterceptor, problemInterceptor])),
      provideHttpClientTesting(),
      { provide: SignInAgain, useValue: { ask } },
      { provide: HttpXsrfTokenExtractor, useValue: { getToken: () => token } },
    ],
  });
  http = TestBed.inject(HttpClient);
  server = TestBed.inject(HttpTestingController);
});

function refuse(code: string, status: number): void {
  const details = { type: '', title: 'Refused.', status, code };
  server.expectOne('/api/work').flush(details, { status, statusText: 'Refused' });
}

function send() {
  const outcome = { answer: vi.fn(), failure: vi.fn() };
  http.post('/api/work', { words: 'kept' }).subscribe({
    next: outcome.answer,
    error: outcome.failure,
  });
  return outcome;
}

it('repeats the request with all that was sent, once the person is back', () => {
  ask.mockReturnValue(of(true));
  const { answer } = send();
  refuse('signInNeeded', 401);
  const repeated = server.expectOne('/api/work');
  expect(repeated.request.body).toEqual({ words: 'kept' });
  repeated.flush({ saved: true });
  expect(answer).toHaveBeenCalledWith({ saved: true });
});

it('fails as it failed when the person does not sign in', () => {
  ask.mockImplementation((failure: unknown) => throwError(() => failure));
  const { failure } = send();
  refuse('signInNeeded', 401);
  expect(failure).toHaveBeenCalledWith(expect.objectContaining({ code: 'signInNeeded' }));
});

it('renews a token that another tab has replaced, and repeats with the new one', () => {
  const { answer } = send();
  refuse('forgedRequest', 403);
  token = 'new';
  server.expectOne('/api/session').flush({ person: null });
  const repeated = server.expectOne('/api/work');
  expect(repeated.request.headers.get('X-XSRF-TOKEN')).toBe('new');
  repeated.flush({ saved: true });
  expect(answer).toHaveBeenCalledOnce();
});

it('asks for the password when the token is gone because the session is', () => {
  ask.mockReturnValue(of(true));
  const store = TestBed.inject(SessionStore);
  store.refresh().subscribe();
  server.expectOne('/api/session').flush({ person: { email: 'ines@example.org' } });
  const { answer } = send();
  refuse('forgedRequest', 403);
  server.expectOne('/api/session').flush({ person: null });
  expect(ask).toHaveBeenCalledOnce();
  expect(store.person()?.email).toBe('ines@example.org');
  server.expectOne('/api/work').flush({ saved: true });
  expect(answer).toHaveBeenCalledOnce();
});

it('leaves every other refusal to the page', () => {
  const { failure } = send();
  refuse('notAllowed', 403);
  expect(failure).toHaveBeenCalledWith(expect.objectContaining({ code: 'notAllowed' }));
  expect(ask).not.toHaveBeenCalled();
});
