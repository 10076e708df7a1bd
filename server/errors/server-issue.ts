import type { IssueCode } from './issues';

/** A field that cannot be used; `path` is dotted, as in `rows.3.events`. */
export interface FieldProblem {
  readonly path: string;
  readonly message: string;
}

/**
 * An expected failure of a service. `detail` adds a sentence to the title; `facts` fill the braces
 * of the title and are sent along (a conflict's both versions, for instance).
 */
export interface ServerIssue {
  readonly code: IssueCode;
  readonly detail?: string;
  readonly facts?: Readonly<Record<string, unknown>>;
  readonly fields?: readonly FieldProblem[];
}

/** What a service gives: a value, or the expected reason why not. */
export type Outcome<Value> =
  | { readonly ok: true; readonly value: Value }
  | { readonly ok: false; readonly issue: ServerIssue };

/** A refusal, to be returned by a service. */
export function refuse(
  code: IssueCode,
  more: Omit<ServerIssue, 'code'> = {},
): { readonly ok: false; readonly issue: ServerIssue } {
  return { ok: false, issue: { code, ...more } };
}

/** A refusal because of one field, shown beside it. */
export function refuseField(
  path: string,
  message: string,
): { readonly ok: false; readonly issue: ServerIssue } {
  return refuse('invalidRequest', { fields: [{ path, message }] });
}
