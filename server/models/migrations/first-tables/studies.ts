/** Studies with their outcomes, milestones and members. */
export const STUDY_TABLES: readonly string[] = [
  `CREATE TABLE studies (
    id TEXT PRIMARY KEY NOT NULL,
    title TEXT NOT NULL,
    design TEXT NOT NULL,
    population TEXT NOT NULL,
    people_noun TEXT NOT NULL,
    invented TINYINT(1) NOT NULL DEFAULT 0,
    created_at TEXT NOT NULL,
    updated_at TEXT NOT NULL
  )`,
  `CREATE TABLE outcomes (
    study_id TEXT NOT NULL REFERENCES studies (id) ON DELETE CASCADE,
    id TEXT NOT NULL,
    position INTEGER NOT NULL,
    noun TEXT NOT NULL,
    verb_phrase TEXT NOT NULL,
    time_frame TEXT,
    desirability TEXT NOT NULL CHECK (desirability IN ('harmful', 'beneficial')),
    PRIMARY KEY (study_id, id)
  )`,
  `CREATE TABLE milestones (
    study_id TEXT NOT NULL REFERENCES studies (id) ON DELETE CASCADE,
    id TEXT NOT NULL,
    title TEXT NOT NULL,
    due_date TEXT NOT NULL,
    PRIMARY KEY (study_id, id)
  )`,
  `CREATE TABLE memberships (
    study_id TEXT NOT NULL REFERENCES studies (id) ON DELETE CASCADE,
    user_id TEXT NOT NULL REFERENCES users (id),
    role TEXT NOT NULL CHECK (role IN ('reader', 'writer', 'analyst', 'editor', 'lead')),
    created_at TEXT NOT NULL,
    PRIMARY KEY (study_id, user_id)
  )`,
  'CREATE INDEX memberships_by_user ON memberships (user_id)',
];
