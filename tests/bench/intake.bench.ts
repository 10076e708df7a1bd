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
import { report, timingOf } from './measure';

const CSV_ROWS = 1_000_000;
const XLSX_ROWS = 100_000;
const FIND_OUT = { delimiter: null, encoding: null, decimalMark: null, sheet: null } as const;

let folder: string;
let application: TestApplication;
let person: User;
let study: Study;
/** Memory before the first file came. */
let idle: number;

beforeAll(async () => {
  folder = await mkdtemp(join(tmpdir(), 'evenhand-bench-'));
  application = await startTestApplication();
  person = await application.addPerson();
  study = await application.addStudy();
  idle = process.memoryUsage().rss;
}, 60_000);

afterAll(async () => {
  await application.close();
  await rm(folder, { recursive: true, force: true });
});

it('reads, profiles, encodes and stores a CSV of 1,000,000 rows × 10 columns', async () => {
  const path = join(folder, 'many.csv');
  await writeCsv(path);
  const { readings, floors } = await inTurn(path, 'many.csv');
  const floor = timingOf(floors);
  report({
    what: 'read and store a CSV of 1,000,000 rows × 10 columns (at most a third of csv-parse)',
    budgetInMilliseconds: Math.round(floor.median / 3),
    timing: timingOf(readings.map(({ milliseconds }) => milliseconds)),
    floor: { what: 'csv-parse alone', timing: floor },
  });
  tellSurroundings('CSV', (await stat(path)).size, readings, 300);
}, 600_000);

it('reads, profiles, encodes and stores an XLSX of 100,000 rows × 10 columns', async () => {
  const path = join(folder, 'many.xlsx');
  await writeXlsx(path);
  const { readings } = await inTurn(path, 'many.xlsx');
  report({
    what: 'read and store an XLSX of 100,000 rows × 10 columns',
    budgetInMilliseconds: 20_000,
    timing: timingOf(readings.map(({ milliseconds }) => milliseconds)),
    floor: null,
  });
  tellSurroundings('XLSX', (await stat(path)).size, readings, 500);
}, 600_000);

interface Reading {
  readonly milliseconds: number;
  readonly memoryAboveIdleInMegabytes: number;
  /** The slowest answer that another request got meanwhile. */
  readonly slowestAnswer: number;
  /** The time within which 95 % of them came. */
  readonly mostAnswers: number;
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
  const told = [
    `memory ${most((one) => one.memoryAboveIdleInMegabytes)} MB above idle`,
    `(at most ${String(megabytes)})`,
    `slowest other answer ${most((one) => one.slowestAnswer)} ms (at most 50)`,
    `95 % of them within ${most((one) => one.mostAnswers)} ms`,
    `longest silence ${most((one) => one.longestSilence)} ms (at most 1000)`,
  ];
  console.log(`  ${what} of ${(bytes / 1e6).toFixed(0)} MB: ${told.join(', ')}`);
}

const RUNS = 3;

/**
 * Reads a file some times, each time after the floor, so that both meet the same busy machine. The
 * first reading starts the thread and is not timed; it alone tells the memory, since the floor
 * leaves its own behind in this process.
 */
async function inTurn(
  path: string,
  fileName: string,
): Promise<{ readonly readings: readonly Reading[]; readonly floors: readonly number[] }> {
  const { memoryAboveIdleInMegabytes } = await readOnce(path, fileName);
  const readings: Reading[] = [];
  const floors: number[] = [];
  for (let run = 0; run < RUNS; run += 1) {
    if (fileName.endsWith('.csv')) floors.push(await parseAlone(path));
    readings.push({ ...(await readOnce(path, fileName)), memoryAboveIdleInMegabytes });
  }
  return { readings, floors };
}

async function readOnce(path: string, fileName: string): Promise<Reading> {
  const { dependencies } = application;
  const copy = `${path}-copy`;
  await copyOf(path, copy);
  const watch = watchServer();
  const start = performance.now();
  const arrived = { path: copy, fileName, options: FIND_OUT, dataSetId: null };
  const upload = await receiveUpload(dependencies, person, study, arrived);
  if (!upload.ok) throw new Error(upload.issue.code);
  watch.follow(upload.value.id);
  await dependencies.background.idle();
  const milliseconds = performance.now() - start;
  const seen = await watch.end();
  return { milliseconds, memoryAboveIdleInMegabytes: (seen.peak - idle) / 1e6, ...seen };
}

/** Asks the server something small again and again, and looks at memory and progress. */
function watchServer() {
  const { dependencies } = application;
  const answers: number[] = [];
  const seen = { peak: 0, longestSilence: 0 };
  const state = { id: '', shown: '', changedAt: performance.now(), going: true };
  const look = async (): Promise<void> => {
    const asked = performance.now();
    await dependencies.database.stores.studies.findById(study.id);
    const now = performance.now();
    answers.push(now - asked);
    seen.peak = Math.max(seen.peak, process.memoryUsage().rss);
    const progress = JSON.stringify(dependencies.intake.progressOf(state.id));
    if (progress !== state.shown) state.changedAt = now;
    state.shown = progress;
    if (progress === 'null') return;
    seen.longestSilence = Math.max(seen.longestSilence, now - state.changedAt);
  };
  const watching = (async () => {
    while (state.going) {
      await look();
      await wait(5);
    }
  })();
  return {
    follow: (uploadId: string) => {
      state.id = uploadId;
      state.changedAt = performance.now();
    },
    end: async () => {
      state.going = false;
      await watching;
      const { highest: slowestAnswer } = timingOf(answers);
      const sorted = answers.toSorted((one, other) => one - other);
      const mostAnswers = sorted[Math.floor(sorted.length * 0.95)] ?? 0;
      return { ...seen, slowestAnswer, mostAnswers };
    },
  };
}

/** Milliseconds that csv-parse needs for the rows alone. */
async function parseAlone(path: string): Promise<number> {
  const start = performance.now();
  const reading = createReadStream(path, { highWaterMark: 1 << 20 }).pipe(parse());
  reading.resume();
  await once(reading, 'end');
  return performance.now() - start;
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
