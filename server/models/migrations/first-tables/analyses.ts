/** Analyses with their versions, the counts they used and their results. */
export const ANALYSIS_TABLES: readonly string[] = [
  `CREATE TABLE analyses (
    id TEXT PRIMARY KEY NOT NULL,
    study_id TEXT NOT NULL REFERENCES studies (id),
    number INTEGER NOT NULL,
    name TEXT NOT NULL,
    version INTEGER NOT NULL,
    created_at TEXT NOT NULL,
    updated_at TEXT NOT NULL,
    removed_at TEXT,
    UNIQUE (study_id, number)
  )`,
  `CREATE TABLE analysis_versions (
    analysis_id TEXT NOT NULL REFERENCES analyses (id),
    number INTEGER NOT NULL,
    name TEXT NOT NULL,
    cut_id TEXT NOT NULL REFERENCES cuts (id),
    specification TEXT NOT NULL,
    reason TEXT,
    person_id TEXT NOT NULL REFERENCES users (id),
    at TEXT NOT NULL,
    PRIMARY KEY (analysis_id, number)
  )`,
  `CREATE TABLE tallies (
    hash TEXT PRIMARY KEY NOT NULL,
    cut_id TEXT NOT NULL REFERENCES cuts (id),
    content TEXT NOT NULL,
    created_at TEXT NOT NULL
  )`,
  'CREATE INDEX tallies_by_cut ON tallies (cut_id)',
  `CREATE TABLE results (
    id TEXT PRIMARY KEY NOT NULL,
    analysis_id TEXT NOT NULL,
    analysis_version INTEGER NOT NULL,
    cut_id TEXT NOT NULL REFERENCES cuts (id),
    code_book_id TEXT NOT NULL REFERENCES code_books (id),
    engine_version TEXT NOT NULL,
    content TEXT NOT NULL,
    created_at TEXT NOT NULL,
    UNIQUE (analysis_id, analysis_version, cut_id, code_book_id, engine_version),
    FOREIGN KEY (analysis_id, analysis_version)
      REFERENCES analysis_versions (analysis_id, number)
  )`,
];
