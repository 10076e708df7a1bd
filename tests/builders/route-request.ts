import type { Test } from 'supertest';
import type { Route } from '../../server/routes/route';
import type { Browser } from './browser';

/** Ids that belong to nothing, for the names in a path. */
const NOTHING = '0198c0de-0000-7000-8000-000000000000';

/** How a route is named in tests, as in `POST /api/session`. */
export function routeName({ method, path }: Route): string {
  return `${method.toUpperCase()} ${path}`;
}

/** The address of a route: this study, and ids of nothing for the rest. */
export function addressOf({ path }: Route, studyId: string): string {
  return path.replace(':studyId', studyId).replace(/:\w+/g, NOTHING);
}

/** Sends a route the least that its shape allows: `{}` as a body, a form without a file. */
export function sendLeast(browser: Browser, route: Route, studyId: string): Test {
  const address = addressOf(route, studyId);
  if (route.method === 'get') return browser.get(address);
  if (route.method === 'delete') return browser.delete(address);
  if (route.upload !== null) return browser[route.method](address).field('nothing', 'here');
  return browser[route.method](address, route.body === null ? undefined : {});
}
