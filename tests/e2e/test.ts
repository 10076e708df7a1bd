import { test as base, type BrowserContext } from '@playwright/test';
import { startApplication, type RunningApplication, type StartingData } from './application';
import { makeFirstAdministrator, signInByApi, type Credentials } from './sessions';
import { startWatch, type ExpectedStatuses, type Watch } from './watch';

interface TestOptions {
  /** Statuses of refusals that the test provokes. */
  readonly refusals: ExpectedStatuses;
  /** Who is signed in at the start; null for nobody. */
  readonly signedIn: Credentials | null;
}

interface TestParts {
  readonly watch: Watch;
  /** A further browser of the same person, watched like the first. */
  readonly openBrowser: (credentials: Credentials | null) => Promise<BrowserContext>;
}

interface WorkerParts {
  readonly startingData: StartingData;
  readonly application: RunningApplication;
}

/** The person who looks after an application that starts with nothing. */
export const ADMINISTRATOR: Credentials = {
  email: 'first@example.org',
  password: 'seven plain words will do here',
};

/**
 * Tests against a server that all tests of a file share. By default it starts with nothing but an
 * administrator, who is signed in; a console error on any page fails the test.
 */
export const test = base.extend<TestOptions & TestParts, WorkerParts>({
  startingData: ['nothing', { option: true, scope: 'worker' }],
  refusals: [[], { option: true }],
  signedIn: [ADMINISTRATOR, { option: true }],

  application: [
    async ({ startingData }, use) => {
      const application = await startApplication(startingData);
      if (startingData === 'nothing') await makeFirstAdministrator(application, ADMINISTRATOR);
      await use(application);
      await application.stop();
    },
    { scope: 'worker', timeout: 180_000 },
  ],

  baseURL: async ({ application }, use) => {
    await use(application.address);
  },

  watch: [
    async ({ application, refusals }, use) => {
      const watch = startWatch(application.address, refusals);
      await use(watch);
      base.expect(watch.complaints, 'no page may complain').toEqual([]);
    },
    { auto: true },
  ],

  context: async ({ context, watch, signedIn }, use) => {
    watch.over(context);
    if (signedIn !== null) await signInByApi(context.request, signedIn);
    await use(context);
  },

  openBrowser: async ({ browser, baseURL, watch }, use) => {
    const opened: BrowserContext[] = [];
    await use(async (credentials) => {
      const context = await browser.newContext({ baseURL: baseURL! });
      opened.push(context);
      watch.over(context);
      if (credentials !== null) await signInByApi(context.request, credentials);
      return context;
    });
    for (const context of opened) await context.close();
  },
});

export { expect } from '@playwright/test';
