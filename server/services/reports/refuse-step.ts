import { reportIssueText, type StepIssue, type StepIssueCode } from '#shared/report';
import type { IssueCode } from '../../errors/issues';
import { refuse, type ServerIssue } from '../../errors/server-issue';

/** The refusal of a step that can't be read or applied. */
export function refuseStep(issue: StepIssue): { readonly ok: false; readonly issue: ServerIssue } {
  const code = CODES[issue.code] ?? 'stepNotUsable';
  const detail = code === 'stepNotUsable' ? { detail: reportIssueText(issue) } : {};
  return refuse(code, { ...detail, facts: { ...issue.facts, issue: issue.code } });
}

const CODES: Readonly<Partial<Record<StepIssueCode, IssueCode>>> = {
  blockUnknown: 'blockUnknown',
  blockExists: 'blockExists',
  blockRemoved: 'blockRemoved',
  staleEdit: 'staleEdit',
  staleMove: 'staleMove',
};
