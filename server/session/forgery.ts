import { createHmac, timingSafeEqual } from 'node:crypto';
import type { Request, RequestHandler, Response } from 'express';
import type { Configuration } from '../config';
import type { Dependencies } from '../dependencies';
import { sendProblem } from '../errors/problem';
import { personOf } from './person-of';

const COOKIE = 'XSRF-TOKEN';
const HEADER = 'x-xsrf-token';
const SAFE_METHODS: ReadonlySet<string> = new Set(['GET', 'HEAD', 'OPTIONS']);

/**
 * Refuses requests that another site made a browser send.
 *
 * The browser itself says where a request comes from (Sec-Fetch-Site, or Origin in older ones);
 * besides, a token in a cookie must come back in a header, and it is signed for this session.
 * Source: OWASP, Cross-Site Request Forgery Prevention, signed double-submit cookie.
 */
export function refuseForgedRequests(dependencies: Dependencies): RequestHandler {
  return (request, response, next) => {
    if (SAFE_METHODS.has(request.method) || isGenuine(request, dependencies)) next();
    else sendProblem(response, { code: 'forgedRequest' });
  };
}

/** Gives the browser the token that belongs to its present session; a good one stays. */
export function issueForgeryToken(
  request: Request,
  response: Response,
  { config, secrets, randomness }: Dependencies,
): void {
  const present = cookieValue(request, COOKIE);
  if (present !== null && isSigned(present, request, secrets.forgery)) return;
  const nonce = randomness(18).toString('base64url');
  response.cookie(COOKIE, `${nonce}.${signature(secrets.forgery, sessionName(request), nonce)}`, {
    sameSite: 'lax',
    secure: config.publicUrl.startsWith('https:'),
    path: '/',
  });
}

function isGenuine(request: Request, dependencies: Dependencies): boolean {
  return (
    comesFromHere(request, dependencies.config) &&
    carriesToken(request, dependencies.secrets.forgery)
  );
}

/** A proxy may change the name that the server is called by, so the public one counts as well. */
function comesFromHere(request: Request, { publicUrl }: Configuration): boolean {
  const site = request.get('sec-fetch-site');
  if (site !== undefined) return site === 'same-origin' || site === 'none';
  const origin = request.get('origin');
  if (origin === undefined) return true;
  const names = [request.get('host'), new URL(publicUrl).host];
  return URL.canParse(origin) && names.includes(new URL(origin).host);
}

function carriesToken(request: Request, key: Buffer): boolean {
  const token = request.get(HEADER);
  if (token === undefined || cookieValue(request, COOKIE) !== token) return false;
  return isSigned(token, request, key);
}

function isSigned(token: string, request: Request, key: Buffer): boolean {
  const [nonce = '', given = ''] = token.split('.', 2);
  const expected = Buffer.from(signature(key, sessionName(request), nonce));
  const received = Buffer.from(given);
  return expected.length === received.length && timingSafeEqual(expected, received);
}

/** A token counts for one session; before signing in there is none. */
function sessionName(request: Request): string {
  return personOf(request) === null ? 'signed out' : `session ${request.sessionID}`;
}

function signature(key: Buffer, session: string, nonce: string): string {
  return createHmac('sha256', key).update(`${session}\n${nonce}`).digest('base64url');
}

function cookieValue(request: Request, name: string): string | null {
  const pairs = (request.get('cookie') ?? '').split(';').map((pair) => pair.trim());
  const found = pairs.find((pair) => pair.startsWith(`${name}=`));
  return found === undefined ? null : found.slice(name.length + 1);
}
