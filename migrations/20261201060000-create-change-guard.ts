import { type RunSql } from '@/lib/db/migration-step';

/**
 * The function behind every append-only table: a trigger calls it for UPDATE, DELETE and TRUNCATE, and it refuses. The
 * error carries the constraint name `<table>_append_only`.
 */
export async function up(run: RunSql): Promise<void> {
  await run(`
    create function refuse_change() returns trigger language plpgsql as $$
    begin
      raise exception 'Rows of % are never changed or removed.', tg_table_name
        using errcode = 'restrict_violation', table = tg_table_name, constraint = tg_table_name || '_append_only';
    end
    $$`);
}

export async function down(run: RunSql): Promise<void> {
  await run('drop function refuse_change()');
}
