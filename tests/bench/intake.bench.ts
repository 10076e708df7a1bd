import { createReadStream, createWriteStream } from 'node:fs';
import { mkdtemp, rm, stat } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { once } from 'node:events';
import { setTimeout as wait } from 'node:timers/promises';
import { parse } from 'csv-parse';
import exceljs from 'exceljs';
import { afterAll, beforeAll, it } from 'vitest';
import type { Study } from '../../server/models/study/study-store';
import type { User } from '../../server/models/user/user-store';
import { receiveUpload } from '../../server/services/uploads/receive-upload';
import { startTestApplication, type TestApplication } from '../builders/test-application';
import { report, type Timing } from './measure';

const CSV_ROWS = 1_000_000;
const XLSX_ROWS = 100_000;
const FIND_OUT = { delimiter: null, encoding: null, decimalMark: null, sheet: null } as const;

let folder: string;
let application: TestApplication;
let person: User;
let study: Study;

beforeAll(async () => {
  folder = await mkdtemp(join(tmpdir(), 'evenhand-bench-'));
  application = await startTestApplication();
  person = await application.addPerson();
  study = await application.addStudy();
}, 60_000);

afterAll(async () => {
  await application.close();
  await rm(folder, { recursive: true, force: true });
});

it('reads, profiles, encodes and stores a CSV of 1,000,000 rows × 10 columns', async () => {
  const path = join(folder, 'many.csv');
  await writeCsv(path);
  const floor = await once3(() => parseAlone(path));
  const readings = await readings3(path, 'many.csv');
  report({
    what: 'read and store a CSV of 1,000,000 rows × 10 columns (at most a third of csv-parse)',
    budgetInMilliseconds: Math.round(floor.median / 3),
    timing: spread(readings.map(({ milliseconds }) => milliseconds)),
    floor: { what: 'csv-parse alone', timing: floor },
  });
  tellSurroundings('CSV', (await stat(path)).size, readings, 300);
}, 600_000);

it('reads, profiles, encodes and stores an XLSX of 100,000 rows × 10 columns', async () => {
  const path = join(folder, 'many.xlsx');
  await writeXlsx(path);
  const readings = await readings3(path, 'many.xlsx');
  report({
    what: 'read and store an XLSX of 100,000 rows × 10 columns',
    budgetInMilliseconds: 20_000,
    timing: spread(readings.map(({ milliseconds }) => milliseconds)),
    floor: null,
  });
  tellSurroundings('XLSX', (await stat(path)).size, readings, 500);
}, 600_000);

interface Reading {
  readonly milliseconds: number;
  readonly memoryAboveIdleInMegabytes: number;
  /** The slowest answer that another request got meanwhile. */
  readonly slowestAnswer: number;
  /** The longest time in which the progress that is shown did not change. */
  readonly longestSilence: number;
}

function tellSurroundings(
  what: string,
  bytes: number,
  readings: readonly Reading[],
  megabytes: number,
): void {
  const most = (of: (reading: Reading) => number): string =>
    Math.max(...readings.map(of)).toFixed(0);
  console.log(
    `  ${what} of ${(bytes / 1e6).toFixed(0)} MB: ` +
      `memory ${most((one) => one.memoryAboveIdleInMegabytes)} MB above idle ` +
      `(at most ${String(megabytes)}), ` +
      `slowest other answer ${most((one) => one.slowestAnswer)} ms (at most 50), ` +
      `longest silence ${most((one) => one.longestSilence)} ms (at most 1000)`,
  );
}

/** The first reading starts the thread and is not counted. */
async function readings3(path: string, fileName: string): Promise<readonly Reading[]> {
  await readOnce(path, fileName);
  return [
    await readOnce(path, fileName),
    await readOnce(path, fileName),
    await readOnce(path, fileName),
  ];
}

async function readOnce(path: string, fileName: string): Promise<Reading> {
  const { dependencies } = application;
  const copy = `${path}-copy`;
  await copyOf(path, copy);
  const idle = process.memoryUsage().rss;
  const watch = watchServer();
  const start = performance.now();
  const arrived = { path: copy, fileName, options: FIND_OUT, dataSetId: null };
  const upload = await receiveUpload(dependencies, person, study, arrived);
  if (!upload.ok) throw new Error(upload.issue.code);
  watch.follow(upload.value.id);
  await dependencies.background.idle();
  const milliseconds = performance.now() - start;
  const { peak, slowestAnswer, longestSilence } = await watch.end();
  const memoryAboveIdleInMegabytes = (peak - idle) / 1e6;
  return { milliseconds, memoryAboveIdleInMegabytes, slowestAnswer, longestSilence };
}

/** Asks the server something small again and again, and looks at memory and progress. */
function watchServer() {
  const { dependencies } = application;
  const seen = { peak: 0, slowestAnswer: 0, longestSilence: 0 };
  let id = '';
  let shown = '';
  let changedAt = performance.now();
  const watch = { going: true };
  const watching = (async () => {
    while (watch.going) {
      const asked = performance.now();
      await dependencies.database.stores.studies.findById(study.id);
      const now = performance.now();
      seen.slowestAnswer = Math.max(seen.slowestAnswer, now - asked);
      seen.peak = Math.max(seen.peak, process.memoryUsage().rss);
      const progress = JSON.stringify(dependencies.intake.progressOf(id));
      if (progress !== shown) changedAt = now;
      shown = progress;
      if (progress !== 'null') seen.longestSilence = Math.max(seen.longestSilence, now - changedAt);
      await wait(5);
    }
  })();
  return {
    follow: (uploadId: string) => {
      id = uploadId;
      changedAt = performance.now();
    },
    end: async () => {
      watch.going = false;
      await watching;
      return seen;
    },
  };
}

async function once3(work: () => Promise<unknown>): Promise<Timing> {
  const times: number[] = [];
  for (let run = 0; run < 3; run += 1) {
    const start = performance.now();
    await work();
    times.push(performance.now() - start);
  }
  return spread(times);
}

function spread(times: readonly number[]): Timing {
  const sorted = times.toSorted((one, other) => one - other);
  const [lowest = 0] = sorted;
  const median = sorted[Math.floor(sorted.length / 2)] ?? 0;
  return { median, lowest, highest: sorted.at(-1) ?? 0, runs: sorted.length };
}

async function parseAlone(path: string): Promise<number> {
  let rows = 0;
  const reading = createReadStream(path, { highWaterMark: 1 << 20 }).pipe(parse());
  for await (const row of reading) rows += Array.isArray(row) ? 1 : 0;
  return rows;
}

async function copyOf(path: string, copy: string): Promise<void> {
  await rm(copy, { force: true });
  const writing = createReadStream(path).pipe(createWriteStream(copy));
  await once(writing, 'finish');
}

const NAMES = ['id', 'sex', 'age', 'band', 'ward', 'exposed', 'ill', 'day', 'dose', 'note'];

/** Invented records, among them a column of different identifiers and one with quotes. */
function cells(row: number): readonly (string | number)[] {
  const part = (of: number): number => (Math.imul(row + 1, 2_654_435_761) >>> 8) % of;
  return [
    100_000 + row,
    part(2) === 0 ? 'Female' : 'Male',
    20 + part(60),
    ['0-9', '10-19', '20-29', '30+'][part(4)] ?? '',
    `Ward ${String(part(12))}`,
    part(3) === 0 ? 'yes' : 'no',
    part(10) === 0 ? 1 : 0,
    `2026-0${String(1 + part(9))}-1${String(part(7))}`,
    part(10_000) / 100,
    part(11) === 0 ? 'see, note' : '',
  ];
}

async function writeCsv(path: string): Promise<void> {
  const file = createWriteStream(path);
  file.write(`${NAMES.join(',')}\n`);
  for (let from = 0; from < CSV_ROWS; from += 10_000) {
    const lines = Array.from({ length: 10_000 }, (_, at) =>
      cells(from + at)
        .map((cell) => (cell === 'see, note' ? `"${cell}"` : String(cell)))
        .join(','),
    );
    if (!file.write(`${lines.join('\n')}\n`)) await once(file, 'drain');
  }
  file.end();
  await once(file, 'finish');
}

async function writeXlsx(path: string): Promise<void> {
  const workbook = new exceljs.stream.xlsx.WorkbookWriter({ filename: path });
  const sheet = workbook.addWorksheet('Data');
  sheet.addRow(NAMES).commit();
  for (let row = 0; row < XLSX_ROWS; row += 1) sheet.addRow([...cells(row)]).commit();
  await workbook.commit();
}
