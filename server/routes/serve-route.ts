import { rm } from 'node:fs/promises';
import type { Request, RequestHandler, Response } from 'express';
import { assertNever } from '#shared/core';
import type { Dependencies } from '../dependencies';
import { sendProblem } from '../errors/problem';
import type { Outcome } from '../errors/server-issue';
import type { BrowserSession } from '../session/browser-session';
import { admit, requireActions } from './admit';
import { contentDisposition } from './content-disposition';
import type { RequestReader } from './read-request';
import type { AnyCall, FileReply, Route } from './route';

/** What every route is served with. */
export interface RouteSurroundings {
  readonly dependencies: Dependencies;
  readonly readRequest: RequestReader;
  readonly sessionOf: (request: Request, response: Response) => BrowserSession;
}

/** Serves one route: admit, read, decide, handle, answer; no stage runs without the one before. */
export function serveRoute(route: Route, surroundings: RouteSurroundings): RequestHandler {
  return async (request, response) => {
    try {
      const outcome = await answer(route, surroundings, request, response);
      if (outcome.ok) send(route, response, outcome.value, surroundings.dependencies);
      else sendProblem(response, outcome.issue);
    } finally {
      if (request.file !== undefined) await rm(request.file.path, { force: true });
    }
  };
}

async function answer(
  route: Route,
  { dependencies, readRequest, sessionOf }: RouteSurroundings,
  request: Request,
  response: Response,
): Promise<Outcome<unknown>> {
  const caller = await admit(route.access, request, dependencies);
  if (!caller.ok) return caller;
  const content = await readRequest(route, request, response);
  if (!content.ok) return content;
  const call: AnyCall = {
    ...caller.value,
    ...content.value,
    dependencies,
    session: sessionOf(request, response),
    params: request.params,
  };
  const decided = await decide(route, call);
  return decided.ok ? route.handle(call) : decided;
}

async function decide({ access }: Route, call: AnyCall): Promise<Outcome<undefined>> {
  if (access.kind !== 'study' || access.decide === null || call.role === undefined) {
    return { ok: true, value: undefined };
  }
  const actions = await access.decide(call);
  return actions.ok ? requireActions(call.role, actions.value) : actions;
}

function send(route: Route, response: Response, value: unknown, { config }: Dependencies): void {
  const { reply } = route;
  switch (reply.kind) {
    case 'json':
      if (config.answers === 'checked') reply.schema.parse(value);
      response.status(reply.status).json(value);
      return;
    case 'empty':
      response.status(reply.status).end();
      return;
    case 'file':
      sendFile(response, reply.contentType, value as FileReply);
      return;
    default:
      assertNever(reply);
  }
}

function sendFile(response: Response, contentType: string, { fileName, bytes }: FileReply): void {
  response
    .status(200)
    .type(contentType)
    .set('Content-Disposition', contentDisposition(fileName))
    .send(Buffer.from(bytes.buffer, bytes.byteOffset, bytes.byteLength));
}
