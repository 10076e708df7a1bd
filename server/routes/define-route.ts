import type * as z from 'zod';
import type { StudyAction } from '#shared/permissions';
import type { Outcome } from '../errors/server-issue';
import type { LimitName } from './limits';
import type {
  Access,
  AnyCall,
  ByPerson,
  Call,
  FileReply,
  HttpMethod,
  OnStudy,
  PathParameters,
  Reply,
  Route,
  Unchanging,
  UploadedFile,
  UploadField,
} from './route';

/** What a route states, apart from who may call it. `Who` is what that adds to the call. */
export interface RouteDetails<Who, Path extends string, Body, Query, Upload, Value> {
  readonly method: HttpMethod;
  readonly path: Path;
  /** One line for the OpenAPI description. */
  readonly summary: string;
  readonly body?: z.ZodType<Body>;
  readonly query?: z.ZodType<Query>;
  readonly upload?: Upload;
  readonly reply: Reply<Value>;
  readonly limit?: LimitName;
  readonly handle: (
    call: Call<
      PathParameters<Path>,
      Body,
      Query,
      Upload extends UploadField ? UploadedFile : undefined
    > &
      Who,
  ) => Promise<Outcome<Unchanging<Value>>>;
}

/** A route that anybody may call. */
export function publicRoute<
  const Path extends string,
  Body = undefined,
  Query = undefined,
  Upload extends UploadField | undefined = undefined,
  Value = unknown,
>(details: RouteDetails<Partial<ByPerson>, Path, Body, Query, Upload, Value>): Route {
  return toRoute({ kind: 'public' }, details);
}

/** A route for everybody who is signed in. */
export function signedInRoute<
  const Path extends string,
  Body = undefined,
  Query = undefined,
  Upload extends UploadField | undefined = undefined,
  Value = unknown,
>(details: RouteDetails<ByPerson, Path, Body, Query, Upload, Value>): Route {
  return toRoute({ kind: 'signedIn' }, details);
}

/** A route for administrators. */
export function administratorRoute<
  const Path extends string,
  Body = undefined,
  Query = undefined,
  Upload extends UploadField | undefined = undefined,
  Value = unknown,
>(details: RouteDetails<ByPerson, Path, Body, Query, Upload, Value>): Route {
  return toRoute({ kind: 'administrator' }, details);
}

/** A route for members of the study in its path whose role may do the action. */
export function studyRoute<
  const Path extends `/api/studies/:studyId${string}`,
  Body = undefined,
  Query = undefined,
  Upload extends UploadField | undefined = undefined,
  Value = unknown,
>(action: StudyAction, details: RouteDetails<OnStudy, Path, Body, Query, Upload, Value>): Route {
  return toRoute({ kind: 'study', anyOf: [action], decide: null }, details);
}

/**
 * A route for members where the request decides what their role must allow.
 *
 * Whoever may do none of `anyOf` is refused before the body is read; then `decide` names the
 * actions that this request needs, all of them.
 */
export function decidedStudyRoute<
  const Path extends `/api/studies/:studyId${string}`,
  Body = undefined,
  Query = undefined,
  Upload extends UploadField | undefined = undefined,
  Value = unknown,
>(
  anyOf: readonly StudyAction[],
  decide: (
    call: Call<PathParameters<Path>, Body, Query> & OnStudy,
  ) => Promise<Outcome<readonly StudyAction[]>>,
  details: RouteDetails<OnStudy, Path, Body, Query, Upload, Value>,
): Route {
  const erased = decide as unknown as (call: AnyCall) => Promise<Outcome<readonly StudyAction[]>>;
  return toRoute({ kind: 'study', anyOf, decide: erased }, details);
}

/** The route answers with JSON of this shape. */
export function json<Value>(schema: z.ZodType<Value>, status = 200): Reply<Value> {
  return { kind: 'json', status, schema };
}

/** The route answers without a body. */
export function empty(status = 204): Reply<undefined> {
  return { kind: 'empty', status };
}

/** The route answers with a file. */
export function file(contentType: string): Reply<FileReply> {
  return { kind: 'file', contentType };
}

/** The only place where a route loses its types: the register fills `call` as `access` says. */
function toRoute<Who, Path extends string, Body, Query, Upload, Value>(
  access: Access,
  details: RouteDetails<Who, Path, Body, Query, Upload, Value>,
): Route {
  return {
    method: details.method,
    path: details.path,
    access,
    summary: details.summary,
    body: details.body ?? null,
    query: details.query ?? null,
    upload: (details.upload as UploadField | undefined) ?? null,
    reply: details.reply,
    limit: details.limit ?? null,
    handle: details.handle as unknown as Route['handle'],
  };
}
