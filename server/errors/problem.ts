import type { Response } from 'express';
import type { Problem } from '#shared/api';
import { issueAnswer } from './issues';
import type { ServerIssue } from './server-issue';

/** The problem details (RFC 9457) of an issue. */
export function presentProblem(issue: ServerIssue): Problem {
  const answer = issueAnswer(issue.code);
  return {
    type: `/problems/${issue.code}`,
    title: fillBraces(answer.title, issue.facts ?? {}),
    status: answer.status,
    code: issue.code,
    ...(issue.detail === undefined ? {} : { detail: issue.detail }),
    ...(answer.wayOut === undefined ? {} : { wayOut: answer.wayOut }),
    ...(issue.fields === undefined ? {} : { fields: [...issue.fields] }),
    ...(issue.facts === undefined ? {} : { facts: { ...issue.facts } }),
  };
}

/** Answers a request with the problem details of an issue. */
export function sendProblem(response: Response, issue: ServerIssue): void {
  const problem = presentProblem(issue);
  const seconds = issue.facts?.seconds;
  if (problem.status === 429 && typeof seconds === 'number') {
    response.set('Retry-After', String(seconds));
  }
  response.status(problem.status).type('application/problem+json').send(JSON.stringify(problem));
}

function fillBraces(title: string, facts: Readonly<Record<string, unknown>>): string {
  return title.replace(/\{(\w+)\}/g, (whole, name: string) => {
    const fact = facts[name];
    if (Array.isArray(fact)) return fact.join(', ');
    return typeof fact === 'string' || typeof fact === 'number' ? String(fact) : whole;
  });
}
