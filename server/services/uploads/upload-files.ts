import { copyFile, mkdir, rename, rm } from 'node:fs/promises';
import { join } from 'node:path';
import type { Configuration } from '../../config';

/** Where the bytes of an upload are kept until it is stored, relative to the data directory. */
export function uploadPath(id: string): string {
  return join('uploads', id);
}

/** The place of an upload's bytes in the file system. */
export function absolutePath({ dataDirectory }: Configuration, filePath: string): string {
  return join(dataDirectory, filePath);
}

/** Moves a file that arrived to where uploads are kept. */
export async function keepFile(
  config: Configuration,
  from: string,
  filePath: string,
): Promise<void> {
  await mkdir(absolutePath(config, 'uploads'), { recursive: true, mode: 0o700 });
  const to = absolutePath(config, filePath);
  try {
    await rename(from, to);
  } catch (problem) {
    if (!isAcrossDevices(problem)) throw problem;
    await copyFile(from, to);
  }
}

function isAcrossDevices(problem: unknown): boolean {
  return problem instanceof Error && 'code' in problem && problem.code === 'EXDEV';
}

/** Removes the bytes of an upload, if they are there. */
export async function dropFile(config: Configuration, filePath: string): Promise<void> {
  await rm(absolutePath(config, filePath), { force: true });
}
