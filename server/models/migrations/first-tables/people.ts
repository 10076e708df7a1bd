/** Accounts, sessions, mailed tokens, sent mail and the settings of the installation. */
export const PEOPLE_TABLES: readonly string[] = [
  `CREATE TABLE users (
    id TEXT PRIMARY KEY NOT NULL,
    email TEXT NOT NULL,
    email_key TEXT NOT NULL UNIQUE,
    name TEXT NOT NULL,
    password_hash TEXT,
    administrator TINYINT(1) NOT NULL DEFAULT 0,
    disabled TINYINT(1) NOT NULL DEFAULT 0,
    created_at TEXT NOT NULL,
    last_sign_in_at TEXT
  )`,
  `CREATE TABLE sessions (
    sid TEXT PRIMARY KEY NOT NULL,
    expires DATETIME NOT NULL,
    data TEXT NOT NULL,
    user_id TEXT REFERENCES users (id) ON DELETE CASCADE
  )`,
  'CREATE INDEX sessions_by_user ON sessions (user_id)',
  'CREATE INDEX sessions_by_expiry ON sessions (expires)',
  `CREATE TABLE tokens (
    hash TEXT PRIMARY KEY NOT NULL,
    purpose TEXT NOT NULL CHECK (purpose IN ('passwordReset', 'invitation')),
    user_id TEXT NOT NULL REFERENCES users (id) ON DELETE CASCADE,
    created_at TEXT NOT NULL,
    expires_at TEXT NOT NULL,
    used_at TEXT
  )`,
  'CREATE INDEX tokens_by_user ON tokens (user_id)',
  `CREATE TABLE mail (
    id TEXT PRIMARY KEY NOT NULL,
    to_address TEXT NOT NULL,
    subject TEXT NOT NULL,
    text TEXT NOT NULL,
    sent_at TEXT NOT NULL,
    delivery TEXT NOT NULL CHECK (delivery IN ('outbox', 'smtp', 'failed')),
    problem TEXT
  )`,
  'CREATE INDEX mail_by_time ON mail (sent_at)',
  `CREATE TABLE site_settings (
    name TEXT PRIMARY KEY NOT NULL,
    content TEXT NOT NULL
  )`,
];
