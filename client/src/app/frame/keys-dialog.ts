import { ChangeDetectionStrategy, Component, computed, inject, type Injector } from '@angular/core';
import { MatDialog, MatDialogRef } from '@angular/material/dialog';
import { DialogFrame } from '../ui/dialog/dialog-frame';
import { DIALOG_SIZE } from '../ui/dialog/dialog-size';
import { KeyLabel } from '../ui/keys/key-label';
import { KeyCommands } from '../ui/keys/key-commands';
import type { KeyCommand } from '../ui/keys/key-command';

/** Shows every key of the page in view. */
export function openKeysDialog(injector: Injector): void {
  injector.get(MatDialog).open(KeysDialog, { ...DIALOG_SIZE, autoFocus: 'dialog' });
}

interface KeyGroup {
  readonly name: string;
  readonly commands: readonly KeyCommand[];
}

/** All keys in groups, and the switch for single keys. */
@Component({
  selector: 'eh-keys-dialog',
  imports: [DialogFrame, KeyLabel],
  templateUrl: './keys-dialog.html',
  styleUrl: './keys-dialog.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class KeysDialog {
  private readonly reference = inject<MatDialogRef<KeysDialog>>(MatDialogRef);
  protected readonly keys = inject(KeyCommands);
  protected readonly groups = computed(() => groupsOf(this.keys.all()));

  protected switchSingleKeys(event: Event): void {
    this.keys.singleKeysOn.set((event.target as HTMLInputElement).checked);
  }

  protected close(): void {
    this.reference.close();
  }
}

function groupsOf(commands: readonly KeyCommand[]): readonly KeyGroup[] {
  const names = [...new Set(commands.map((command) => command.group))];
  return names.map((name) => ({
    name,
    commands: commands.filter((command) => command.group === name),
  }));
}
