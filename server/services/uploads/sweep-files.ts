import { readdir } from 'node:fs/promises';
import { join } from 'node:path';
import type { Dependencies } from '../../dependencies';
import { absolutePath, dropFile, uploadPath } from './upload-files';

/** Where files lie while their request still comes in. */
const ARRIVING = 'arriving';

/** Removes files that no request and no upload will ask for again; for the start only. */
export async function sweepFiles(dependencies: Dependencies): Promise<void> {
  const { config, database } = dependencies;
  for (const name of await namesIn(absolutePath(config, ARRIVING))) {
    await dropFile(config, join(ARRIVING, name));
  }
  const { uploads } = database.stores;
  const wanted = new Set(
    (await uploads.listInState(['reading', 'profiled', 'storing', 'failed'])).map(({ id }) => id),
  );
  for (const name of await namesIn(absolutePath(config, 'uploads'))) {
    if (!wanted.has(name)) await dropFile(config, uploadPath(name));
  }
}

/** The names in a folder; none where there is no folder yet. */
async function namesIn(folder: string): Promise<readonly string[]> {
  return readdir(folder).catch((problem: unknown) => {
    if (problem instanceof Error && 'code' in problem && problem.code === 'ENOENT') return [];
    throw problem;
  });
}
