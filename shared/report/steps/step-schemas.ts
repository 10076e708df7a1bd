import * as z from 'zod/mini';

/** An id of a block, an analysis, a result or a house style. */
export const idSchema = z.string().check(z.minLength(1), z.maxLength(100));

/** A version that a step was made against. */
export const versionSchema = z.int().check(z.gte(1));
