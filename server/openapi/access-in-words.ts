import { assertNever } from '#shared/core';
import type { Access, Route } from '../routes/route';

/** Who may call a route, for people who read the description. */
export function accessInWords(access: Access): string {
  switch (access.kind) {
    case 'public':
      return 'Anybody may call it.';
    case 'signedIn':
      return 'Whoever is signed in may call it.';
    case 'administrator':
      return 'Administrators may call it.';
    case 'study':
      return `Members of the study may call it whose role allows ${access.anyOf.join(' or ')}.`;
    default:
      return assertNever(access);
  }
}

/** Statuses with which a route refuses before its own work begins. */
export function refusalsOf(route: Route): readonly number[] {
  const unsafe = route.method === 'get' ? [] : [403];
  const body = route.body === null && route.upload === null ? [] : [413, 415, 422];
  return [...new Set([...byAccess(route.access), ...unsafe, ...body])].sort((a, b) => a - b);
}

function byAccess(access: Access): readonly number[] {
  switch (access.kind) {
    case 'public':
      return [];
    case 'signedIn':
      return [401];
    case 'administrator':
      return [401, 403];
    case 'study':
      return [401, 403, 404];
    default:
      return assertNever(access);
  }
}
