/** Reports with their pinned results, blocks, steps and drafts. */
export const REPORT_TABLES: readonly string[] = [
  `CREATE TABLE reports (
    id TEXT PRIMARY KEY NOT NULL,
    study_id TEXT NOT NULL REFERENCES studies (id),
    title TEXT NOT NULL,
    seq INTEGER NOT NULL,
    framing TEXT NOT NULL,
    framing_policy TEXT,
    house_style_id TEXT NOT NULL,
    profile TEXT,
    stage TEXT NOT NULL,
    settings_version INTEGER NOT NULL,
    created_at TEXT NOT NULL,
    updated_at TEXT NOT NULL,
    updated_by TEXT REFERENCES users (id),
    removed_at TEXT
  )`,
  'CREATE INDEX reports_by_study ON reports (study_id)',
  `CREATE TABLE report_pins (
    report_id TEXT NOT NULL REFERENCES reports (id),
    analysis_id TEXT NOT NULL REFERENCES analyses (id),
    result_id TEXT NOT NULL REFERENCES results (id),
    PRIMARY KEY (report_id, analysis_id)
  )`,
  'CREATE INDEX report_pins_by_analysis ON report_pins (analysis_id)',
  `CREATE TABLE blocks (
    report_id TEXT NOT NULL REFERENCES reports (id),
    id TEXT NOT NULL,
    kind TEXT NOT NULL,
    order_key TEXT NOT NULL,
    content TEXT NOT NULL,
    version INTEGER NOT NULL,
    position_version INTEGER NOT NULL,
    removed_at TEXT,
    PRIMARY KEY (report_id, id)
  )`,
  'CREATE INDEX blocks_in_order ON blocks (report_id, order_key, id)',
  `CREATE TABLE steps (
    report_id TEXT NOT NULL REFERENCES reports (id),
    id TEXT NOT NULL,
    seq INTEGER NOT NULL,
    group_id TEXT NOT NULL,
    undoes TEXT,
    forward TEXT NOT NULL,
    inverse TEXT NOT NULL,
    person_id TEXT NOT NULL REFERENCES users (id),
    at TEXT NOT NULL,
    PRIMARY KEY (report_id, id),
    UNIQUE (report_id, seq)
  )`,
  `CREATE TABLE drafts (
    report_id TEXT NOT NULL,
    block_id TEXT NOT NULL,
    person_id TEXT NOT NULL REFERENCES users (id) ON DELETE CASCADE,
    base_version INTEGER NOT NULL,
    content TEXT NOT NULL,
    saved_at TEXT NOT NULL,
    PRIMARY KEY (report_id, block_id, person_id),
    FOREIGN KEY (report_id, block_id) REFERENCES blocks (report_id, id) ON DELETE CASCADE
  )`,
];
