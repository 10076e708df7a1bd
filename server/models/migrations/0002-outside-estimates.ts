import type { Migration } from './migration';

/** Adjusted estimates that models outside computed, beside an analysis. */
export const outsideEstimates: Migration = {
  name: '0002-outside-estimates',
  statements: [
    `CREATE TABLE outside_estimates (
      id TEXT PRIMARY KEY NOT NULL,
      study_id TEXT NOT NULL REFERENCES studies (id),
      analysis_id TEXT NOT NULL REFERENCES analyses (id),
      version INTEGER NOT NULL,
      entry TEXT NOT NULL,
      person_id TEXT NOT NULL REFERENCES users (id),
      created_at TEXT NOT NULL,
      updated_at TEXT NOT NULL,
      removed_at TEXT
    )`,
    'CREATE INDEX outside_estimates_by_analysis ON outside_estimates (analysis_id, created_at, id)',
  ],
};
