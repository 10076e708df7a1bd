import { inject, Injectable } from '@angular/core';
import { SessionStore } from '../../session/session-store';
import { newId } from '../../ui/new-id';
import { forget, keep, keptKeys, readKept } from './browser-storage';
import { type MadeStep, madeStepOf, submissionOf } from './made-step';

/**
 * Keeps steps that the server has not answered in this browser, so that closing the page loses
 * nothing. Every page keeps its own list; the next page that opens the report takes over all of
 * them, which is harmless, as the server knows steps by their ids.
 */
@Injectable()
export class UnsentSteps {
  private readonly session = inject(SessionStore);
  private readonly pageId = newId();

  keep(reportId: string, steps: readonly MadeStep[]): void {
    const key = this.prefix(reportId) + this.pageId;
    if (steps.length === 0) forget(key);
    else keep(key, steps.map(submissionOf));
  }

  /** Takes what earlier pages of this person could not send, oldest first. */
  takeOver(reportId: string): readonly MadeStep[] {
    const keys = keptKeys(this.prefix(reportId));
    const steps = keys.flatMap(keptSteps);
    keys.forEach(forget);
    return steps;
  }

  private prefix(reportId: string): string {
    return `evenhand.unsent.${this.session.person()?.id ?? ''}.${reportId}.`;
  }
}

function keptSteps(key: string): readonly MadeStep[] {
  const kept = readKept(key);
  return Array.isArray(kept) ? kept.flatMap((each) => madeStepOf(each) ?? []) : [];
}
