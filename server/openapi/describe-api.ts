import * as z from 'zod';
import { problemSchema } from '#shared/api';
import type { Reply, Route } from '../routes/route';
import { accessInWords, refusalsOf } from './access-in-words';

/** An OpenAPI 3.1 document. */
export type ApiDescription = Readonly<Record<string, unknown>>;

/** Describes the routes; the same list that is served. */
export function describeApi(routes: readonly Route[]): ApiDescription {
  return {
    openapi: '3.1.0',
    info: {
      title: 'Evenhand',
      version: '1',
      description:
        'Every refusal is a problem detail (RFC 9457) whose `code` is stable. Unsafe methods must ' +
        'echo the cookie XSRF-TOKEN in the header X-XSRF-TOKEN.',
    },
    paths: describePaths(routes),
    components: {
      schemas: { Problem: jsonSchema(problemSchema, 'output') },
      securitySchemes: { session: { type: 'apiKey', in: 'cookie', name: 'evenhand' } },
    },
  };
}

/** A path as OpenAPI writes it: `{studyId}` for `:studyId`. */
export function openApiPath(path: string): string {
  return path.replace(/:(\w+)/g, '{$1}');
}

function describePaths(routes: readonly Route[]): Record<string, Record<string, unknown>> {
  const paths: Record<string, Record<string, unknown>> = {};
  for (const route of routes) {
    const path = openApiPath(route.path);
    paths[path] = { ...paths[path], [route.method]: describeRoute(route) };
  }
  return paths;
}

function describeRoute(route: Route): Record<string, unknown> {
  const body = describeBody(route);
  return {
    operationId: operationId(route),
    summary: route.summary,
    description: accessInWords(route.access),
    security: route.access.kind === 'public' ? [] : [{ session: [] }],
    parameters: [...pathParameters(route), ...queryParameters(route)],
    ...(body === null ? {} : { requestBody: body }),
    responses: { ...success(route.reply), ...refusals(route) },
  };
}

/** Unique, as in `putStudiesByStudyIdMembersByPersonId`. */
function operationId({ method, path }: Route): string {
  const words = path.split('/').filter((part) => part !== '' && part !== 'api');
  const named = words.map((word) => (word.startsWith(':') ? `by-${word.slice(1)}` : word));
  return [method, ...named]
    .join('-')
    .replace(/[-.](\w)/g, (_, letter: string) => letter.toUpperCase());
}

function pathParameters({ path }: Route): readonly unknown[] {
  return [...path.matchAll(/:(\w+)/g)].map(([, name]) => ({
    name,
    in: 'path',
    required: true,
    schema: { type: 'string' },
  }));
}

function queryParameters({ query }: Route): readonly unknown[] {
  if (query === null) return [];
  const { properties = {}, required = [] } = jsonSchema(query, 'input') as {
    properties?: Record<string, unknown>;
    required?: readonly string[];
  };
  return Object.entries(properties).map(([name, schema]) => ({
    name,
    in: 'query',
    required: required.includes(name),
    schema,
  }));
}

function describeBody({ body, upload }: Route): Record<string, unknown> | null {
  if (upload !== null) {
    const fields = body === null ? {} : jsonSchema(body, 'input');
    const file = {
      [upload.field]: { type: 'string', contentMediaType: 'application/octet-stream' },
    };
    const properties = { ...(fields.properties as object | undefined), ...file };
    const schema = { ...fields, type: 'object', properties };
    return { required: true, content: { 'multipart/form-data': { schema } } };
  }
  if (body === null) return null;
  return { required: true, content: { 'application/json': { schema: jsonSchema(body, 'input') } } };
}

function success(reply: Reply<unknown>): Record<string, unknown> {
  switch (reply.kind) {
    case 'json': {
      const content = { 'application/json': { schema: jsonSchema(reply.schema, 'output') } };
      return { [reply.status]: { description: 'Done.', content } };
    }
    case 'empty':
      return { [reply.status]: { description: 'Done; no body.' } };
    case 'file':
      return { 200: { description: 'The file.', content: { [reply.contentType]: {} } } };
  }
}

function refusals(route: Route): Record<string, unknown> {
  const schema = { $ref: '#/components/schemas/Problem' };
  const content = { 'application/problem+json': { schema } };
  const described = refusalsOf(route).map((status) => [
    status,
    { description: 'Refused.', content },
  ]);
  return Object.fromEntries([
    ...described,
    ['default', { description: 'Refused.', content }],
  ]) as Record<string, unknown>;
}

/** Checks that only code can make are left out; what they guard stays open in the description. */
function jsonSchema(schema: z.ZodType, io: 'input' | 'output'): Record<string, unknown> {
  const described: Record<string, unknown> = {
    ...z.toJSONSchema(schema, { io, unrepresentable: 'any' }),
  };
  delete described.$schema;
  return described;
}
