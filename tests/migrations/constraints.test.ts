import { beforeAll, describe, expect, it } from 'vitest';
import { database } from '@/lib/db/connection';
import { constraintNames, violatedConstraint } from '@/lib/db/constraints';
import { checkConstraintNames, firstColumn, uniqueIndexNames } from './catalog';
import { repetitions } from './repetitions';
import { buildSpecimens } from './specimens';
import { checkViolations, type Patch } from './violations';

/** Unique pairs that contain the primary key: they exist to be pointed at, and cannot be repeated by themselves. */
const targetOfForeignKey = /_id_(answer|course|draw|grader|user)_unique$/;

beforeAll(async () => {
  await buildSpecimens();
});

/** Adds a copy of a row of the table with some columns changed; returns the constraint that refused it, or null. */
async function addCopy(table: string, patch: Patch, where = 'true'): Promise<string | null> {
  try {
    await database().transaction(async (transaction) => {
      const [, added] = await database().query(
        `insert into ${table} overriding system value
         select (jsonb_populate_record(null::${table}, to_jsonb(specimen) || :patch::jsonb)).*
           from ${table} specimen where ${where} order by 1 limit 1`,
        { transaction, replacements: { patch: JSON.stringify(patch) } },
      );
      expect(added, `there is a specimen row in ${table}`).toBe(1);
      throw new Error('The row was accepted; it is not kept.');
    });
    return null;
  } catch (error) {
    return violatedConstraint(error);
  }
}

describe('check constraints', () => {
  const cases = Object.entries(checkViolations).flatMap(([table, byName]) =>
    Object.entries(byName).flatMap(([constraint, patches]) => patches.map((patch) => ({ table, constraint, patch }))),
  );

  it('are all tried', async () => {
    const tried = Object.values(checkViolations).flatMap((byName) => Object.keys(byName));
    expect(tried.sort()).toEqual(await checkConstraintNames(database()));
  });

  it.each(cases)('$constraint refuses ($#)', async ({ table, constraint, patch }) => {
    expect(await addCopy(table, patch)).toBe(constraint);
  });
});

describe('unique constraints', () => {
  const cases = Object.entries(repetitions).flatMap(([table, byName]) =>
    Object.entries(byName).map(([constraint, patch]) => ({ table, constraint, patch })),
  );
  /** Which row is repeated, where the first will not do. */
  const chosenRow: Record<string, string> = {
    credit_entries_previous_unique: 'specimen.previous_entry_id is not null',
    queue_items_appeal_unique: 'specimen.appeal_id is not null',
    submissions_client_key_unique: 'specimen.client_key is not null',
  };

  beforeAll(async () => {
    await database().query(`update submissions set client_key = 'browser-1'`);
  });

  it('are all tried, but for those that only serve as targets', async () => {
    const tried = Object.values(repetitions).flatMap((byName) => Object.keys(byName));
    const all = await uniqueIndexNames(database());
    expect([...tried, 'extensions_section_unique'].sort()).toEqual(
      all.filter((name) => !targetOfForeignKey.test(name)).sort(),
    );
  });

  it.each(cases)('$constraint refuses a repetition', async ({ table, constraint, patch }) => {
    expect(await addCopy(table, patch, chosenRow[constraint])).toBe(constraint);
  });

  it('extensions_section_unique refuses a repetition', async () => {
    const [section] = await firstColumn(database(), 'select id from sections limit 1');
    await database().query(
      `insert into extensions (problem_set_id, section_id, closes_at, granted_by)
       select problem_set_id, :section, closes_at, granted_by from extensions limit 1`,
      { replacements: { section } },
    );
    expect(
      await addCopy('extensions', { id: '00000000-0000-4000-8000-000000000003' }, 'specimen.section_id is not null'),
    ).toBe('extensions_section_unique');
  });
});

describe('names of constraints that services tell apart', () => {
  it('all exist in the database, as a constraint, an index or a guard', async () => {
    const known = await firstColumn(
      database(),
      `select conname from pg_constraint where connamespace = 'public'::regnamespace
       union select relname from pg_class where relnamespace = 'public'::regnamespace and relkind = 'i'
       union select tgname from pg_trigger where not tgisinternal`,
    );
    expect(constraintNames.filter((name) => !known.includes(name))).toEqual([]);
  });
});
