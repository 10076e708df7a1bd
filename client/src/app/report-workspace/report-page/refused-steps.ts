import { ChangeDetectionStrategy, Component, inject } from '@angular/core';
import { ProblemPanel } from '../../ui/status/problem-panel';
import type { RefusedStep } from '../report-store/refused-step';
import { ReportSync } from '../report-store/report-sync';
import { wordsOfStep } from '../report-store/words-of-step';

/** Changes that the server will not take, with its reason, and the words that were in them. */
@Component({
  selector: 'eh-refused-steps',
  imports: [ProblemPanel],
  template: `
    @for (refused of sync.refused(); track refused.made.id) {
      <eh-problem-panel [problem]="refused.problem">
        @if (wordsOf(refused); as words) {
          <blockquote>{{ words }}</blockquote>
        }
        <button type="button" class="text-button" (click)="sync.dismiss(refused)">Close</button>
      </eh-problem-panel>
    }
  `,
  styles: `
    eh-problem-panel {
      max-width: 900px;
      margin: 0 auto 12px;
    }
    blockquote {
      margin: 6px 0;
      padding-left: 10px;
      border-left: 2px solid var(--line-2);
      font: 400 14px/20px var(--serif);
      user-select: all;
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class RefusedSteps {
  protected readonly sync = inject(ReportSync);

  protected wordsOf({ made }: RefusedStep): string {
    return wordsOfStep(made.step);
  }
}
