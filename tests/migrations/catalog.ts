import { QueryTypes, type Sequelize } from 'sequelize';

const queries = {
  columns: `
    select table_name || '.' || column_name as name,
           concat_ws(' ', udt_name, 'null: ' || is_nullable, 'default: ' || column_default, 'identity: ' || identity_generation) as definition
      from information_schema.columns where table_schema = 'public'`,
  constraints: `
    select conrelid::regclass || '.' || conname as name, pg_get_constraintdef(oid) as definition
      from pg_constraint where connamespace = 'public'::regnamespace`,
  indexes: `select tablename || '.' || indexname as name, indexdef as definition from pg_indexes where schemaname = 'public'`,
  triggers: `
    select tgrelid::regclass || '.' || tgname as name, pg_get_triggerdef(t.oid) as definition
      from pg_trigger t join pg_class c on c.oid = t.tgrelid
     where not tgisinternal and c.relnamespace = 'public'::regnamespace`,
  functions: `
    select proname as name, pg_get_functiondef(oid) as definition
      from pg_proc where pronamespace = 'public'::regnamespace`,
  types: `
    select typname as name, typtype::text as definition
      from pg_type where typnamespace = 'public'::regnamespace and typtype <> 'c' and typelem = 0`,
} as const;

/** Everything the database's catalogue says of our schema, as sorted lines; the record of migrations is left out. */
export async function describeSchema(sequelize: Sequelize): Promise<string[]> {
  const lines: string[] = [];
  for (const [kind, query] of Object.entries(queries)) {
    const rows = await sequelize.query<{ name: string; definition: string }>(query, { type: QueryTypes.SELECT });
    for (const { name, definition } of rows) {
      if (!name.startsWith('schema_migrations')) lines.push(`${kind} ${name}: ${definition}`);
    }
  }
  return lines.sort();
}

/** The first column of a query's rows. */
export async function firstColumn(sequelize: Sequelize, query: string): Promise<string[]> {
  const rows = await sequelize.query<Record<string, string>>(query, { type: QueryTypes.SELECT });
  return rows.flatMap((row) => Object.values(row).slice(0, 1));
}

/** Names of the CHECK constraints of our tables. */
export function checkConstraintNames(sequelize: Sequelize): Promise<string[]> {
  return firstColumn(
    sequelize,
    `select conname from pg_constraint where connamespace = 'public'::regnamespace and contype = 'c' order by 1`,
  );
}

/** Names of the unique constraints and indexes of our tables, without primary keys. */
export function uniqueIndexNames(sequelize: Sequelize): Promise<string[]> {
  return firstColumn(
    sequelize,
    `select c.relname from pg_index i join pg_class c on c.oid = i.indexrelid
      where c.relnamespace = 'public'::regnamespace and i.indisunique and not i.indisprimary order by 1`,
  );
}
