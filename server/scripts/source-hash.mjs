import { createHash } from 'node:crypto';
import { existsSync, readdirSync, readFileSync, statSync } from 'node:fs';
import { join } from 'node:path';

/** One hash over the names and contents of files and whole folders; specs don't count. */
export function sourceHash(paths) {
  const hash = createHash('sha256').update(process.version);
  for (const file of paths.flatMap(filesUnder)) {
    hash.update(`\n${file}\n`).update(readFileSync(file));
  }
  return hash.digest('hex');
}

function filesUnder(path) {
  if (!existsSync(path)) return [];
  if (!statSync(path).isDirectory()) return [path];
  const names = readdirSync(path).sort();
  return names.flatMap((name) => filesUnder(join(path, name))).filter(isPartOfTheBuild);
}

function isPartOfTheBuild(file) {
  return !file.endsWith('.spec.ts');
}
