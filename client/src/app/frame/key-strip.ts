import { ChangeDetectionStrategy, Component, computed, inject } from '@angular/core';
import type { KeyCommand } from '../ui/keys/key-command';
import { KeyCommands } from '../ui/keys/key-commands';
import { KeyLabel } from '../ui/keys/key-label';
import { KeysDialogOpener } from './keys-dialog-opener';

interface StripEntry {
  readonly says: string;
  readonly keys: readonly string[];
}

/** The most useful keys of the page at its foot. Pages without such keys have no strip. */
@Component({
  selector: 'eh-key-strip',
  imports: [KeyLabel],
  template: `
    @if (entries().length > 0) {
      <footer aria-label="Keys">
        @for (entry of entries(); track entry.says) {
          <span>
            @for (key of entry.keys; track key) {
              <eh-key-label [key]="key" />
            }
            {{ entry.says }}
          </span>
        }
        <button type="button" (click)="showAll()"><kbd>?</kbd> All keys</button>
      </footer>
    }
  `,
  styleUrl: './key-strip.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class KeyStrip {
  private readonly keysDialog = inject(KeysDialogOpener);
  private readonly keys = inject(KeyCommands);
  protected readonly entries = computed(() => entriesOf(this.keys.strip()));

  protected showAll(): void {
    this.keysDialog.open();
  }
}

function entriesOf(commands: readonly KeyCommand[]): readonly StripEntry[] {
  const sentences = [...new Set(commands.map((command) => command.says))];
  return sentences.map((says) => ({
    says,
    keys: commands.filter((command) => command.says === says).map((command) => command.key),
  }));
}
