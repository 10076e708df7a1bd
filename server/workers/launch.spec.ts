import { expect, it } from 'vitest';
import { startWorker } from './launch';

it('starts a worker written in TypeScript and hands it its input', async () => {
  const worker = startWorker('workers/testing/echo-worker', { greeting: 'even' });
  const answer = await new Promise((resolve, reject) => {
    worker.once('message', resolve);
    worker.once('error', reject);
  });
  await worker.terminate();
  expect(answer).toEqual({ ok: true, value: { greeting: 'even' } });
});
