/** Runs one SQL statement inside the transaction of the migration it is handed to. */
export type RunSql = (statement: string) => Promise<void>;

/** A migration: one step of the schema, and the way back. Each direction runs in a transaction of its own. */
export type MigrationSteps = { up: (run: RunSql) => Promise<void>; down: (run: RunSql) => Promise<void> };
