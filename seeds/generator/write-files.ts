import { writeFileSync } from 'node:fs';
import { harbourSupperFiles } from './harbour-supper';
import { reminderLetterFiles } from './reminder-letters';
import { screenUseFiles } from './screen-use';
import { wetWorkFiles } from './wet-work';

/** Every demonstration file by name; run this file to write them to seeds/data. */
export function demonstrationFiles(): Readonly<Record<string, string>> {
  return {
    ...wetWorkFiles(),
    ...harbourSupperFiles(),
    ...reminderLetterFiles(),
    ...screenUseFiles(),
  };
}

if (process.argv[1]?.endsWith('write-files.ts') === true) {
  for (const [name, text] of Object.entries(demonstrationFiles())) {
    writeFileSync(new URL(`../data/${name}`, import.meta.url), text);
  }
}
