import { Worker, type WorkerOptions } from 'node:worker_threads';

/**
 * Starts a worker by its path under `server/` without extension, as in `intake/csv-worker`.
 *
 * The file's name ends in `-worker`, which makes it an entry of the bundle; bundled workers lie
 * flat beside `main.js`. From sources the worker is loaded through tsx. `input` arrives in the
 * worker as `workerInput()`.
 */
export function startWorker(path: string, input?: unknown, options: WorkerOptions = {}): Worker {
  const source = workerSource(path);
  return runsFromSource()
    ? new Worker(new URL('./worker-from-source.mjs', import.meta.url), {
        ...options,
        workerData: { input, sourceOfWorker: source.href },
      })
    : new Worker(source, { ...options, workerData: { input } });
}

function workerSource(path: string): URL {
  if (runsFromSource()) return new URL(`../${path}.ts`, import.meta.url);
  const name = path.slice(path.lastIndexOf('/') + 1);
  return new URL(`./${name}.js`, import.meta.url);
}

function runsFromSource(): boolean {
  return import.meta.url.endsWith('.ts');
}
