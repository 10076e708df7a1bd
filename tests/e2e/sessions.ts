import { request as requests, type APIRequestContext } from '@playwright/test';
import type { RunningApplication } from './application';

/** What somebody signs in with. */
export interface Credentials {
  readonly email: string;
  readonly password: string;
}

/** The code that a server without accounts prints when it starts. */
export function printedCode({ printed }: RunningApplication): string {
  const [, code] = /first administrator and for this code:\s*(\S+)/.exec(printed()) ?? [];
  if (code === undefined) throw new Error(`The server printed no code:\n${printed()}`);
  return code;
}

/** Opens the first account of a server with the code that it printed. */
export async function makeFirstAdministrator(
  application: RunningApplication,
  { email, password }: Credentials,
): Promise<void> {
  const request = await requests.newContext({ baseURL: application.address });
  const account = { code: printedCode(application), name: 'Wilma Hart', email, password };
  await send(request, 'POST', '/api/first-administrator', account);
  await request.dispose();
}

/** Signs a browser in without its pages; the cookies stay in its context. */
export async function signInByApi(
  request: APIRequestContext,
  credentials: Credentials,
): Promise<void> {
  await send(request, 'POST', '/api/session', credentials);
}

/** Sends what a page would send, with its token; a refusal is an error. Gives the answer. */
export async function send<Answer>(
  request: APIRequestContext,
  method: 'POST' | 'PUT' | 'PATCH' | 'DELETE',
  path: string,
  data: unknown,
): Promise<Answer> {
  await request.get('/api/session');
  const { cookies } = await request.storageState();
  const token = cookies.find(({ name }) => name === 'XSRF-TOKEN')?.value ?? '';
  const headers = { 'X-XSRF-TOKEN': token };
  const response = await request.fetch(path, { method, data, headers });
  if (!response.ok()) throw new Error(`${method} ${path}: ${await response.text()}`);
  return (response.status() === 204 ? null : await response.json()) as Answer;
}
