import { ChangeDetectionStrategy, Component, input } from '@angular/core';
import { type MatMenu, MatMenuModule } from '@angular/material/menu';
import { Icon } from '../../ui/marks/icon';

/** A word of a sentence that can be picked: underlined, with a list that opens below it. */
@Component({
  selector: 'eh-pick',
  imports: [Icon, MatMenuModule],
  template: `
    <button
      type="button"
      [class.open]="!picked()"
      [disabled]="disabled()"
      [matMenuTriggerFor]="list()"
    >
      <span class="sr">{{ name() }}:</span>
      <span class="words">{{ words() }}</span>
      <eh-icon name="down" />
    </button>
  `,
  styles: `
    :host {
      display: inline;
    }
    button {
      display: inline;
      padding: 0 2px;
      border: 0;
      border-bottom: 2px solid var(--verd);
      background: none;
      color: inherit;
      font: inherit;
      font-weight: 600;
      text-align: start;
      cursor: pointer;
    }
    button:disabled {
      border-bottom-color: transparent;
      cursor: default;
    }
    button:disabled eh-icon {
      display: none;
    }
    .open {
      border-bottom-style: dashed;
      color: var(--verd);
      font-weight: 500;
    }
    eh-icon {
      margin-left: 4px;
      color: var(--verd);
      vertical-align: -1px;
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class Pick {
  /** What is picked, for who cannot see the sentence: "Exposure". */
  readonly name = input.required<string>();
  readonly words = input.required<string>();
  readonly list = input.required<MatMenu>();
  /** Whether the words are a choice, and not an invitation to make one. */
  readonly picked = input(true);
  readonly disabled = input(false);
}
