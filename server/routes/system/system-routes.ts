import * as z from 'zod';
import { describeApi } from '../../openapi/describe-api';
import { json, publicRoute } from '../define-route';
import type { Route } from '../route';

/** Whether the server serves, and the description of the routes that it serves. */
export function systemRoutes(register: () => readonly Route[]): readonly Route[] {
  return [
    publicRoute({
      method: 'get',
      path: '/api/health',
      summary: 'Says that the server is serving.',
      reply: json(z.object({ status: z.literal('serving') })),
      handle: () => Promise.resolve({ ok: true, value: { status: 'serving' } as const }),
    }),
    publicRoute({
      method: 'get',
      path: '/api/openapi.json',
      summary: 'Describes every route (OpenAPI 3.1).',
      reply: json(z.record(z.string(), z.unknown())),
      handle: () => Promise.resolve({ ok: true, value: describeApi(register()) }),
    }),
  ];
}
