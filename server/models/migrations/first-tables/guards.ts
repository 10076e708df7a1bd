const IMMUTABLE = ['code_books', 'analysis_versions', 'results', 'steps', 'trail'] as const;

/** Rows that are immutable once written refuse to change or go, whoever asks. */
export const IMMUTABLE_GUARDS: readonly string[] = IMMUTABLE.flatMap((table) =>
  ['UPDATE', 'DELETE'].map(
    (change) => `CREATE TRIGGER ${table}_refuse_${change.toLowerCase()}
      BEFORE ${change} ON ${table}
      BEGIN SELECT RAISE(ABORT, 'rows of ${table} are immutable'); END`,
  ),
);
