import * as z from 'zod';

/** A field of a request that cannot be used, and why, in plain words. */
export const fieldProblemSchema = z.object({ path: z.string(), message: z.string() });

/**
 * Problem details (RFC 9457): every error of the API. `code` is the stable id of `type`;
 * `wayOut` says what to do; `facts` hold what a conflict needs (both versions).
 */
export const problemSchema = z.object({
  type: z.string(),
  title: z.string(),
  status: z.int(),
  code: z.string(),
  detail: z.string().optional(),
  wayOut: z.string().optional(),
  fields: z.array(fieldProblemSchema).optional(),
  facts: z.record(z.string(), z.unknown()).optional(),
});

/** Body of every refused request. */
export type Problem = z.infer<typeof problemSchema>;
