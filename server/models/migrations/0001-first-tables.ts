import { ANALYSIS_TABLES } from './first-tables/analyses';
import { DATA_TABLES } from './first-tables/data';
import { IMMUTABLE_GUARDS } from './first-tables/guards';
import { PEOPLE_TABLES } from './first-tables/people';
import { REPORT_TABLES } from './first-tables/reports';
import { STUDY_TABLES } from './first-tables/studies';
import { TRAIL_TABLES } from './first-tables/trail';
import type { Migration } from './migration';

/** Every table of the first version. */
export const firstTables: Migration = {
  name: '0001-first-tables',
  statements: [
    ...PEOPLE_TABLES,
    ...STUDY_TABLES,
    ...DATA_TABLES,
    ...ANALYSIS_TABLES,
    ...REPORT_TABLES,
    ...TRAIL_TABLES,
    ...IMMUTABLE_GUARDS,
  ],
};
