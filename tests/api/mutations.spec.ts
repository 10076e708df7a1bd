import fc from 'fast-check';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { Study } from '../../server/models/study/study-store';
import { ROUTES } from '../../server/routes';
import type { Browser } from '../builders/browser';
import { addressOf, routeName } from '../builders/route-request';
import { startTestApplication, type TestApplication } from '../builders/test-application';

const SEED = Number(process.env.EVENHAND_SEED ?? 20260401);
const BODIES_PER_ROUTE = Number(process.env.EVENHAND_MUTATIONS ?? 60);

/** Names and values that requests of this API use, so that mutants come past the first check. */
const NAMES = [
  'id',
  'name',
  'title',
  'email',
  'role',
  'design',
  'noun',
  'steps',
  'content',
  'rows',
];
const VALUES = [
  'lead',
  'cohort',
  'a@example.org',
  '2026-02-30',
  '',
  '\u0000',
  '\ud800',
  '__proto__',
];

let application: TestApplication;
let study: Study;
let browsers: Readonly<Record<'lead' | 'administrator', Browser>>;

beforeAll(async () => {
  application = await startTestApplication({ failedSignInsPerAddress: 1_000_000 });
  study = await application.addStudy();
  const administrator = await application.addPerson({ administrator: true });
  browsers = {
    lead: await application.memberBrowser(study, 'lead'),
    administrator: await application.signedIn(administrator),
  };
});

afterAll(async () => {
  await application.close();
});

const value = fc.oneof(fc.constantFrom(...VALUES), fc.jsonValue(), fc.integer());
const object = fc.dictionary(fc.constantFrom(...NAMES), value);
const body = fc.oneof(object, fc.array(object), fc.jsonValue());

const WITH_JSON = ROUTES.filter(
  ({ body: schema, upload, path }) => schema !== null && upload === null && path !== '/api/session',
);

describe(`mutated bodies (seed ${String(SEED)})`, () => {
  it.each(WITH_JSON.map((route) => ({ name: routeName(route), route })))(
    'never break the server: $name',
    async ({ route }) => {
      const who = route.access.kind === 'administrator' ? 'administrator' : 'lead';
      const send = browsers[who][route.method as 'post' | 'put' | 'patch'];
      await fc.assert(
        fc.asyncProperty(body, async (mutant) => {
          const response = await send(addressOf(route, study.id))
            .type('json')
            .send(JSON.stringify(mutant));
          expect(response.status).toBeLessThan(500);
          expect(application.bugs).toEqual([]);
        }),
        { seed: SEED, numRuns: BODIES_PER_ROUTE },
      );
    },
  );
});
