import { unzipSync, zipSync, type Zippable } from 'fflate';

/** The parts of a zip file by path. */
export type ZipParts = Readonly<Record<string, Uint8Array>>;

/** Unpacks a zip file. */
export function openZip(bytes: Uint8Array): ZipParts {
  return unzipSync(bytes);
}

/** Packs parts so that equal parts give equal bytes: in order of path, with one fixed time. */
export function fixedZip(parts: ZipParts): Uint8Array {
  // Readers of office files expect the list of content types first.
  const paths = Object.keys(parts).toSorted((one, other) => rank(one).localeCompare(rank(other)));
  const entries = paths.map((path): [string, Zippable[string]] => [
    path,
    [parts[path] as Uint8Array, { level: packed(path) ? 0 : 6, mtime: FIXED_TIME }],
  ]);
  return zipSync(Object.fromEntries(entries));
}

/** Zip files keep local time; made in local time, these fields are the same everywhere. */
const FIXED_TIME = new Date(1980, 0, 1);

function rank(path: string): string {
  return (path === '[Content_Types].xml' ? '0' : '1') + path;
}

function packed(path: string): boolean {
  return path.endsWith('.png');
}
