import { existsSync, readFileSync } from 'node:fs';

/** What a step without tests counts. */
export const NOTHING = Object.freeze({ passed: 0, failed: 0, skipped: 0 });

/** Counts Vitest's JSON report; see `settle` for what a missing or odd one gives. */
export function countVitest(file, exitCode) {
  const report = readReport(file);
  return settle(exitCode, {
    passed: report?.numPassedTests ?? 0,
    failed: report?.numFailedTests ?? 0,
    skipped: (report?.numPendingTests ?? 0) + (report?.numTodoTests ?? 0),
  });
}

/** Counts Playwright's JSON report; a test that passed only when repeated is a failure. */
export function countPlaywright(file, exitCode) {
  const stats = readReport(file)?.stats;
  return settle(exitCode, {
    passed: stats?.expected ?? 0,
    failed: (stats?.unexpected ?? 0) + (stats?.flaky ?? 0),
    skipped: stats?.skipped ?? 0,
  });
}

/** A tier that ran no test, or ended badly without a failed one, has failed once. */
function settle(exitCode, count) {
  const nothingRan = count.passed + count.failed === 0;
  const endedBadly = exitCode !== 0 && count.failed === 0;
  return nothingRan || endedBadly ? { ...count, failed: 1 } : count;
}

function readReport(file) {
  return existsSync(file) ? JSON.parse(readFileSync(file, 'utf8')) : undefined;
}
