import { buildAll } from './build-steps.mjs';

process.chdir(new URL('../..', import.meta.url).pathname);
process.exitCode = (await buildAll()) ? 0 : 1;
