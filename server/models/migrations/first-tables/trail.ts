/** The trail of changes. */
export const TRAIL_TABLES: readonly string[] = [
  `CREATE TABLE trail (
    chain TEXT NOT NULL,
    number INTEGER NOT NULL,
    at TEXT NOT NULL,
    person_id TEXT REFERENCES users (id),
    what TEXT NOT NULL,
    "before" TEXT,
    "after" TEXT,
    previous_mac TEXT NOT NULL,
    mac TEXT NOT NULL,
    PRIMARY KEY (chain, number)
  )`,
];
