import {
  afterNextRender,
  ChangeDetectionStrategy,
  Component,
  computed,
  DestroyRef,
  effect,
  ElementRef,
  inject,
  input,
  signal,
} from '@angular/core';
import { MarginNote } from '../../ui/status/margin-note';
import { CheckRemedies } from '../checks/check-remedies';
import { noteId } from '../checks/note-id';
import type { ProofCheck } from '../checks/proof-check';
import { ProofDesk } from '../proof/proof-desk';
import { MarginLayout } from './margin-layout';

/** How far the first line of a note lies below its top. */
const FIRST_LINE = 9;

/** One finding, at the height of the line that it speaks of, with a leader to it. */
@Component({
  selector: 'eh-check-note',
  imports: [MarginNote],
  template: `
    @if (check().weight === 'quiet') {
      <p class="shut">
        <i aria-hidden="true"></i>
        <span>
          {{ opened() ? (check().detail ?? check().text) : check().text }}
          @if (check().detail) {
            <button
              type="button"
              class="text-button ink"
              [attr.aria-expanded]="opened()"
              (click)="opened.set(!opened())"
            >
              {{ opened() ? 'Close' : 'Open' }}
            </button>
          }
        </span>
      </p>
    } @else {
      <span class="leader" aria-hidden="true"></span>
      <eh-margin-note
        [tone]="check().weight === 'problem' ? 'problem' : 'caution'"
        [tag]="check().tag"
        [subject]="check().subject"
      >
        {{ check().text }}
        <ng-container noteActions>
          @for (remedy of remedies(); track remedy.label) {
            <button type="button" class="text-button" (click)="run(remedy)">
              {{ remedy.label }}
            </button>
          }
        </ng-container>
      </eh-margin-note>
    }
  `,
  styleUrl: './check-note.scss',
  host: {
    role: 'note',
    tabindex: '-1',
    '[class]': 'check().weight',
    '[class.active]': 'active()',
    '[attr.id]': 'id()',
    '(focusin)': 'activate()',
  },
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class CheckNote {
  private readonly host = inject<ElementRef<HTMLElement>>(ElementRef).nativeElement;
  private readonly layout = inject(MarginLayout);
  private readonly desk = inject(ProofDesk);
  private readonly actions = inject(CheckRemedies);

  readonly check = input.required<ProofCheck>();

  protected readonly opened = signal(false);
  protected readonly id = computed(() => noteId(this.check()));
  protected readonly active = computed(() => this.desk.activeCheck() === this.check().id);
  protected readonly remedies = computed(() => this.actions.possible(this.check()));

  constructor() {
    const destroyed = inject(DestroyRef);
    afterNextRender(() => {
      const row = this.host.closest<HTMLElement>('eh-proof-row');
      if (row === null) return;
      const place = {
        element: this.host,
        row,
        anchor: () => anchorHeight(row, this.check()),
        active: () => this.active(),
      };
      destroyed.onDestroy(this.layout.add(place));
    });
    effect(() => {
      this.active();
      this.layout.schedule();
    });
  }

  protected activate(): void {
    this.desk.activeCheck.set(this.check().id);
  }

  protected run(remedy: ProofCheck['remedies'][number]): void {
    this.actions.run(this.check(), remedy);
  }
}

function anchorHeight(row: HTMLElement, { anchor }: ProofCheck): number {
  const found = anchor === null ? undefined : row.querySelectorAll(anchor.selector)[anchor.index];
  const line = found?.getClientRects()[0];
  if (line === undefined) return 0;
  const below = line.top - row.getBoundingClientRect().top;
  return Math.max(0, below + line.height / 2 - FIRST_LINE);
}
