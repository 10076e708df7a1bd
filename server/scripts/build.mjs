import { fileURLToPath } from 'node:url';
import { buildAll } from './build-steps.mjs';

process.chdir(fileURLToPath(new URL('../..', import.meta.url)));
process.exitCode = (await buildAll()) ? 0 : 1;
