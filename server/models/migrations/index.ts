import { firstTables } from './0001-first-tables';
import { outsideEstimates } from './0002-outside-estimates';
import type { Migration } from './migration';

/** Every change of the schema, oldest first. A landed one never changes; a new one is appended. */
export const MIGRATIONS: readonly Migration[] = [firstTables, outsideEstimates];
