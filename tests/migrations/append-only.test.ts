import { beforeAll, describe, expect, it } from 'vitest';
import { database } from '@/lib/db/connection';
import { violatedConstraint } from '@/lib/db/constraints';
import { TemplateVersion } from '@/models/template-version';
import { buildTemplateVersion } from '../factories/templates';
import { firstColumn } from './catalog';
import { buildSpecimens } from './specimens';

const columns = {
  audit_events: 'action',
  credit_entries: 'reason',
  ruling_reversals: 'reason',
  rulings: 'comment',
  template_versions: 'number',
};
const tables = Object.keys(columns);

beforeAll(async () => {
  await buildSpecimens();
});

/** The name of what refused a statement; null when it was carried out (and then taken back). */
async function refusalOf(statement: string): Promise<string | null> {
  try {
    await database().transaction(async (transaction) => {
      await database().query(statement, { transaction });
      throw new Error('The statement was carried out; it is not kept.');
    });
    return null;
  } catch (error) {
    return violatedConstraint(error);
  }
}

describe('append-only tables', () => {
  it('are exactly these', async () => {
    const guarded = await firstColumn(
      database(),
      `select distinct tgrelid::regclass::text from pg_trigger where tgname like '%_append_only' order by 1`,
    );
    expect(guarded).toEqual(tables);
  });

  it.each(Object.entries(columns))(
    '%s refuses a change of %s, even one that changes nothing',
    async (table, column) => {
      expect(await refusalOf(`update ${table} set ${column} = ${column}`)).toBe(`${table}_append_only`);
    },
  );

  it.each(tables)('%s refuses removal', async (table) => {
    expect(await refusalOf(`delete from ${table}`)).toBe(`${table}_append_only`);
  });

  it.each(tables)('%s refuses being emptied', async (table) => {
    expect(await refusalOf(`truncate ${table} cascade`)).toMatch(/_append_only$/);
  });
});

describe('a published template version', () => {
  it('has its sweep filled in once', async () => {
    const version = await buildTemplateVersion();
    await TemplateVersion.update({ sweep: { draws: 27 } }, { where: { id: version.id } });
    expect((await version.reload()).sweep).toEqual({ draws: 27 });
    expect(await refusalOf(`update template_versions set sweep = '{"draws": 1}' where id = '${version.id}'`)).toBe(
      'template_versions_append_only',
    );
    expect(await refusalOf(`update template_versions set sweep = null where id = '${version.id}'`)).toBe(
      'template_versions_append_only',
    );
  });

  it('keeps its content, even while the sweep is filled in', async () => {
    const version = await buildTemplateVersion();
    expect(
      await refusalOf(
        `update template_versions set sweep = '{}', content = '{"title": "x"}' where id = '${version.id}'`,
      ),
    ).toBe('template_versions_append_only');
  });
});
