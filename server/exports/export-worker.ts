import { parentPort } from 'node:worker_threads';
import { EXPORT_FORMATS } from './export-format';
import type { ExportJob, WorkerAnswer } from './exporter';

/** Makes one file after another; gets a job as a message, and answers with bytes or a reason. */
parentPort?.on('message', (job: ExportJob) => {
  void answerTo(job).then((answer) => {
    parentPort?.postMessage(answer, answer.ok ? [answer.bytes.buffer] : []);
  });
});

async function answerTo({ formatId, request }: ExportJob): Promise<WorkerAnswer> {
  try {
    const render = await EXPORT_FORMATS[formatId].load();
    // A copy of its own, whose memory may move to the other thread.
    return { ok: true, bytes: Uint8Array.from(await render(request)) };
  } catch (problem) {
    const reason = problem instanceof Error ? (problem.stack ?? problem.message) : String(problem);
    return { ok: false, reason };
  }
}
