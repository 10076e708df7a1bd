import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';

const ARROWS: Readonly<Record<string, string>> = { Up: '↑', Down: '↓', Left: '←', Right: '→' };

/** A key as keys are drawn: `Alt Up` becomes two caps, `G then D` two with a word between. */
@Component({
  selector: 'eh-key-label',
  template: `
    @for (part of parts(); track $index) {
      @if (part.cap) {
        <kbd [attr.aria-label]="part.text">{{ part.drawn }}</kbd>
      } @else {
        <span>then</span>
      }
    }
  `,
  styles: `
    :host {
      display: inline-flex;
      gap: 4px;
      align-items: center;
      font: var(--t-note);
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class KeyLabel {
  readonly key = input.required<string>();

  protected readonly parts = computed(() =>
    this.key()
      .split(' ')
      .map((text) => ({ text, cap: text !== 'then', drawn: ARROWS[text] ?? text })),
  );
}
