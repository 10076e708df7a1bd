import type { Express } from 'express';
import supertest, { type Agent, type Test } from 'supertest';

/**
 * A browser of the API tests: keeps cookies and echoes the token that unsafe requests need.
 * A request is awaited, or sent on with supertest's own functions (`attach`, `field`, `expect`).
 */
export interface Browser {
  readonly get: (path: string) => Test;
  readonly post: (path: string, body?: unknown) => Test;
  readonly put: (path: string, body?: unknown) => Test;
  readonly patch: (path: string, body?: unknown) => Test;
  readonly delete: (path: string) => Test;
  /** Signs in; answers the response. */
  readonly signIn: (email: string, password: string) => Promise<supertest.Response>;
  /** The agent itself, with its cookies. */
  readonly agent: Agent;
  /** The token that the server gave last. */
  readonly token: () => string;
}

/** Opens a browser that has loaded the first page: it has a token, and nobody is signed in. */
export async function openBrowser(app: Express): Promise<Browser> {
  const agent = supertest.agent(app);
  let token = '';
  const remember = (response: supertest.Response): supertest.Response => {
    token = tokenIn(response) ?? token;
    return response;
  };
  const send = (method: 'post' | 'put' | 'patch' | 'delete', path: string, body?: unknown) => {
    const request = agent[method](path).set('X-XSRF-TOKEN', token).on('response', remember);
    return body === undefined ? request : request.send(body as object);
  };
  remember(await agent.get('/api/session'));
  return {
    agent,
    token: () => token,
    get: (path) => agent.get(path).on('response', remember),
    post: (path, body) => send('post', path, body),
    put: (path, body) => send('put', path, body),
    patch: (path, body) => send('patch', path, body),
    delete: (path) => send('delete', path),
    signIn: async (email, password) => send('post', '/api/session', { email, password }),
  };
}

function tokenIn(response: supertest.Response): string | null {
  const cookies = (response.headers as Record<string, unknown>)['set-cookie'];
  const lines = Array.isArray(cookies) ? (cookies as string[]) : [];
  const line = lines.find((cookie) => cookie.startsWith('XSRF-TOKEN='));
  return line === undefined ? null : line.split(';')[0]!.slice(11);
}
