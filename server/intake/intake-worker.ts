import { parentPort } from 'node:worker_threads';
import type { WorkerMessage, WorkerOrder } from './messages';
import { readFile, type ReadingOrder } from './read-file';
import type { Progress } from './reading';

/** Pieces that may be on their way to the database; reading waits beyond that. */
const MOST_CHUNKS_UNDER_WAY = 64;

const MILLISECONDS_BETWEEN_REPORTS = 200;

const port = parentPort;
if (port === null) throw new Error('The intake worker runs in a thread of its own.');

let underWay = 0;
let resume: (() => void) | null = null;
let reportedAt = 0;

port.on('message', (message: WorkerOrder) => {
  if (message.kind === 'read') {
    void read(message.order);
    return;
  }
  underWay -= message.chunks;
  resume?.();
});

/** One file after the other; what goes wrong unexpectedly ends the worker. */
async function read(order: ReadingOrder): Promise<void> {
  reportedAt = 0;
  const outcome = await readFile(
    order,
    (chunk) => {
      underWay += 1;
      tell({ kind: 'chunk', chunk }, [chunk.bytes.buffer]);
    },
    pause,
  );
  tell({ kind: 'done', outcome });
}

function tell(message: WorkerMessage, given: readonly ArrayBuffer[] = []): void {
  port?.postMessage(message, [...given]);
}

/** Reports now and then, and waits while too many pieces are under way. */
async function pause(progress: Progress): Promise<void> {
  const now = performance.now();
  if (now - reportedAt >= MILLISECONDS_BETWEEN_REPORTS) {
    reportedAt = now;
    tell({ kind: 'progress', progress });
  }
  while (underWay > MOST_CHUNKS_UNDER_WAY) {
    await new Promise<void>((resolve) => {
      resume = resolve;
    });
  }
}
