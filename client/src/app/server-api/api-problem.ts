import { HttpErrorResponse } from '@angular/common/http';
import type { Problem } from '#shared/api';

/** A field of a request that the server refused, and why, in plain words. */
export interface FieldProblem {
  readonly path: string;
  readonly message: string;
}

const OUT_OF_REACH = {
  code: 'outOfReach',
  title: 'The server cannot be reached.',
  wayOut: 'Your work is still here. Check the connection, then do it again.',
};

const UNREADABLE_ANSWER = {
  code: 'unreadableAnswer',
  title: 'The server gave an answer that cannot be read.',
  wayOut: 'Your work is still here. Load the page again; tell an administrator if it stays so.',
};

/**
 * A refused request, as the server's problem details say it (RFC 9457).
 *
 * `code` is the stable id, `title` one plain sentence, `wayOut` what to do, `fields` what is wrong
 * with which field, `facts` what a conflict needs. Every method of `server-api` fails with this
 * class and no other.
 */
export class ApiProblem extends Error {
  readonly code: string;
  readonly status: number;
  readonly title: string;
  readonly detail: string;
  readonly wayOut: string;
  readonly fields: readonly FieldProblem[];
  readonly facts: Readonly<Record<string, unknown>>;

  constructor(problem: Partial<Problem> & Pick<Problem, 'code' | 'title'>) {
    super(problem.title);
    this.name = 'ApiProblem';
    this.code = problem.code;
    this.status = problem.status ?? 0;
    this.title = problem.title;
    this.detail = problem.detail ?? '';
    this.wayOut = problem.wayOut ?? '';
    this.fields = problem.fields ?? [];
    this.facts = problem.facts ?? {};
  }

  /** What the field at `path` is refused for, or null. */
  fieldMessage(path: string): string | null {
    return this.fields.find((field) => field.path === path)?.message ?? null;
  }

  /** Turns whatever a request failed with into a problem. */
  static from(failure: unknown): ApiProblem {
    if (failure instanceof ApiProblem) return failure;
    if (!(failure instanceof HttpErrorResponse)) return new ApiProblem(UNREADABLE_ANSWER);
    if (failure.status === 0) return new ApiProblem(OUT_OF_REACH);
    const body = parsed(failure.error);
    return isProblem(body)
      ? new ApiProblem(body)
      : new ApiProblem({ ...UNREADABLE_ANSWER, status: failure.status });
  }
}

/** A body arrives parsed, or as text when the request asked for another type. */
function parsed(body: unknown): unknown {
  if (typeof body !== 'string') return body;
  try {
    return JSON.parse(body) as unknown;
  } catch {
    return null;
  }
}

function isProblem(body: unknown): body is Problem {
  return (
    typeof body === 'object' &&
    body !== null &&
    'code' in body &&
    typeof body.code === 'string' &&
    'title' in body &&
    typeof body.title === 'string'
  );
}
