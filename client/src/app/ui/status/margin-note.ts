import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';

/** What a note is about; decides its ink and the look of its tag. */
export type NoteTone = 'query' | 'problem' | 'caution' | 'clear';

const INKS: Readonly<Record<NoteTone, string>> = {
  query: 'var(--verm)',
  problem: 'var(--verm)',
  caution: 'var(--ochre-line)',
  clear: 'var(--verd-line)',
};

/**
 * A note beside a line: a rule, a tag, a bold subject, then one or two sentences as content. Text
 * buttons go into the slot `[noteActions]`.
 */
@Component({
  selector: 'eh-margin-note',
  template: `
    <p class="head" role="heading" [attr.aria-level]="headingLevel()">
      <span class="tag" [class]="tone()">{{ tag() }}</span>
      {{ subject() }}
      @if (meta(); as meta) {
        <span class="meta">{{ meta }}</span>
      }
    </p>
    <div class="text"><ng-content /></div>
    <div class="actions"><ng-content select="[noteActions]" /></div>
  `,
  styleUrl: './margin-note.scss',
  host: { '[style.border-inline-start-color]': 'ink()' },
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class MarginNote {
  readonly tone = input.required<NoteTone>();
  readonly tag = input.required<string>();
  readonly subject = input.required<string>();
  /** Who or when, in third ink. */
  readonly meta = input('');

  /** Where the note stands among the headings of its page. */
  readonly headingLevel = input(3);

  protected readonly ink = computed(() => INKS[this.tone()]);
}
