/**
 * Every page, method of a route and server action of the application has one row, and is what the row says for everyone.
 *
 * To add a page, route or action: put a row for it into the file of its area in tests/routes/permissions (or make
 * `<area>.ts` there; it is found by itself), exporting `rows`. A row names the file under app/, and what becomes of it
 * for a signed-out visitor, a student, a TA, a head TA, the instructor, an administrator and a stranger, in this order
 * (the words are in tests/routes/matrix/row.ts). Addresses and inputs come from the scene (tests/routes/matrix/scene.ts);
 * what it lacks is built by the area's `prepare(scene)`, which keeps ids in `scene.extras`. A page or method that is open
 * to everybody has an `open` row that says why.
 *
 * Here: that no door is without a row, and that every action, through its services, lets in whom its row says. Pages,
 * routes and the sessions of actions are tried over HTTP in tests/journeys/permission-matrix.test.ts.
 */
import { beforeAll, describe, expect, it } from 'vitest';
import { inTransaction } from '@/lib/db/transaction';
import { isHalfmarkError } from '@/lib/errors';
import { type Actor } from '@/lib/domain/actor';
import { allRows, prepareAreas } from './matrix/all-rows';
import { callers, expected, rowKey, type ActionRow, type Outcome } from './matrix/row';
import { actorOf, buildScene, type Scene } from './matrix/scene';
import { hiddenActions, sourceOf, walkApp } from './matrix/walk-app';

const rows = await allRows();
const doors = walkApp();
const actions = rows.filter((row) => row.kind === 'action');
const signedIn = callers.filter((caller) => caller !== 'signedOut');

describe('the table of permissions', () => {
  it('has a row for every page, route and action, and none for what is not there', () => {
    const there = doors.map((door) => door.key);
    const named = rows.map(rowKey);
    expect(there.length).toBeGreaterThan(30);
    expect({
      withoutRow: there.filter((key) => !named.includes(key)),
      rowOfNothing: named.filter((key) => !there.includes(key)),
      namedTwice: named.filter((key, index) => named.indexOf(key) !== index),
    }).toEqual({ withoutRow: [], rowOfNothing: [], namedTwice: [] });
  });

  it('calls pages pages, routes routes and actions actions', () => {
    const kinds = new Map(doors.map((door) => [door.key, door.kind]));
    const wrong = rows.filter(
      (row) => row.kind !== 'open' && kinds.has(rowKey(row)) && kinds.get(rowKey(row)) !== row.kind,
    );
    expect(wrong.map(rowKey)).toEqual([]);
  });

  it('sees every server action: none stands inside another file', () => {
    expect(hiddenActions()).toEqual([]);
  });

  it('tries each action through the services that its file calls', () => {
    for (const row of actions) {
      const source = sourceOf(row.file);
      expect(row.services.length, rowKey(row)).toBeGreaterThan(0);
      for (const service of row.services) expect(source, rowKey(row)).toMatch(new RegExp(`\\b${service}\\b`));
      expect(row.expect[0], rowKey(row)).toBe('sign-in');
    }
  });

  it('leads every action through the door that asks for a session, but those that are open on purpose', () => {
    for (const file of new Set(actions.map((row) => row.file))) {
      expect(sourceOf(file), file).toMatch(/import \{[^}]*\brunAction\b[^}]*\} from '@\/app\/_server\/run-action'/);
      expect(sourceOf(file), file).not.toMatch(/\brunPublicAction\b/);
    }
  });
});

describe('the actions', () => {
  let scene: Scene;
  beforeAll(async () => {
    scene = await buildScene();
    await prepareAreas(scene);
  });

  describe.each(actions.map((row) => [rowKey(row), row] as const))('%s', (_key, row) => {
    it.each(signedIn)('for %s', async (caller) => {
      const actor = await actorOf(scene, caller);
      expect(await outcomeOf(row, actor, scene)).toBe(expected(row.expect, caller));
    });
  });
});

/** What is taken back at the end of every try. */
class TakenBack extends Error {}

async function outcomeOf(row: ActionRow, actor: Actor, scene: Scene): Promise<Outcome> {
  try {
    await inTransaction(async (transaction) => {
      await row.run({ actor, transaction, now: new Date() }, scene);
      throw new TakenBack();
    });
    throw new Error('Unreachable: the transaction is always taken back.');
  } catch (error) {
    if (error instanceof TakenBack) return 'allow';
    if (!isHalfmarkError(error)) throw error;
    if (error.code === 'forbidden') return 'refuse';
    if (error.code === 'not-found') return 'hide';
    return error.code === 'signed-out' ? 'sign-in' : 'allow';
  }
}
