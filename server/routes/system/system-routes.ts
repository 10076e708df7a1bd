import * as z from 'zod';
import { json, publicRoute } from '../define-route';
import type { Route } from '../route';

/** Whether the server serves, and what it serves. */
export const systemRoutes: readonly Route[] = [
  publicRoute({
    method: 'get',
    path: '/api/health',
    summary: 'Says that the server is serving.',
    reply: json(z.object({ status: z.literal('serving') })),
    handle: () => Promise.resolve({ ok: true, value: { status: 'serving' } as const }),
  }),
];
