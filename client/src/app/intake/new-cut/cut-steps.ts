import { ChangeDetectionStrategy, Component, computed, input, model } from '@angular/core';
import { Icon } from '../../ui/marks/icon';

/** The steps of a new cut, in order. */
export const CUT_STEPS = ['upload', 'columns', 'codeBook', 'check', 'made'] as const;

/** One of the steps. */
export type CutStep = (typeof CUT_STEPS)[number];

const STEP_WORDS: Readonly<Record<CutStep, string>> = {
  upload: 'Upload',
  columns: 'Columns',
  codeBook: 'Code book',
  check: 'Check',
  made: 'Make the cut',
};

/** Where a new cut stands; steps that can be gone to are buttons. */
@Component({
  selector: 'eh-cut-steps',
  imports: [Icon],
  template: `
    <ol>
      @for (row of rows(); track row.step) {
        <li
          [class.current]="row.isCurrent"
          [class.done]="row.isDone"
          [attr.aria-current]="row.isCurrent ? 'step' : null"
        >
          <button type="button" [disabled]="!row.isOpen" (click)="step.set(row.step)">
            <span class="number" aria-hidden="true">
              @if (row.isDone) {
                <eh-icon name="clear" />
              } @else {
                {{ row.number }}
              }
            </span>
            <span class="words">
              <b>{{ row.name }}</b>
              <small>{{ row.note }}</small>
            </span>
          </button>
        </li>
      }
    </ol>
  `,
  styleUrl: './cut-steps.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class CutSteps {
  readonly step = model.required<CutStep>();
  /** The steps that can be gone to. */
  readonly open = input.required<readonly CutStep[]>();
  /** What stands below each name. */
  readonly notes = input.required<Readonly<Record<CutStep, string>>>();

  protected readonly rows = computed(() => {
    const at = CUT_STEPS.indexOf(this.step());
    return CUT_STEPS.map((step, index) => ({
      step,
      number: index + 1,
      name: STEP_WORDS[step],
      note: this.notes()[step],
      isCurrent: index === at,
      isDone: index < at || this.step() === 'made',
      isOpen: this.open().includes(step),
    }));
  });
}
