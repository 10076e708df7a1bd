import { afterEach, expect, it } from 'vitest';
import type { ExportRequest } from './export-request';
import { createExporter, EXPORT_LIMITS, type Exporter, type ExportLimits } from './exporter';

const open: Exporter[] = [];
const logged: unknown[] = [];

afterEach(async () => {
  await Promise.all(open.splice(0).map((exporter) => exporter.close()));
  logged.length = 0;
});

function exporterWith(limits: Partial<ExportLimits>): Exporter {
  const log = (_message: string, problem: unknown): void => void logged.push(problem);
  const exporter = createExporter(log, { ...EXPORT_LIMITS, ...limits });
  open.push(exporter);
  return exporter;
}

/** The workers of these tests read nothing but the title. */
function titled(title: string) {
  return { formatId: 'docx', request: { report: { title } } as ExportRequest } as const;
}

const MOODY = 'exports/testing/moody-worker';

it('makes one file after another in one worker', async () => {
  const exporter = exporterWith({ workerPath: MOODY });
  const made = await Promise.all([exporter.make(titled('a')), exporter.make(titled('b'))]);
  expect(made.map((one) => one.ok && [...one.value])).toEqual([[1], [2]]);
});

it('says that a file could not be made, logs why, and goes on with a new worker', async () => {
  const exporter = exporterWith({ workerPath: MOODY });
  const failed = await exporter.make(titled('fail'));
  expect(failed).toEqual({ ok: false, issue: { code: 'exportFailed' } });
  expect(logged).toEqual(['It failed.']);
  expect(await exporter.make(titled('a'))).toEqual({ ok: true, value: Uint8Array.of(1) });
});

it('survives a worker that ends', async () => {
  const exporter = exporterWith({ workerPath: MOODY });
  expect(await exporter.make(titled('end'))).toMatchObject({ issue: { code: 'exportFailed' } });
  expect(await exporter.make(titled('a'))).toMatchObject({ ok: true });
});

it('stops what takes too long', async () => {
  const limits = { workerPath: 'exports/testing/slow-worker', secondsForOne: 0.2 };
  const slow = await exporterWith(limits).make(titled('a'));
  expect(slow).toEqual({ ok: false, issue: { code: 'exportTooSlow', facts: { seconds: 0.2 } } });
});

it('refuses when too many wait', async () => {
  const exporter = exporterWith({ workerPath: MOODY, mostWaiting: 1 });
  const first = exporter.make(titled('a'));
  expect(await exporter.make(titled('b'))).toMatchObject({ issue: { code: 'exportsBusy' } });
  expect(await first).toMatchObject({ ok: true });
});
