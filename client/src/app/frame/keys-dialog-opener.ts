import { inject, Injectable, Injector } from '@angular/core';

/** Opens the list of all keys; its code is loaded when somebody asks for it. */
@Injectable({ providedIn: 'root' })
export class KeysDialogOpener {
  private readonly injector = inject(Injector);

  open(): void {
    void this.load();
  }

  private async load(): Promise<void> {
    const { openKeysDialog } = await import('./keys-dialog');
    openKeysDialog(this.injector);
  }
}
