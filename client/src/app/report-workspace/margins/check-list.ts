import { ChangeDetectionStrategy, Component, inject } from '@angular/core';
import { ReportChecks } from '../checks/report-checks';
import type { ProofCheck } from '../checks/proof-check';
import { CheckWalk } from '../checks/check-walk';

/** The right margin as a landmark: every open check, each leading to its note. */
@Component({
  selector: 'eh-check-list',
  template: `
    <aside aria-label="Queries and checks">
      <ul>
        @for (check of checks.open(); track check.id) {
          <li>
            <button type="button" (click)="go(check)">{{ check.tag }}: {{ check.subject }}</button>
          </li>
        } @empty {
          <li>Nothing to look at.</li>
        }
      </ul>
    </aside>
  `,
  styleUrl: './landmark-list.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class CheckList {
  private readonly walk = inject(CheckWalk);
  protected readonly checks = inject(ReportChecks);

  protected go(check: ProofCheck): void {
    this.walk.goTo(check);
  }
}
