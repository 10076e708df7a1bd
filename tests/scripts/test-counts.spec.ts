import { mkdtempSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { describe, expect, it } from 'vitest';
import { countPlaywright, countVitest } from './test-counts.mjs';

const folder = mkdtempSync(join(tmpdir(), 'evenhand-counts-'));

function report(content: object): string {
  const file = join(folder, 'report.json');
  writeFileSync(file, JSON.stringify(content));
  return file;
}

describe('the count of one tier', () => {
  it('takes passed, failed and skipped tests from a Vitest report', () => {
    const file = report({ numPassedTests: 5, numFailedTests: 2, numPendingTests: 1 });
    expect(countVitest(file, 1)).toEqual({ passed: 5, failed: 2, skipped: 1 });
  });

  it('counts a browser test that passed only when repeated as failed', () => {
    const file = report({ stats: { expected: 3, unexpected: 1, flaky: 1, skipped: 0 } });
    expect(countPlaywright(file, 1)).toEqual({ passed: 3, failed: 2, skipped: 0 });
  });

  it('is one failure when no test ran, even with exit code 0', () => {
    const file = report({ numPassedTests: 0, numFailedTests: 0, numPendingTests: 4 });
    expect(countVitest(file, 0)).toEqual({ passed: 0, failed: 1, skipped: 4 });
  });

  it('is one failure when the report is missing', () => {
    expect(countPlaywright(join(folder, 'absent.json'), 1).failed).toBe(1);
  });

  it('is one failure when every test passed and the runner still ended badly', () => {
    const file = report({ numPassedTests: 5, numFailedTests: 0 });
    expect(countVitest(file, 1)).toEqual({ passed: 5, failed: 1, skipped: 0 });
  });
});
