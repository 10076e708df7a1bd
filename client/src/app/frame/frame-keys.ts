import { effect, inject } from '@angular/core';
import { Router } from '@angular/router';
import { keyCommands, KeyCommands } from '../ui/keys/key-commands';
import type { KeyCommand } from '../ui/keys/key-command';
import { KeysDialogOpener } from './keys-dialog-opener';
import { type Section, sections } from './sections';

/** The keys that act on every page: G and a letter, and the list of all keys. */
export function frameKeys(): void {
  const router = inject(Router);
  const dialog = inject(KeysDialogOpener);
  keyCommands([
    {
      key: '?',
      says: 'All keys',
      group: 'Everywhere',
      run: () => {
        dialog.open();
      },
    },
  ]);
  sectionKeys(router);
}

function sectionKeys(router: Router): void {
  const commands = inject(KeyCommands);
  const places = sections();
  effect((onCleanup) => {
    onCleanup(commands.add(places().flatMap((section) => sectionKey(section, router))));
  });
}

function sectionKey(section: Section, router: Router): readonly KeyCommand[] {
  if (section.key === null) return [];
  return [
    {
      key: `G then ${section.key}`,
      says: `Go to ${section.name.toLowerCase()}`,
      group: 'Everywhere',
      run: () => void router.navigate([...section.link]),
    },
  ];
}
