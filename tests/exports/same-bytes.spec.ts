import { execFile } from 'node:child_process';
import { fileURLToPath } from 'node:url';
import { promisify } from 'node:util';
import { describe, expect, it } from 'vitest';
import type { ExportFormatId } from '../../server/exports/export-format';
import { digestOf } from './digest';
import { exported } from './file-parts';
import { sampleRequest } from './sample-request';

const run = promisify(execFile);
const SCRIPT = fileURLToPath(new URL('./print-digests.ts', import.meta.url));
const FORMATS: readonly ExportFormatId[] = ['docx', 'xlsx'];

describe('the same state of a report gives the same bytes', () => {
  it.each(FORMATS)(
    'made twice: %s',
    async (formatId) => {
      expect(await digestOf(formatId)).toBe(await digestOf(formatId));
    },
    60_000,
  );

  it.each(['Pacific/Auckland', 'America/Los_Angeles'])(
    'in another process in %s',
    async (zone) => {
      const environment = { ...process.env, TZ: zone };
      const { stdout } = await run(process.execPath, ['--import', 'tsx', SCRIPT], {
        env: environment,
      });
      expect(JSON.parse(stdout)).toEqual([await digestOf('docx'), await digestOf('xlsx')]);
    },
    120_000,
  );
});

it.each(FORMATS)(
  'another moment gives another file: %s',
  async (formatId) => {
    const later = { ...sampleRequest(), changedAt: '2026-02-05T00:00:00.000Z' };
    expect(await exported(formatId, later)).not.toEqual(await exported(formatId, sampleRequest()));
  },
  60_000,
);
