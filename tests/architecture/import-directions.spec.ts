import { describe, expect, it } from 'vitest';
import {
  CLIENT_BASE,
  CLIENT_FEATURES,
  type Directions,
  FEATURE,
  HTTP_USERS,
  LEAF_DOORS,
  REPORT,
  SERVER,
  SHARED,
} from './import-directions';
import { type Import, importsOf, parsed, type SourceFile, sourceFiles } from './source-files';

const shared = sourceFiles('shared');
const server = sourceFiles('server');
const client = sourceFiles('client/src');
const seeds = sourceFiles('seeds');

describe('shared', () => {
  it('has a direction for every folder', () => {
    expect(foldersOf(shared, 1)).toEqual(Object.keys(SHARED).toSorted());
  });

  it.each(Object.entries(SHARED))('%s imports what is above it only', (folder, directions) => {
    const files = shared.filter(({ path }) => path.startsWith(`shared/${folder}/`));
    expect(files).not.toHaveLength(0);
    expect(broken(files, (file, one) => allowedInShared(file, one, folder, directions))).toEqual(
      [],
    );
  });

  it.each(Object.entries(REPORT))('report/%s keeps its place', (part, { from }) => {
    const files = shared.filter(({ path }) => path.startsWith(`shared/report/${part}/`));
    const allowed = (_: SourceFile, { target }: Import): boolean =>
      !isWithin(target, 'shared/report') || [part, ...from].includes(partOf(target, REPORT, 2));
    expect(broken(files, allowed)).toEqual([]);
  });

  it('has block kinds that know nothing of each other', () => {
    const kindOf = (path: string): string | undefined =>
      /^shared\/report\/blocks\/([^/]+)\//.exec(path)?.[1];
    const kinds = shared.filter(({ path }) => kindOf(path) !== undefined);
    const own = ({ path }: SourceFile, { target }: Import): boolean =>
      kindOf(target) === undefined || kindOf(target) === kindOf(path);
    expect(kinds).not.toHaveLength(0);
    expect(broken(kinds, own)).toEqual([]);
  });
});

describe('doors', () => {
  it('are the only way into shared folders, but for the leaf doors', () => {
    const outsiders = [...shared, ...server, ...client, ...seeds];
    const throughDoor = ({ path }: SourceFile, { target }: Import): boolean =>
      !isWithin(target, 'shared') ||
      isWithin(path, ...folderOf(target)) ||
      target.split('/').length === 2 ||
      LEAF_DOORS.includes(target);
    expect(broken(outsiders, throughDoor)).toEqual([]);
  });

  it('past a door, only what somebody needs is open', () => {
    const used = new Set([...shared, ...server, ...client, ...seeds].flatMap(targetsOf));
    expect(LEAF_DOORS.filter((door) => !used.has(door))).toEqual([]);
  });
});

describe('server', () => {
  it('has a direction for every folder and file', () => {
    const names = foldersOf(server, 1).map((name) => name.replace(/\.ts$/, ''));
    expect(names.filter((name) => name !== 'scripts')).toEqual(Object.keys(SERVER).toSorted());
  });

  it.each(Object.entries(SERVER))('%s imports what its place allows', (folder, directions) => {
    const files = server.filter(
      ({ path }) => partOf(path.replace(/\.ts$/, ''), SERVER, 1) === folder,
    );
    const allowed = (_: SourceFile, one: Import): boolean => {
      if (!isWithin(one.target, 'server', 'client', 'seeds', 'tests')) return true;
      const part = isWithin(one.target, 'server') ? partOf(one.target, SERVER, 1) : one.target;
      return part === folder || mayImport(directions, part, one);
    };
    expect(files).not.toHaveLength(0);
    expect(broken(files, allowed)).toEqual([]);
  });

  it('lets nothing but stores out of models', () => {
    const stores = /^server\/models\/(?:[^/]+\/[^/]+-store|stores|database|unit-of-work)$/;
    const elsewhere = server.filter(({ path }) => !isWithin(path, 'server/models'));
    const asStore = (_: SourceFile, { target, typeOnly }: Import): boolean =>
      !isWithin(target, 'server/models') || stores.test(target) || typeOnly;
    expect(broken(elsewhere, asStore)).toEqual([]);
  });

  it('opens the database on the main thread only', () => {
    const workers = server.filter(({ path }) => path.endsWith('-worker.ts'));
    const reached = reachable(workers, server);
    expect(workers).not.toHaveLength(0);
    expect(reached.filter((path) => isWithin(path, 'server/models'))).toEqual([]);
  });
});

describe('seeds', () => {
  it('call services and never models', () => {
    const allowed = (_: SourceFile, { target, typeOnly }: Import): boolean =>
      typeOnly || !isWithin(target, 'server/models');
    expect(broken(seeds, allowed)).toEqual([]);
  });
});

describe('client', () => {
  const directionsOf = (part: string): Directions | undefined =>
    CLIENT_FEATURES.includes(part) ? FEATURE : CLIENT_BASE[part];

  it('has a place for every folder', () => {
    const folders = foldersOf(client, 3).filter((name) => !name.endsWith('.ts'));
    const known = [...Object.keys(CLIENT_BASE), ...CLIENT_FEATURES, 'frame'];
    expect(folders).toEqual(known.toSorted());
  });

  it.each([...Object.keys(CLIENT_BASE), ...CLIENT_FEATURES])('%s keeps its place', (folder) => {
    const files = client.filter(({ path }) => isWithin(path, `client/src/app/${folder}`));
    const allowed = (_: SourceFile, one: Import): boolean => {
      if (isWithin(one.target, 'server', 'seeds', 'tests')) return false;
      const part = appPart(one.target);
      return part === null || part === folder || mayImport(directionsOf(folder)!, part, one);
    };
    expect(files).not.toHaveLength(0);
    expect(broken(files, allowed)).toEqual([]);
  });

  it('has a frame that reaches features through their routes, and later', () => {
    const frame = client.filter(({ path }) => isWithin(path, 'client/src/app/frame'));
    const allowed = (_: SourceFile, { target, later }: Import): boolean => {
      const part = appPart(target);
      if (part === null || ['frame', ...FEATURE.from].includes(part)) return true;
      return later && target === `client/src/app/${part}/${part}-routes`;
    };
    expect(broken(frame, allowed)).toEqual([]);
  });

  it('sends requests from server-api alone', () => {
    const allowed = ({ path }: SourceFile, { target }: Import): boolean =>
      !target.startsWith('package:@angular/common/http') ||
      HTTP_USERS.includes(appPart(path) ?? '');
    expect(broken(client, allowed)).toEqual([]);
    const knowAddresses = client.filter(({ text }) => /['"`]\/api\b/.test(text));
    expect(knowAddresses.map(({ path }) => appPart(path))).toEqual(
      knowAddresses.map(() => 'server-api'),
    );
  });
});

describe('the rules themselves', () => {
  it.each([
    ['stats', "import { composeReport } from '#shared/report';"],
    ['stats', "import { readFileSync } from 'node:fs';"],
    ['effects', "export { compose } from '../report/compose/compose-report';"],
    ['layout', "type Far = import('#shared/wording').Claim;"],
    ['core', "const later = import('#shared/stats');"],
  ])('find in %s: %s', (folder, text) => {
    const file = parsed(`shared/${folder}/made-up.ts`, text);
    const allowed = (each: SourceFile, one: Import): boolean =>
      allowedInShared(each, one, folder, SHARED[folder]!);
    expect(broken([file], allowed)).toHaveLength(1);
  });
});

/** What breaks a rule, as "file imports target", one a line. */
function broken(
  files: readonly SourceFile[],
  allowed: (file: SourceFile, one: Import) => boolean,
): readonly string[] {
  return files.flatMap((file) =>
    importsOf(file)
      .filter((one) => !allowed(file, one))
      .map(({ target, typeOnly }) => `${file.path} imports ${target}${typeOnly ? ' (type)' : ''}`),
  );
}

function allowedInShared(
  _: SourceFile,
  one: Import,
  folder: string,
  directions: Directions,
): boolean {
  const { target } = one;
  if (target.startsWith('package:')) return allowsPackage(directions, target.slice(8));
  const part = target.split('/')[1] ?? '';
  return isWithin(target, 'shared') && (part === folder || mayImport(directions, part, one));
}

function mayImport({ from, types = [] }: Directions, part: string, { typeOnly }: Import): boolean {
  return from.includes(part) || (typeOnly && types.includes(part));
}

function allowsPackage({ packages = [] }: Directions, name: string): boolean {
  return packages.some((each) =>
    each.endsWith('*') ? name.startsWith(each.slice(0, -1)) : name === each,
  );
}

function targetsOf(file: SourceFile): readonly string[] {
  return importsOf(file).map(({ target }) => target);
}

function isWithin(path: string, ...folders: readonly string[]): boolean {
  return folders.some((folder) => path === folder || path.startsWith(`${folder}/`));
}

/** "shared/effects" of any path below it. */
function folderOf(target: string): readonly string[] {
  return [target.split('/').slice(0, 2).join('/')];
}

/** The name at a depth where the table knows it, else "." for files that stand beside folders. */
function partOf(path: string, table: object, depth: number): string {
  const name = path.split('/')[depth] ?? '';
  return name in table ? name : '.';
}

function appPart(path: string): string | null {
  return /^client\/src\/app\/([^/]+?)(?:\.ts)?(?:\/|$)/.exec(path)?.[1] ?? null;
}

function foldersOf(files: readonly SourceFile[], depth: number): readonly string[] {
  const names = files.map(({ path }) => path.split('/')[depth] ?? '');
  return [...new Set(names)].filter((name) => name !== '').toSorted();
}

/** Paths of files that are loaded when the given ones are, over any number of steps. */
function reachable(start: readonly SourceFile[], all: readonly SourceFile[]): readonly string[] {
  const byName = new Map(all.map((file) => [file.path.replace(/(\/index)?\.ts$/, ''), file]));
  const seen = new Set<SourceFile>();
  const queue = [...start];
  for (let file = queue.pop(); file !== undefined; file = queue.pop()) {
    if (seen.has(file)) continue;
    seen.add(file);
    const loaded = importsOf(file).filter(({ typeOnly }) => !typeOnly);
    queue.push(...loaded.flatMap(({ target }) => byName.get(target) ?? []));
  }
  return [...seen].map(({ path }) => path);
}
