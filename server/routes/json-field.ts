import * as z from 'zod';

/** A field of a multipart form that holds JSON of this shape. */
export function jsonField<Value>(schema: z.ZodType<Value>): z.ZodType<Value> {
  return z
    .string()
    .transform((text, context): unknown => {
      try {
        return JSON.parse(text);
      } catch {
        context.addIssue({ code: 'custom', message: 'This is not valid JSON.' });
        return z.NEVER;
      }
    })
    .pipe(schema);
}
