import { ChangeDetectionStrategy, Component, computed, inject } from '@angular/core';
import { SaveState } from '../report-store/save-state';
import { tryAgainNow } from '../report-store/retry-delay';

/** Whether the person's work is saved, in two words beside the title. */
@Component({
  selector: 'eh-save-mark',
  template: `
    <span class="words" [class]="state().kind" [attr.title]="state().reason || null">
      <i aria-hidden="true"></i>
      {{ state().words }}
    </span>
    @if (state().kind === 'stuck') {
      <button type="button" class="text-button" (click)="retry()">Try now</button>
    }
    <span class="sr" role="status">{{ spoken() }}</span>
  `,
  styleUrl: './save-mark.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class SaveMark {
  private readonly saveState = inject(SaveState);
  protected readonly state = this.saveState.words;

  /** Only trouble is spoken; that all goes well need not be said after every word. */
  protected readonly spoken = computed(() => {
    const { kind, words, reason } = this.state();
    return kind === 'stuck' || kind === 'contested' ? `${words}. ${reason}` : '';
  });

  protected retry(): void {
    tryAgainNow.next();
  }
}
