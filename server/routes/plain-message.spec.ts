import * as z from 'zod';
import { describe, expect, it } from 'vitest';
import { plainMessage } from './plain-message';

function messageFor(schema: z.ZodType, value: unknown): string | undefined {
  return schema.safeParse(value, { error: plainMessage }).error?.issues[0]?.message;
}

describe('a field that cannot be used', () => {
  it.each([
    [z.string(), undefined, 'This is needed.'],
    [z.string(), 7, 'This must be text.'],
    [z.number(), 'x', 'This must be a number.'],
    [z.int(), 1.5, 'This must be a whole number.'],
    [z.boolean(), 'yes', 'This must be true or false.'],
    [z.array(z.string()), {}, 'This must be a list.'],
    [z.object({}), [], 'This must be an object.'],
    [z.enum(['a', 'b']), 'c', 'This must be one of: a, b.'],
    [z.string().min(1), '', 'This is needed.'],
    [z.string().min(3), 'a', 'Use at least 3 characters.'],
    [z.string().max(3), 'abcd', 'Use at most 3 characters.'],
    [z.array(z.string()).min(2), [], 'Give at least 2.'],
    [z.array(z.string()).max(1), ['a', 'b'], 'Give at most 1.'],
    [z.number().min(0), -1, 'This must be 0 or more.'],
    [z.number().gt(0), 0, 'This must be more than 0.'],
    [z.number().max(9), 10, 'This must be 9 or less.'],
    [z.number().lt(1), 1, 'This must be less than 1.'],
    [z.strictObject({}), { extra: 1 }, 'Not known here: extra.'],
    [z.uuid(), 'x', 'This cannot be used here.'],
    [z.string().min(1, 'Give a name.'), '', 'Give a name.'],
  ])('is told in plain words (%#)', (schema, value, message) => {
    expect(messageFor(schema, value)).toBe(message);
  });
});
