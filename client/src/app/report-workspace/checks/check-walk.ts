import { DOCUMENT, inject, Injectable } from '@angular/core';
import { noteId } from './note-id';
import { ProofDesk } from '../proof/proof-desk';
import type { ProofCheck } from './proof-check';
import { ReportChecks } from './report-checks';

/** Goes from check to check. */
@Injectable()
export class CheckWalk {
  private readonly document = inject(DOCUMENT);
  private readonly checks = inject(ReportChecks);
  private readonly desk = inject(ProofDesk);

  /** The next open check after the one that was gone to last, or the one before; goes round. */
  step(step: 1 | -1): void {
    const open = this.checks.open();
    const place = open.findIndex(({ id }) => id === this.desk.activeCheck());
    const next = place === -1 ? (step === 1 ? 0 : open.length - 1) : place + step;
    const check = open.at(next % Math.max(1, open.length));
    if (check !== undefined) this.goTo(check);
  }

  /** Takes the block in hand and puts the focus on the note. */
  goTo(check: ProofCheck): void {
    this.desk.select(check.blockId);
    this.desk.activeCheck.set(check.id);
    this.desk.margin.set('checks');
    requestAnimationFrame(() => {
      const note = this.document.getElementById(noteId(check));
      note?.focus({ preventScroll: true });
      note?.scrollIntoView({ block: 'nearest' });
    });
  }
}
