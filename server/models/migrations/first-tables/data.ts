/** Data sets, their cuts column by column, code books, and uploads on their way. */
export const DATA_TABLES: readonly string[] = [
  `CREATE TABLE data_sets (
    id TEXT PRIMARY KEY NOT NULL,
    study_id TEXT NOT NULL REFERENCES studies (id),
    name TEXT NOT NULL,
    created_at TEXT NOT NULL
  )`,
  'CREATE INDEX data_sets_by_study ON data_sets (study_id)',
  `CREATE TABLE cuts (
    id TEXT PRIMARY KEY NOT NULL,
    data_set_id TEXT REFERENCES data_sets (id),
    number INTEGER,
    data_date TEXT NOT NULL,
    file_name TEXT NOT NULL,
    rows INTEGER NOT NULL,
    sha256 TEXT NOT NULL,
    state TEXT NOT NULL CHECK (state IN ('loading', 'ready', 'destroyed')),
    profile TEXT NOT NULL,
    created_at TEXT NOT NULL,
    created_by TEXT NOT NULL REFERENCES users (id),
    UNIQUE (data_set_id, number),
    CHECK (state = 'loading' OR (data_set_id IS NOT NULL AND number IS NOT NULL))
  )`,
  `CREATE TRIGGER cuts_refuse_update BEFORE UPDATE ON cuts
    WHEN OLD.state <> 'loading' AND NOT (OLD.state = 'ready' AND NEW.state = 'destroyed')
    BEGIN SELECT RAISE(ABORT, 'a cut is immutable once it is ready'); END`,
  `CREATE TABLE cut_columns (
    cut_id TEXT NOT NULL REFERENCES cuts (id) ON DELETE CASCADE,
    position INTEGER NOT NULL,
    column_id TEXT NOT NULL,
    name TEXT NOT NULL,
    width INTEGER NOT NULL,
    chunk_rows INTEGER NOT NULL,
    dictionary_size INTEGER NOT NULL,
    PRIMARY KEY (cut_id, position),
    UNIQUE (cut_id, column_id)
  )`,
  `CREATE TABLE column_chunks (
    cut_id TEXT NOT NULL REFERENCES cuts (id) ON DELETE CASCADE,
    position INTEGER NOT NULL,
    part TEXT NOT NULL CHECK (part IN ('codes', 'dictionary')),
    chunk INTEGER NOT NULL,
    bytes BLOB NOT NULL CHECK (length(bytes) <= 262144),
    PRIMARY KEY (cut_id, position, part, chunk)
  )`,
  `CREATE TRIGGER column_chunks_refuse_update BEFORE UPDATE ON column_chunks
    BEGIN SELECT RAISE(ABORT, 'column chunks are immutable'); END`,
  `CREATE TRIGGER column_chunks_refuse_insert BEFORE INSERT ON column_chunks
    WHEN (SELECT state FROM cuts WHERE id = NEW.cut_id) IS NOT 'loading'
    BEGIN SELECT RAISE(ABORT, 'a cut is immutable once it is ready'); END`,
  `CREATE TABLE code_books (
    id TEXT PRIMARY KEY NOT NULL,
    data_set_id TEXT NOT NULL REFERENCES data_sets (id),
    number INTEGER NOT NULL,
    content TEXT NOT NULL,
    created_at TEXT NOT NULL,
    created_by TEXT NOT NULL REFERENCES users (id),
    UNIQUE (data_set_id, number)
  )`,
  `CREATE TABLE uploads (
    id TEXT PRIMARY KEY NOT NULL,
    study_id TEXT NOT NULL REFERENCES studies (id) ON DELETE CASCADE,
    data_set_id TEXT REFERENCES data_sets (id),
    person_id TEXT NOT NULL REFERENCES users (id),
    file_name TEXT NOT NULL,
    file_path TEXT NOT NULL,
    sha256 TEXT,
    state TEXT NOT NULL
      CHECK (state IN ('reading', 'profiled', 'storing', 'stored', 'failed')),
    progress DOUBLE NOT NULL,
    rows_read INTEGER NOT NULL,
    options TEXT NOT NULL,
    profile TEXT,
    proposal TEXT,
    problem TEXT,
    cut_id TEXT,
    created_at TEXT NOT NULL,
    updated_at TEXT NOT NULL
  )`,
  'CREATE INDEX uploads_by_study ON uploads (study_id)',
  'CREATE INDEX uploads_by_state ON uploads (state)',
];
