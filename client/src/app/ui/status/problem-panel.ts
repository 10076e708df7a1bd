import { ChangeDetectionStrategy, Component, input } from '@angular/core';
import { Icon } from '../marks/icon';

/** What was refused and what to do about it; `ApiProblem` fits. */
export interface PlainProblem {
  readonly title: string;
  readonly detail?: string;
  readonly wayOut?: string;
}

/** A problem that no single field explains, said where the action was. */
@Component({
  selector: 'eh-problem-panel',
  imports: [Icon],
  template: `
    <eh-icon name="problem" />
    <div>
      <b>{{ problem().title }}</b>
      @if (problem().detail; as detail) {
        <p>{{ detail }}</p>
      }
      @if (problem().wayOut; as wayOut) {
        <p>{{ wayOut }}</p>
      }
      <ng-content />
    </div>
  `,
  styleUrl: './problem-panel.scss',
  host: { role: 'alert' },
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class ProblemPanel {
  readonly problem = input.required<PlainProblem>();
}
