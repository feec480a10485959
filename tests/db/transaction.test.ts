import { QueryTypes } from 'sequelize';
import { beforeEach, describe, expect, it } from 'vitest';
import { database } from '@/lib/db/connection';
import { isConstraintViolation, violatedConstraint } from '@/lib/db/constraints';
import { inTransaction } from '@/lib/db/transaction';
import { Department } from '@/models/department';
import { buildDepartment } from '../factories/people';

let left: Department;
let right: Department;

beforeEach(async () => {
  left = await buildDepartment();
  right = await buildDepartment();
});

/** A barrier for two: each waits until both have come. */
function meeting(): () => Promise<void> {
  let arrived = 0;
  let open: () => void = () => undefined;
  const both = new Promise<void>((resolve) => {
    open = resolve;
  });
  return () => {
    arrived += 1;
    if (arrived >= 2) open();
    return both;
  };
}

describe('inTransaction', () => {
  it('commits all of its work and returns its result', async () => {
    const name = await inTransaction(async (transaction) => {
      await left.update({ name: `${left.name}, renamed` }, { transaction });
      return left.name;
    });
    expect((await left.reload()).name).toBe(name);
  });

  it('keeps nothing of work that fails, does not try it again, and hands the error on', async () => {
    let tries = 0;
    const failure = new Error('No.');
    await expect(
      inTransaction(async (transaction) => {
        tries += 1;
        await left.update({ name: 'Half done' }, { transaction });
        throw failure;
      }),
    ).rejects.toBe(failure);
    expect(tries).toBe(1);
    expect((await left.reload()).name).not.toBe('Half done');
  });

  it('runs the whole of it again after a deadlock', async () => {
    const meet = meeting();
    let tries = 0;
    const rename = (first: Department, second: Department, name: string) =>
      inTransaction(async (transaction) => {
        tries += 1;
        await Department.update({ name: `${name} one` }, { where: { id: first.id }, transaction });
        await meet();
        await Department.update({ name: `${name} two` }, { where: { id: second.id }, transaction });
      });
    await Promise.all([rename(left, right, 'A'), rename(right, left, 'B')]);
    expect(tries).toBe(3);
    const names = [(await left.reload()).name, (await right.reload()).name];
    expect([
      ['A one', 'A two'],
      ['B two', 'B one'],
    ]).toContainEqual(names);
  });

  it('runs it again after a serialization failure, so that two who read and add each count', async () => {
    const meet = meeting();
    let tries = 0;
    const rename = (one: Department, other: Department) =>
      inTransaction(async (transaction) => {
        tries += 1;
        const seen = await Department.findByPk(other.id, { transaction, rejectOnEmpty: true });
        await meet();
        await Department.update({ name: `after ${seen.name}` }, { where: { id: one.id }, transaction });
      }, 'serializable');
    await Promise.all([rename(left, right), rename(right, left)]);
    expect(tries).toBe(3);
    const names = [(await left.reload()).name, (await right.reload()).name];
    expect(names.filter((name) => name.startsWith('after after'))).toHaveLength(1);
  });
});

describe('the connection', () => {
  it('bounds statements, locks and idle transactions, and keeps UTC', async () => {
    const setting = async (name: string) => {
      const rows = await database().query<Record<string, string>>(`show ${name}`, { type: QueryTypes.SELECT });
      return Object.values(rows[0] ?? {})[0];
    };
    expect(await setting('statement_timeout')).toBe('30s');
    expect(await setting('lock_timeout')).toBe('10s');
    expect(await setting('idle_in_transaction_session_timeout')).toBe('1min');
    expect(await setting('application_name')).toBe('halfmark');
    const [row] = await database().query<{ offset: string }>(`select extract(timezone from now())::text as offset`, {
      type: QueryTypes.SELECT,
    });
    expect(Number(row?.offset)).toBe(0);
  });
});

describe('isConstraintViolation', () => {
  it('tells a constraint by its name, through a model and through plain SQL', async () => {
    const throughModel: unknown = await buildDepartment({ name: left.name }).catch((error: unknown) => error);
    expect(isConstraintViolation(throughModel, 'departments_name_unique')).toBe(true);
    expect(isConstraintViolation(throughModel, 'users_email_unique')).toBe(false);
    const throughSql: unknown = await database()
      .query(`insert into departments (name) values (' ')`)
      .catch((error: unknown) => error);
    expect(violatedConstraint(throughSql)).toBe('departments_name_check');
  });

  it('says no to errors of other kinds', () => {
    for (const other of [new Error('users_email_unique'), null, undefined, 'text', { constraint: 7 }]) {
      expect(isConstraintViolation(other, 'users_email_unique')).toBe(false);
    }
  });
});
