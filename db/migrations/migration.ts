/** Runs statements in the migration's own transaction. */
export type RunSql = (sql: string) => Promise<void>;

/** One step of the schema. Steps only go forward: what is wrong is mended by a later one. */
export interface Migration {
  /** Its order and its mark in the database: never renamed once it has run anywhere. */
  readonly name: string;
  readonly up: (run: RunSql) => Promise<void>;
}
