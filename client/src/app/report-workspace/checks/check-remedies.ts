import { inject, Injectable } from '@angular/core';
import { Router } from '@angular/router';
import { CurrentStudy } from '../../session/current-study';
import { BlockActions } from '../block-actions/block-actions';
import { ProofDesk } from '../proof/proof-desk';
import { ReportStore } from '../report-store/report-store';
import { bindTypedNumber } from './bind-typed-number';
import type { CheckRemedy, ProofCheck } from './proof-check';

/** Does what a check offers. */
@Injectable()
export class CheckRemedies {
  private readonly actions = inject(BlockActions);
  private readonly store = inject(ReportStore);
  private readonly desk = inject(ProofDesk);
  private readonly study = inject(CurrentStudy);
  private readonly router = inject(Router);

  /** What this person may do about it. Reads signals. */
  possible({ blockId, remedies }: ProofCheck): readonly CheckRemedy[] {
    const mayChange = this.actions.mayChange(blockId);
    return remedies.filter(({ kind }) => kind === 'analysis' || mayChange);
  }

  run({ blockId }: ProofCheck, remedy: CheckRemedy): void {
    switch (remedy.kind) {
      case 'edit':
        this.desk.edit(blockId);
        break;
      case 'bind':
        this.bind(blockId, remedy);
        break;
      case 'analysis':
        void this.router.navigate([
          '/studies',
          this.study.study()?.id,
          'analyses',
          remedy.analysisId,
        ]);
        break;
    }
  }

  private bind(blockId: string, remedy: CheckRemedy & { readonly kind: 'bind' }): void {
    const block = this.store.block(blockId);
    const step = block && bindTypedNumber(block, remedy.typedIndex, remedy.address);
    if (step) this.actions.make([step]);
  }
}
