import { parentPort } from 'node:worker_threads';
import type { ExportJob, WorkerAnswer } from '../exporter';

let made = 0;

/** Does what the title of the report says: ends, fails, or gives the count of files made so far. */
parentPort?.on('message', ({ request }: ExportJob) => {
  const { title } = request.report;
  if (title === 'end') process.exit(3);
  made += 1;
  const answer: WorkerAnswer =
    title === 'fail'
      ? { ok: false, reason: 'It failed.' }
      : { ok: true, bytes: Uint8Array.of(made) };
  parentPort?.postMessage(answer);
});
