import { DestroyRef, effect, inject, untracked } from '@angular/core';
import { FRAMINGS } from '#shared/wording';
import { visibleBlocks } from '#shared/report';
import { ReportProof } from './report-proof';

const AFTER_OPENING_MILLISECONDS = 1_500;

/**
 * Words every block under the framings that are not shown, block by block while nothing else is to
 * do. The composer remembers them, so that the first change of framing is as quick as the others.
 */
export function warmFramings(): void {
  const proof = inject(ReportProof);
  let timer: ReturnType<typeof setTimeout> | undefined;
  const start = effect(() => {
    if (proof.request() === null) return;
    untracked(() => {
      start.destroy();
    });
    timer = setTimeout(() => {
      warmNext(proof, [...jobs(proof)]);
    }, AFTER_OPENING_MILLISECONDS);
  });
  inject(DestroyRef).onDestroy(() => {
    clearTimeout(timer);
  });
}

type Job = Parameters<ReportProof['warm']>[0];

function* jobs(proof: ReportProof): Generator<Job> {
  const request = untracked(proof.request);
  if (request === null) return;
  for (const framing of FRAMINGS) {
    for (const block of visibleBlocks(request.report)) {
      yield { ...request, report: { ...request.report, framing, blocks: [block] } };
    }
  }
}

function warmNext(proof: ReportProof, [job, ...rest]: readonly Job[]): void {
  if (job === undefined || typeof requestIdleCallback !== 'function') return;
  requestIdleCallback(() => {
    proof.warm(job);
    warmNext(proof, rest);
  });
}
