import { mkdirSync } from 'node:fs';
import { join } from 'node:path';
import express, { type Request, type RequestHandler, type Response } from 'express';
import multer from 'multer';
import type * as z from 'zod';
import type { Configuration } from '../config';
import { refuse, type Outcome } from '../errors/server-issue';
import { plainMessage } from './plain-message';
import type { Route, UploadedFile } from './route';

/** What a request carries, of the shapes that its route states. */
export interface RequestContent {
  readonly body: unknown;
  readonly query: unknown;
  readonly file: UploadedFile | undefined;
}

/** Reads requests; the body only when the caller has been admitted. */
export type RequestReader = (
  route: Route,
  request: Request,
  response: Response,
) => Promise<Outcome<RequestContent>>;

/** Makes a reader with this installation's limits. Oversized bodies throw to the error handler. */
export function createRequestReader(config: Configuration): RequestReader {
  const readJson = express.json({ limit: config.sizeLimits.jsonBodyInBytes, strict: false });
  return async (route, request, response) => {
    if (route.upload !== null) {
      if (!request.is('multipart/form-data')) return wrongType('multipart/form-data');
      await run(multipartReader(config, route.upload.field), request, response);
      if (request.file === undefined) return refuse('fileMissing');
    } else if (route.body !== null) {
      if (!request.is('json')) return wrongType('application/json');
      await run(readJson, request, response);
    }
    return parseContent(route, request);
  };
}

function wrongType(expected: string): Outcome<RequestContent> {
  return refuse('wrongContentType', { facts: { expected } });
}

function multipartReader(config: Configuration, field: string): RequestHandler {
  const destination = join(config.dataDirectory, 'arriving');
  mkdirSync(destination, { recursive: true, mode: 0o700 });
  const { jsonBodyInBytes, uploadInBytes } = config.sizeLimits;
  return multer({
    storage: multer.diskStorage({ destination }),
    limits: {
      fileSize: uploadInBytes,
      files: 1,
      fields: 20,
      fieldSize: jsonBodyInBytes,
      headerPairs: 50,
    },
    defParamCharset: 'utf8',
  }).single(field);
}

function run(handler: RequestHandler, request: Request, response: Response): Promise<void> {
  return new Promise((resolve, reject) => {
    void handler(request, response, (problem?: unknown) => {
      if (problem === undefined) resolve();
      else reject(problem instanceof Error ? problem : new Error('The body could not be read.'));
    });
  });
}

function parseContent(route: Route, request: Request): Outcome<RequestContent> {
  const query = parsePart(route.query, request.query);
  if (!query.ok) return query;
  const body = parsePart(route.body, request.body);
  if (!body.ok) return body;
  return {
    ok: true,
    value: { body: body.value, query: query.value, file: arrivedFile(request) },
  };
}

function parsePart(schema: z.ZodType | null, given: unknown): Outcome<unknown> {
  if (schema === null) return { ok: true, value: undefined };
  const parsed = schema.safeParse(given, { error: plainMessage });
  if (parsed.success) return { ok: true, value: parsed.data };
  const fields = parsed.error.issues.map(({ path, message }) => ({
    path: path.map(String).join('.'),
    message,
  }));
  return refuse('invalidRequest', { fields: fields.slice(0, 50) });
}

function arrivedFile({ file }: Request): UploadedFile | undefined {
  if (file === undefined) return undefined;
  return { path: file.path, fileName: file.originalname, sizeInBytes: file.size };
}
