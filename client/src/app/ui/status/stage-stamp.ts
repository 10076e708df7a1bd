import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import type { ReportStage } from '#shared/report/report';

const STAGE_WORDS: Readonly<Record<ReportStage, string>> = {
  drafting: 'Drafting',
  inReview: 'In review',
  signedOff: 'Signed off',
  submitted: 'Submitted',
  superseded: 'Superseded',
};

/** Two rules round a stage: what it is about in bold, where it stands beside it. */
@Component({
  selector: 'eh-stage-stamp',
  template: `
    <span class="inner">
      <b>{{ about() }}</b>
      <i>{{ words() }}</i>
    </span>
  `,
  styleUrl: './stage-stamp.scss',
  host: { '[class.agreed]': 'agreed()', '[class.small]': 'small()' },
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class StageStamp {
  readonly about = input('Report');
  readonly stage = input.required<ReportStage>();
  readonly small = input(false);

  protected readonly words = computed(() => STAGE_WORDS[this.stage()]);
  protected readonly agreed = computed(() => ['signedOff', 'submitted'].includes(this.stage()));
}
