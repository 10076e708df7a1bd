import type { AcceptedStep, ReportView, StepsRequest, StepsView } from '#shared/api';
import {
  applyStep,
  contentChangedBy,
  parseStep,
  rebaseStep,
  type Report,
  type Step,
} from '#shared/report';
import { NEVER, type Observable, of, throwError } from 'rxjs';
import { ApiProblem } from '../../../server-api/api-problem';
import type { ReportsApi } from '../../../server-api/reports-api';

type Frame = Pick<AcceptedStep, 'id' | 'groupId' | 'undoes'>;

const AT = '2025-12-01T10:00:00.000Z';

/** Applies steps to a report as the server does: known ids once, texts brought up to date. */
export class FakeServer implements Partial<ReportsApi> {
  readonly accepted: AcceptedStep[] = [];
  /** What the next requests fail with, one after the other; null lets one pass. */
  readonly failures: (ApiProblem | 'never answers' | null)[] = [];
  requests = 0;

  constructor(public report: Report) {}

  read(): Observable<ReportView> {
    const report = { ...this.report, blocks: [...this.report.blocks], pins: {} };
    return of({
      report,
      pins: [],
      houseStyle: { id: 'open-clinical' },
      drafts: [],
    } as unknown as ReportView);
  }

  stepsAfter(_studyId: string, _reportId: string, after: number): Observable<StepsView> {
    const steps = this.accepted.filter(({ seq }) => seq > after);
    return of({ seq: this.report.seq, steps });
  }

  submitSteps(_studyId: string, _reportId: string, { steps }: StepsRequest): Observable<StepsView> {
    this.requests += 1;
    const failure = this.failures.shift();
    if (failure === 'never answers') return NEVER;
    if (failure) return throwError(() => failure);
    const taken: AcceptedStep[] = [];
    for (const step of steps) {
      const known = this.accepted.find(({ id }) => id === step.id);
      const made = known ?? this.accept(step, step.step as unknown as Step, 'Ines Okafor');
      if (made instanceof ApiProblem) return throwError(() => made);
      taken.push(made);
    }
    return of({ seq: this.report.seq, steps: taken });
  }

  putDraft(): Observable<never> {
    return throwError(() => new ApiProblem({ code: 'none', title: 'No drafts here.' }));
  }

  /** Somebody else makes a step. */
  other(step: Step): void {
    const id = `other-${this.accepted.length}`;
    this.accept({ id, groupId: id, undoes: null }, step, 'Tomas Lind');
  }

  private accept(frame: Frame, sent: Step, person: string): AcceptedStep | ApiProblem {
    const parsed = parseStep(sent);
    const newer = this.accepted.map(({ step }) => step as unknown as Step);
    const rebased = parsed.ok ? rebaseStep(parsed.value, newer) : parsed;
    const applied = rebased.ok ? applyStep(this.report, rebased.value, { at: AT }) : rebased;
    if (!applied.ok || !rebased.ok)
      return this.refused(applied.ok ? 'staleEdit' : applied.issue.code, sent);
    this.report = applied.value.report;
    const { id, groupId, undoes } = frame;
    const made = { id, groupId, undoes, person, personId: person, at: AT };
    const steps = { step: rebased.value, inverse: applied.value.inverse };
    const accepted = { ...made, ...steps, seq: this.report.seq } as unknown as AcceptedStep;
    this.accepted.push(accepted);
    return accepted;
  }

  private refused(code: string, sent: Step): ApiProblem {
    const blockId = contentChangedBy(sent);
    const status = code === 'staleEdit' || code === 'blockRemoved' ? 409 : 422;
    return new ApiProblem({ code, title: 'Refused.', status, facts: { blockId } });
  }
}
