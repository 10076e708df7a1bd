import { execFile, spawnSync } from 'node:child_process';
import { mkdtemp, readdir, readFile, rm, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { promisify } from 'node:util';

const run = promisify(execFile);

/** Programs that read exported files, or recompute numbers, without any code of ours. */
const READERS = {
  libreOffice: ['soffice', '--version'],
  popplerText: ['pdftotext', '-v'],
  pythonDocx: ['/usr/bin/python3', '-c', 'import docx'],
  openpyxl: ['/usr/bin/python3', '-c', 'import openpyxl'],
  r: ['Rscript', '--version'],
} as const satisfies Readonly<Record<string, readonly [string, ...string[]]>>;

/** One of the programs. */
export type OutsideReader = keyof typeof READERS;

/**
 * Whether tests that need these programs are skipped: where one is missing, except in CI, where a
 * missing one has to fail.
 */
export function skipsWithout(...readers: readonly OutsideReader[]): boolean {
  return !process.env.CI && !readers.every(isThere);
}

function isThere(reader: OutsideReader): boolean {
  const [program, ...parameters] = READERS[reader];
  return spawnSync(program, parameters, { stdio: 'ignore' }).status === 0;
}

/** Does something with a file in a folder of its own, which is removed afterwards. */
export async function withFile<Value>(
  name: string,
  bytes: Uint8Array,
  work: (folder: string) => Promise<Value>,
): Promise<Value> {
  const folder = await mkdtemp(join(tmpdir(), 'evenhand-reader-'));
  try {
    await writeFile(join(folder, name), bytes);
    return await work(folder);
  } finally {
    await rm(folder, { recursive: true, force: true });
  }
}

/** The text of a file as LibreOffice prints it, page by page. */
export async function printedText(name: string, bytes: Uint8Array): Promise<string> {
  return withFile(name, bytes, async (folder) => {
    await convert(folder, name, 'pdf');
    const pdf = join(folder, name.replace(/\.\w+$/, '.pdf'));
    const { stdout } = await run('pdftotext', ['-layout', pdf, '-'], { maxBuffer: LARGE });
    return stdout;
  });
}

/** Each sheet of a workbook by name, its cells as LibreOffice shows them. */
export async function shownSheets(
  bytes: Uint8Array,
): Promise<Readonly<Record<string, readonly (readonly string[])[]>>> {
  return withFile('book.xlsx', bytes, async (folder) => {
    // Comma, quotes, UTF-8, from the first line, as shown, every sheet in a file of its own.
    await convert(
      folder,
      'book.xlsx',
      `csv:${CSV_FILTER}:44,34,76,1,,0,false,true,true,false,false,-1`,
    );
    const files = (await readdir(folder)).filter((file) => file.endsWith('.csv'));
    const sheets = files.map(async (file): Promise<[string, string[][]]> => {
      const name = file.slice('book-'.length, -'.csv'.length);
      return [name, parseCsv(await readFile(join(folder, file), 'utf8'))];
    });
    return Object.fromEntries(await Promise.all(sheets));
  });
}

/** What a Python script prints as JSON about a file; the script finds the path in `argv[1]`. */
export async function askPython(name: string, bytes: Uint8Array, script: string): Promise<unknown> {
  return withFile(name, bytes, async (folder) => {
    const { stdout } = await run('/usr/bin/python3', ['-c', script, join(folder, name)], {
      maxBuffer: LARGE,
    });
    return JSON.parse(stdout) as unknown;
  });
}

const LARGE = 64 * 1024 * 1024;

const CSV_FILTER = 'Text - txt - csv (StarCalc)';

/** Every conversion has a profile of its own, so that several can run at once. */
async function convert(folder: string, name: string, to: string): Promise<void> {
  const profile = `-env:UserInstallation=file://${join(folder, 'profile')}`;
  const parameters = [profile, '--headless', '--convert-to', to, '--outdir', folder];
  await run('soffice', [...parameters, join(folder, name)], { timeout: 120_000 });
}

function parseCsv(text: string): string[][] {
  const rows: string[][] = [[]];
  const cells = text.matchAll(/(?:"((?:[^"]|"")*)"|([^",\n]*))(,|\n|$)/g);
  for (const [whole, quoted, plain, end] of cells) {
    if (whole === '' && end === '') break;
    rows.at(-1)!.push(quoted?.replaceAll('""', '"') ?? plain ?? '');
    if (end === '\n') rows.push([]);
  }
  return rows;
}
