import { createServer, type Server } from 'node:http';
import type { AddressInfo } from 'node:net';
import { createApp } from '../app';
import type { Dependencies } from '../dependencies';
import { runStartUpTasks } from './start-up-tasks';

/** A large file over a slow line takes its time; headers still have to come within a minute. */
const LONGEST_REQUEST_IN_MILLISECONDS = 3_600_000;

/** A server that listens. */
export interface RunningServer {
  readonly port: number;
  /** Lets requests that run end (at most so long), then closes the database. */
  readonly stop: (patienceInMilliseconds: number) => Promise<void>;
}

/** Puts right what a crash left, then listens. A port that is taken is an error with its number. */
export async function serve(dependencies: Dependencies): Promise<RunningServer> {
  await runStartUpTasks(dependencies);
  const application = createApp(dependencies);
  const server = createServer({ requestTimeout: LONGEST_REQUEST_IN_MILLISECONDS }, application.app);
  await listen(server, dependencies.config.port);
  return {
    port: (server.address() as AddressInfo).port,
    stop: async (patience) => {
      application.stop();
      await close(server, patience);
      await dependencies.intake.close();
      await dependencies.background.idle();
      await dependencies.exporter.close();
      await dependencies.database.close();
    },
  };
}

function listen(server: Server, port: number): Promise<void> {
  return new Promise((resolve, reject) => {
    server.once('error', (problem: NodeJS.ErrnoException) => {
      const taken = problem.code === 'EADDRINUSE';
      reject(
        taken ? new Error(`Port ${String(port)} is taken; set PORT to another one.`) : problem,
      );
    });
    server.listen(port, resolve);
  });
}

async function close(server: Server, patience: number): Promise<void> {
  const closed = new Promise<void>((resolve) => {
    server.close(() => {
      resolve();
    });
  });
  server.closeIdleConnections();
  const impatience = setTimeout(() => {
    server.closeAllConnections();
  }, patience);
  await closed;
  clearTimeout(impatience);
}
