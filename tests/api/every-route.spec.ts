import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { mayDo, STUDY_ROLES, type StudyRole } from '#shared/permissions';
import type { Study } from '../../server/models/study/study-store';
import { ROUTES } from '../../server/routes';
import type { Access, Route } from '../../server/routes/route';
import type { Browser } from '../builders/browser';
import { addressOf, routeName, sendLeast } from '../builders/route-request';
import { startTestApplication, type TestApplication } from '../builders/test-application';

type Who = StudyRole | 'non-member' | 'administrator' | 'signed out';

const EVERYBODY: readonly Who[] = [...STUDY_ROLES, 'non-member', 'administrator', 'signed out'];
const NO_STUDY = '0198c0de-1111-7000-8000-000000000000';

let application: TestApplication;
let study: Study;
let browsers: ReadonlyMap<Who, Browser>;

beforeAll(async () => {
  application = await startTestApplication();
  study = await application.addStudy();
  const lead = await application.addPerson();
  await application.addMember(study, lead, 'lead');
  browsers = new Map(await Promise.all(EVERYBODY.map(openFor)));
});

afterAll(async () => {
  await application.close();
  expect(application.bugs).toEqual([]);
});

async function openFor(who: Who): Promise<[Who, Browser]> {
  if (who === 'signed out') return [who, await application.browser()];
  if (who === 'administrator') {
    const person = await application.addPerson({ administrator: true });
    return [who, await application.signedIn(person)];
  }
  if (who === 'non-member') {
    const person = await application.addPerson();
    await application.addMember(await application.addStudy(), person, 'lead');
    return [who, await application.signedIn(person)];
  }
  return [who, await application.memberBrowser(study, who)];
}

/** What the permission table says, before the request itself is looked at. */
function expectedRefusal(access: Access, who: Who): 401 | 403 | 404 | null {
  if (access.kind === 'public') return null;
  if (who === 'signed out') return 401;
  if (access.kind === 'signedIn') return null;
  if (access.kind === 'administrator') return who === 'administrator' ? null : 403;
  if (who === 'administrator' || who === 'non-member') return 404;
  return access.anyOf.some((action) => mayDo(who, action)) ? null : 403;
}

/** Routes that would end the session that the other cases need. */
function endsTheSession({ method, path }: Route): boolean {
  return method === 'delete' && path === '/api/session';
}

const CASES = ROUTES.filter((route) => !endsTheSession(route)).flatMap((route) =>
  EVERYBODY.map((who) => ({ name: routeName(route), route, who })),
);

describe('who may call what', () => {
  it.each(CASES)('$name by $who', async ({ route, who }) => {
    const response = await sendLeast(browsers.get(who)!, route, study.id);
    const refusal = expectedRefusal(route.access, who);
    if (refusal !== null) {
      expect(response.status).toBe(refusal);
      expect(response.type).toBe('application/problem+json');
    } else {
      expect([401, 403]).not.toContain(
        response.status === 403 ? codeOf(response) : response.status,
      );
      expect(response.status).toBeLessThan(500);
    }
  });
});

/** A code typed wrong is a 403 of the request itself, not of the caller. */
function codeOf({ body }: { body: unknown }): unknown {
  const { code } = body as { code: string };
  return ['notAllowed', 'administratorNeeded', 'forgedRequest'].includes(code) ? 403 : code;
}

const STUDY_ROUTES = ROUTES.filter(({ access }) => access.kind === 'study');

describe('a study that one is no member of', () => {
  it.each(STUDY_ROUTES.map((route) => ({ name: routeName(route), route })))(
    'looks like none: $name',
    async ({ route }) => {
      const browser = browsers.get('non-member')!;
      const others = await sendLeast(browser, route, study.id);
      const nothing = await sendLeast(browser, route, NO_STUDY);
      expect(nothing.status).toBe(404);
      expect(others.status).toBe(404);
      expect(others.body).toEqual(nothing.body);
      expect(others.headers['content-length']).toBe(nothing.headers['content-length']);
    },
  );
});

const UNSAFE = ROUTES.filter(({ method }) => method !== 'get');

describe('an unsafe request', () => {
  it.each(UNSAFE.map((route) => ({ name: routeName(route), route })))(
    'needs the token: $name',
    async ({ route }) => {
      const { agent } = browsers.get('lead')!;
      const response = await agent[route.method](addressOf(route, study.id)).send({});
      expect(response.status).toBe(403);
      expect(response.body).toMatchObject({ code: 'forgedRequest' });
    },
  );

  it.each(UNSAFE.map((route) => ({ name: routeName(route), route })))(
    'must not come from another site: $name',
    async ({ route }) => {
      const browser = browsers.get('lead')!;
      const response = await sendLeast(browser, route, study.id).set(
        'Sec-Fetch-Site',
        'cross-site',
      );
      expect(response.status).toBe(403);
      expect(response.body).toMatchObject({ code: 'forgedRequest' });
    },
  );
});

const WITH_JSON = ROUTES.filter(({ body, upload }) => body !== null && upload === null);

describe('a body', () => {
  const callers = (access: Access): Who => (access.kind === 'administrator' ? access.kind : 'lead');

  it.each(WITH_JSON.map((route) => ({ name: routeName(route), route })))(
    'must be JSON: $name',
    async ({ route }) => {
      const browser = browsers.get(callers(route.access))!;
      const send = browser[route.method as 'post' | 'put' | 'patch'];
      const broken = await send(addressOf(route, study.id)).type('json').send('{"half":');
      expect(broken.status).toBe(400);
      expect(broken.body).toMatchObject({ code: 'unreadableRequest' });
      const form = await send(addressOf(route, study.id)).type('form').send('a=b');
      expect(form.status).toBe(415);
      expect(form.body).toMatchObject({ code: 'wrongContentType' });
    },
  );

  it.each(WITH_JSON.map((route) => ({ name: routeName(route), route })))(
    'of the wrong shape is answered field by field: $name',
    async ({ route }) => {
      const browser = browsers.get(callers(route.access))!;
      const send = browser[route.method as 'post' | 'put' | 'patch'];
      const response = await send(addressOf(route, study.id), ['not', 'an', 'object']);
      expect(response.status).toBe(422);
      expect(response.body).toMatchObject({
        code: 'invalidRequest',
        fields: [{ path: '', message: 'This must be an object.' }],
      });
    },
  );
});
