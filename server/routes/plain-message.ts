import type * as z from 'zod';

type RawIssue = Parameters<z.core.$ZodErrorMap>[0];

/** Says in plain words what a schema expected, where the schema has no message of its own. */
export function plainMessage(issue: RawIssue): string {
  switch (issue.code) {
    case 'invalid_type':
      return issue.input === undefined
        ? 'This is needed.'
        : `This must be ${typeInWords(issue.expected)}.`;
    case 'invalid_value':
      return `This must be one of: ${issue.values.map(String).join(', ')}.`;
    case 'too_small':
      return tooSmall(issue);
    case 'too_big':
      return tooBig(issue);
    case 'unrecognized_keys':
      return `Not known here: ${issue.keys.join(', ')}.`;
    default:
      return 'This cannot be used here.';
  }
}

const TYPES_IN_WORDS: Readonly<Record<string, string>> = {
  string: 'text',
  number: 'a number',
  int: 'a whole number',
  boolean: 'true or false',
  array: 'a list',
  object: 'an object',
  record: 'an object',
  date: 'a date',
};

function typeInWords(expected: string): string {
  return TYPES_IN_WORDS[expected] ?? expected;
}

function tooSmall(issue: z.core.$ZodRawIssue<z.core.$ZodIssueTooSmall>): string {
  const least = String(issue.minimum);
  if (issue.origin === 'string')
    return least === '1' ? 'This is needed.' : `Use at least ${least} characters.`;
  if (issue.origin === 'array') return `Give at least ${least}.`;
  return issue.inclusive === false
    ? `This must be more than ${least}.`
    : `This must be ${least} or more.`;
}

function tooBig(issue: z.core.$ZodRawIssue<z.core.$ZodIssueTooBig>): string {
  const most = String(issue.maximum);
  if (issue.origin === 'string') return `Use at most ${most} characters.`;
  if (issue.origin === 'array') return `Give at most ${most}.`;
  return issue.inclusive === false
    ? `This must be less than ${most}.`
    : `This must be ${most} or less.`;
}
