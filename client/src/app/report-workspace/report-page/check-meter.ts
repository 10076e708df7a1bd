import { ChangeDetectionStrategy, Component, computed, inject } from '@angular/core';
import { ReportChecks } from '../checks/report-checks';
import { CheckWalk } from '../checks/check-walk';
import { ReportStore } from '../report-store/report-store';

/** How the report stands with its checks: blocks that are clear, to look at, to fix. */
@Component({
  selector: 'eh-check-meter',
  template: `
    <button
      type="button"
      title="Go to the next check"
      [disabled]="fix() + look() === 0"
      (click)="walk.step(1)"
    >
      <span class="bar" aria-hidden="true">
        <i class="clear" [style.flex-grow]="clear()"></i>
        <i class="look" [style.flex-grow]="look()"></i>
        <i class="fix" [style.flex-grow]="fix()"></i>
      </span>
      <span>
        @if (fix() > 0) {
          <b>{{ fix() }} to fix</b>{{ look() > 0 ? ', ' : '' }}
        }
        @if (look() > 0) {
          {{ look() }} to look at
        }
        @if (fix() + look() === 0) {
          Nothing to look at
        }
      </span>
    </button>
  `,
  styleUrl: './check-meter.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class CheckMeter {
  private readonly checks = inject(ReportChecks);
  private readonly store = inject(ReportStore);
  protected readonly walk = inject(CheckWalk);

  protected readonly fix = computed(() => this.checks.problems().length);
  protected readonly look = computed(() => this.checks.cautions().length);
  protected readonly clear = computed(() => {
    const marked = new Set(this.checks.open().map(({ blockId }) => blockId));
    return this.store.blocks().filter(({ id }) => !marked.has(id)).length;
  });
}
