import { ChangeDetectionStrategy, Component, computed, inject, signal } from '@angular/core';
import { FramingRail } from '../../ui/framing/framing-rail';
import { Icon } from '../../ui/marks/icon';
import { CheckRemedies } from '../checks/check-remedies';
import { ReportChecks } from '../checks/report-checks';
import { ProofDesk } from '../proof/proof-desk';
import { ReportFraming } from './report-framing';

/** On phones the notes come one by one in a dock at the foot, over the framing rail. */
@Component({
  selector: 'eh-phone-dock',
  imports: [FramingRail, Icon],
  templateUrl: './phone-dock.html',
  styleUrl: './phone-dock.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class PhoneDock {
  private readonly desk = inject(ProofDesk);
  protected readonly remedies = inject(CheckRemedies);
  protected readonly checks = inject(ReportChecks);
  protected readonly framing = inject(ReportFraming);

  protected readonly open = signal(false);
  private readonly asked = signal(0);
  protected readonly place = computed(() =>
    Math.min(this.asked(), Math.max(0, this.checks.open().length - 1)),
  );
  protected readonly check = computed(() => this.checks.open()[this.place()] ?? null);
  protected readonly actions = computed(() => {
    const check = this.check();
    return check === null ? [] : this.remedies.possible(check);
  });

  protected toggle(): void {
    this.open.update((open) => !open);
    if (this.open()) this.show();
  }

  protected next(): void {
    this.asked.set((this.place() + 1) % Math.max(1, this.checks.open().length));
    this.show();
  }

  private show(): void {
    const check = this.check();
    if (check !== null) this.desk.select(check.blockId);
  }
}
