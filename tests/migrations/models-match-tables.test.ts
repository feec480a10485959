import { QueryTypes, type ModelStatic, type Model } from 'sequelize';
import { describe, expect, it } from 'vitest';
import { database } from '@/lib/db/connection';
import { firstColumn } from './catalog';

/** Tables that other code than our models reads and writes. */
const withoutModel = ['schema_migrations', 'sign_in_failures'];

const columnTypes: Record<string, string> = {
  'ARRAY(TEXT)': '_text',
  BIGINT: 'int8',
  BOOLEAN: 'bool',
  DATE: 'timestamptz',
  DOUBLE: 'float8',
  INTEGER: 'int4',
  JSONB: 'jsonb',
  TEXT: 'text',
  UUID: 'uuid',
};

const models: [string, ModelStatic<Model>][] = Object.entries(database().models);

describe('models', () => {
  it('there is one for every table', async () => {
    const tables = await firstColumn(
      database(),
      `select tablename from pg_tables where schemaname = 'public' order by tablename`,
    );
    const named = models.map(([, model]) => model.getTableName());
    expect([...named, ...withoutModel].sort()).toEqual(tables);
  });

  it.each(models)(
    '%s has the columns of its table, of the same types, null where they may be',
    async (_name, model) => {
      const columns = await database().query<{ name: string; type: string; nullable: boolean }>(
        `select column_name as name, udt_name as type, is_nullable = 'YES' as nullable
         from information_schema.columns where table_schema = 'public' and table_name = :table`,
        { type: QueryTypes.SELECT, replacements: { table: model.getTableName() } },
      );
      const attributes = Object.values(model.getAttributes()).map((attribute) => ({
        name: attribute.field,
        type: columnTypes[typeName(attribute.type)],
        nullable: attribute.allowNull ?? true,
      }));
      const byName = (one: { name?: string }, other: { name?: string }) =>
        (one.name ?? '').localeCompare(other.name ?? '');
      expect(attributes.sort(byName)).toEqual(columns.sort(byName));
    },
  );

  it.each(models)('%s can be read with everything it is tied to', async (_name, model) => {
    for (const alias of Object.keys(model.associations)) {
      expect(await model.findAll({ include: alias, limit: 1 })).toEqual([]);
    }
  });
});

function typeName(type: unknown): string {
  const { key, type: inner } = type as { key: string; type?: { key: string } };
  if (key === 'ARRAY') return `ARRAY(${inner?.key ?? ''})`;
  return key === 'DOUBLE PRECISION' ? 'DOUBLE' : key;
}
