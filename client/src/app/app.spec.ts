import { provideHttpClient } from '@angular/common/http';
import { HttpTestingController, provideHttpClientTesting } from '@angular/common/http/testing';
import { TestBed } from '@angular/core/testing';
import { provideRouter, Router } from '@angular/router';
import type { SessionView } from '#shared/api';
import { expect, it, vi } from 'vitest';
import { App } from './app';
import { routes } from './app.routes';

// The pages are loaded when they are opened, which takes its time on a busy machine.
const PATIENCE_IN_MILLISECONDS = 20_000;

const NOBODY: SessionView = {
  person: null,
  firstAdministratorNeeded: false,
  demonstrationAccounts: [],
  demonstrationPassword: null,
};

async function openRoot(session: SessionView): Promise<string> {
  TestBed.configureTestingModule({
    providers: [provideRouter(routes), provideHttpClient(), provideHttpClientTesting()],
  });
  TestBed.createComponent(App);
  const arrival = TestBed.inject(Router).navigateByUrl('/');
  const server = TestBed.inject(HttpTestingController);
  await vi.waitFor(
    () => {
      server.expectOne('/api/session').flush(session);
    },
    { timeout: PATIENCE_IN_MILLISECONDS },
  );
  await arrival;
  return TestBed.inject(Router).url;
}

it('asks a stranger to sign in', async () => {
  expect(await openRoot(NOBODY)).toBe('/sign-in');
}, 30_000);

it('asks for the first administrator when there is none', async () => {
  const url = await openRoot({ ...NOBODY, firstAdministratorNeeded: true });
  expect(url).toBe('/first-administrator');
}, 30_000);
