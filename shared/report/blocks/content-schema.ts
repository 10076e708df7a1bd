import * as z from 'zod/mini';
import { failure, success } from '#shared/core';
import type { Result } from '#shared/core';
import type { ResultScope } from '#shared/analysis';
import type { ContentIssue } from '../content-issue';
import { parseTextDocument } from '../text/parse-text-document';
import type { TextDocument } from '../text/text-document';

/** An id inside a content. */
export const idSchema = z.string().check(z.minLength(1), z.maxLength(100));

/** Where in a result. */
export const scopeSchema: z.ZodMiniType<ResultScope> = z.discriminatedUnion('kind', [
  z.object({ kind: z.literal('crude') }),
  z.object({ kind: z.literal('stratum'), stratumId: z.string().check(z.minLength(1)) }),
  z.object({ kind: z.literal('pooled') }),
]);

/** Any text document; its own issues reach the caller as they are. */
export const documentSchema = textSchemaOf(parseTextDocument);

/** A text document of exactly one paragraph: a heading, a title, the words round a phrase. */
export const lineSchema = textSchemaOf((value) => {
  const parsed = parseTextDocument(value);
  if (!parsed.ok) return parsed;
  const [only, ...others] = parsed.value.content;
  const oneParagraph = only?.type === 'paragraph' && others.length === 0;
  return oneParagraph ? parsed : failure({ code: 'oneParagraphOnly' });
});

/** Makes a kind's `parseContent` from the schema of its content. */
export function contentParser<Content>(
  schema: z.ZodMiniType<Content>,
): (content: unknown) => Result<Content, ContentIssue> {
  return (content) => {
    const parsed = schema.safeParse(content);
    return parsed.success ? success(parsed.data) : failure(issueOf(parsed.error.issues));
  };
}

type TextParser = (value: unknown) => Result<TextDocument, ContentIssue>;

function textSchemaOf(parse: TextParser): z.ZodMiniType<TextDocument> {
  return z.pipe(
    z.unknown(),
    z.transform((value, context) => {
      const parsed = parse(value);
      if (parsed.ok) return parsed.value;
      context.issues.push({ code: 'custom', input: value, params: { issue: parsed.issue } });
      return z.NEVER;
    }),
  );
}

function issueOf(issues: readonly z.core.$ZodIssue[]): ContentIssue {
  const first = issues[0];
  const field = first?.path.join('.') ?? '';
  const own = first?.code === 'custom' ? (first.params?.issue as ContentIssue) : null;
  if (own === null) return { code: 'contentNotReadable', facts: { field } };
  return { ...own, facts: { ...own.facts, field } };
}
