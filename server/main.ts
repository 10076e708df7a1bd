import { readConfiguration } from './config';
import { openDependencies } from './dependencies';
import { serve } from './start-up/serve';
import { welcome } from './start-up/welcome';

const PATIENCE_IN_MILLISECONDS = 10_000;

// What the server writes holds people's data: for its own user only.
process.umask(0o077);

try {
  const config = readConfiguration(process.env);
  console.log(`Data: ${config.dataDirectory}`);
  console.log('Database: opening, and bringing its tables up to date …');
  const dependencies = await openDependencies(config);
  const server = await serve(dependencies);
  for (const line of await welcome(dependencies)) console.log(line);
  for (const signal of ['SIGTERM', 'SIGINT'] as const) {
    process.once(signal, () => {
      void server.stop(PATIENCE_IN_MILLISECONDS);
    });
  }
} catch (problem) {
  console.error(problem instanceof Error ? `Evenhand can't start: ${problem.message}` : problem);
  process.exitCode = 1;
}
